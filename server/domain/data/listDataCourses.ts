import type { DataCourse } from '#shared/schemas/departmentReplies'
import type { Read } from '../../db/writer'

/** The courses whose data somebody in the department keeps, those of open terms first, with how many data sets each has of its own. */
export async function listDataCourses(read: Read): Promise<DataCourse[]> {
  const rows = await read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id')
    .select(eb => ['course.id', 'course.code', 'course.title', 'term.name as term', 'term.state as termState',
      eb.selectFrom('data_set').select(all => all.fn.countAll<number>().as('n')).whereRef('data_set.owner_course_id', '=', 'course.id').as('dataSets')])
    .orderBy('term.starts_on', 'desc').orderBy('course.code').execute()
  const courses = rows.map(row => ({ ...row, dataSets: Number(row.dataSets ?? 0) }))
  return [...courses.filter(course => course.termState !== 'closed'), ...courses.filter(course => course.termState === 'closed')]
}
