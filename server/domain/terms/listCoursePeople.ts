import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'
import type { Acting } from '../people/actor'
import { wallTimeAt } from './wallClock'

/** Who is in a course, by section, for its staff. A TA sees the students of the sections they have; staff are seen by all staff. */
export async function listCoursePeople(read: Read, { courseId, acting }: { courseId: string, acting: Acting }, now: number) {
  const course = await read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select(['course.code', 'course.title', 'term.name as term', 'term.zone']).where('course.id', '=', courseId).executeTakeFirst()
  if (!course) return refuse('not_found')
  const [listings, allSections, members, taSections] = await Promise.all([
    read.selectFrom('course_listing').select('code').where('course_id', '=', courseId).orderBy('code').execute(),
    read.selectFrom('section').select(['id', 'name']).where('course_id', '=', courseId).orderBy('name').execute(),
    read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id')
      .select(['membership.id', 'membership.role', 'membership.pseudonym', 'membership.section_id as sectionId', 'person.display_name as name', 'person.email_norm as email', 'person.state as accountState'])
      .where('membership.course_id', '=', courseId).where('membership.state', '=', 'active').orderBy('person.display_name').orderBy('membership.id').execute(),
    read.selectFrom('ta_section').innerJoin('section', 'section.id', 'ta_section.section_id').select(['ta_section.membership_id as id', 'section.name']).where('ta_section.course_id', '=', courseId).orderBy('section.name').execute(),
  ])
  const sections = acting.role === 'ta' ? allSections.filter(section => acting.sectionIds.includes(section.id)) : allSections
  const sectionIds = sections.map(section => section.id)
  const [notCounted, allowances] = sectionIds.length === 0
    ? [[], []]
    : await Promise.all([
        read.selectFrom('standing as s').innerJoin('membership', 'membership.id', 's.membership_id').select(count => ['s.membership_id as id', count.fn.countAll<number>().as('n')])
          .where('membership.course_id', '=', courseId).where('s.kind', '=', 'not_counted')
          .where(where => where.not(where.exists(where.selectFrom('standing as later').select('later.id').whereRef('later.membership_id', '=', 's.membership_id').whereRef('later.lab_id', '=', 's.lab_id').whereRef('later.seq', '>', 's.seq'))))
          .groupBy('s.membership_id').execute(),
        read.selectFrom('allowance').innerJoin('posting', 'posting.id', 'allowance.posting_id').innerJoin('lab', 'lab.id', 'posting.lab_id')
          .select(['allowance.membership_id as membershipId', 'allowance.posting_id as postingId', 'allowance.due_at as dueAt', 'allowance.reason as kind', 'posting.zone', 'lab.title'])
          .where('posting.section_id', 'in', sectionIds).where('allowance.due_at', '>', now - 30 * 86_400_000).orderBy('allowance.due_at').execute(),
      ])
  const nameOf = (member: { name: string | null, pseudonym: string }) => member.name ?? member.pseudonym
  return {
    course: { code: course.code, title: course.title, alsoListedAs: listings.map(row => row.code), term: course.term, zone: course.zone },
    staff: members.filter(member => member.role !== 'student').map(member => ({ id: member.id, name: nameOf(member), email: member.email ?? '', role: member.role, sections: taSections.filter(row => row.id === member.id).map(row => row.name) })),
    sections: sections.map(section => ({
      ...section,
      students: members.filter(member => member.sectionId === section.id).map(member => ({
        id: member.id, name: nameOf(member), email: member.email ?? '', accountState: member.accountState ?? 'erased' as const, notCounted: notCounted.find(row => row.id === member.id)?.n ?? 0,
      })),
    })),
    allowances: allowances.map(({ membershipId, postingId, title, dueAt, kind, zone }) => ({ membershipId, postingId, title, dueLocal: wallTimeAt(dueAt, zone), kind })),
  }
}
