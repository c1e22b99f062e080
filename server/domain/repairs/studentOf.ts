import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'

/** A student of a course, as repairs see them. */
export interface Student { membershipId: string, courseId: string, courseCode: string, sectionId: string, zone: string }
export interface StudentLab { postingId: string, labId: string, title: string, zone: string, opensAt: number, dueAt: number, attempts: number, releasedAt: number | null, allowedUntil: number | null, lateRuleJson: string }

/** @throws {DomainError} `not_found` for whoever is no active student of the course */
export async function studentOf(db: Read, courseId: string, membershipId: string): Promise<Student> {
  const row = await db.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id').innerJoin('term', 'term.id', 'course.term_id')
    .select(['membership.section_id as sectionId', 'course.code as courseCode', 'term.zone']).where('membership.id', '=', membershipId).where('course.id', '=', courseId).where('membership.role', '=', 'student').where('membership.state', '=', 'active').executeTakeFirst()
  if (!row || row.sectionId === null) return refuse('not_found')
  return { membershipId, courseId, courseCode: row.courseCode, sectionId: row.sectionId, zone: row.zone }
}

/** The posting of a lab to the student's section. @throws {DomainError} `not_found`, `lab_withdrawn` */
export async function labOfStudent(db: Read, student: Student, labId: string): Promise<StudentLab> {
  const row = await db.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id')
    .select(eb => ['posting.id as postingId', 'lab.id as labId', 'lab.title', 'lab.state as labState', 'posting.state', 'posting.zone', 'posting.opens_at as opensAt', 'posting.due_at as dueAt', 'posting.attempts', 'posting.released_at as releasedAt', 'posting.late_rule_json as lateRuleJson',
      eb.selectFrom('allowance').select(inner => inner.fn.max('allowance.due_at').as('until')).whereRef('allowance.posting_id', '=', 'posting.id').where('allowance.membership_id', '=', student.membershipId).as('allowedUntil')])
    .where('posting.lab_id', '=', labId).where('posting.section_id', '=', student.sectionId).where('lab.course_id', '=', student.courseId).where('posting.state', 'in', ['posted', 'withdrawn']).executeTakeFirst()
  if (!row) return refuse('not_found')
  const { labState, state, ...lab } = row
  return labState === 'withdrawn' || state === 'withdrawn' ? refuse('lab_withdrawn') : lab
}
