import { z } from 'zod'
import { refuse } from '#shared/errors'
import { termCalendar, type TermCalendar } from '#shared/schemas/calendar'
import type { Read } from '../../db/writer'
import type { TermOrigin } from './createTerm'

const origin = z.object({ termId: z.string(), planDigest: z.string() })

/** A term's calendar as its row keeps it. */
export function readCalendar(json: string): { calendar: TermCalendar, origin: TermOrigin | null } {
  const value: unknown = JSON.parse(json)
  return { calendar: termCalendar.parse(value), origin: z.object({ origin: origin.optional() }).parse(value).origin ?? null }
}

/** All terms, the newest first, with how much is in each. */
export async function listTerms(read: Read) {
  const [terms, courses, members] = await Promise.all([
    read.selectFrom('term').selectAll().orderBy('starts_on', 'desc').execute(),
    read.selectFrom('course').select(count => ['term_id as termId', count.fn.countAll<number>().as('n')]).groupBy('term_id').execute(),
    read.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id').select(count => ['course.term_id as termId', count.fn.countAll<number>().as('n')])
      .where('membership.role', '=', 'student').where('membership.state', '=', 'active').groupBy('course.term_id').execute(),
  ])
  return terms.map((term) => {
    const { calendar, origin } = readCalendar(term.calendar_json)
    return {
      id: term.id, name: term.name, zone: term.zone, startsOn: term.starts_on, endsOn: term.ends_on, state: term.state, weeks: calendar.weeks.length,
      courses: courses.find(row => row.termId === term.id)?.n ?? 0, students: members.find(row => row.termId === term.id)?.n ?? 0, fromTermId: origin?.termId ?? null,
    }
  })
}

/** One term: its calendar, and its courses with how many are in them. */
export async function describeTerm(read: Read, termId: string) {
  const term = await read.selectFrom('term').selectAll().where('id', '=', termId).executeTakeFirst()
  if (!term) return refuse('not_found')
  const { calendar, origin } = readCalendar(term.calendar_json)
  const fromTerm = origin ? await read.selectFrom('term').select('name').where('id', '=', origin.termId).executeTakeFirst() : undefined
  return {
    id: term.id, name: term.name, zone: term.zone, startsOn: term.starts_on, endsOn: term.ends_on, state: term.state, version: term.version, calendar,
    from: fromTerm ? { id: origin!.termId, name: fromTerm.name } : null, courses: await listCourses(read, termId),
  }
}

/** Courses of a term with their codes, and counts of people and labs. */
export async function listCourses(read: Read, termId: string) {
  const courses = await read.selectFrom('course').selectAll().where('term_id', '=', termId).orderBy('code').execute()
  const ids = courses.map(course => course.id)
  if (ids.length === 0) return []
  const [listings, sections, members, labs] = await Promise.all([
    read.selectFrom('course_listing').selectAll().where('course_id', 'in', ids).orderBy('code').execute(),
    read.selectFrom('section').select(['id', 'course_id', 'name']).where('course_id', 'in', ids).orderBy('name').execute(),
    read.selectFrom('membership').select(count => ['course_id', 'role', count.fn.countAll<number>().as('n')]).where('course_id', 'in', ids).where('state', '=', 'active').groupBy(['course_id', 'role']).execute(),
    read.selectFrom('lab').select(count => ['course_id', count.fn.countAll<number>().as('n')]).where('course_id', 'in', ids).where('state', '<>', 'archived').groupBy('course_id').execute(),
  ])
  return courses.map((course) => {
    const inCourse = members.filter(row => row.course_id === course.id)
    return {
      id: course.id, code: course.code, title: course.title, state: course.state,
      alsoListedAs: listings.filter(row => row.course_id === course.id).map(row => row.code),
      sections: sections.filter(row => row.course_id === course.id).map(row => row.name),
      students: inCourse.find(row => row.role === 'student')?.n ?? 0,
      staff: inCourse.filter(row => row.role !== 'student').reduce((sum, row) => sum + row.n, 0),
      labs: labs.find(row => row.course_id === course.id)?.n ?? 0,
    }
  })
}
