import { refuse } from '#shared/errors'
import { lateRule } from '#shared/schemas/lab'
import type { Read } from '../../db/writer'

/** A course as the admin keeps it: codes, late rule, sections, and everybody who is or was in it. */
export async function describeCourse(read: Read, courseId: string) {
  const course = await read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').innerJoin('convention_revision', 'convention_revision.id', 'course.convention_revision_id')
    .select(['course.id', 'course.code', 'course.title', 'course.late_rule_json', 'course.version', 'course.ancestor_id', 'term.id as termId', 'term.name as term', 'term.state', 'course.state as courseState', 'convention_revision.convention_key as conventionKey', 'convention_revision.no as conventionNo'])
    .where('course.id', '=', courseId).executeTakeFirst()
  if (!course) return refuse('not_found')
  const [listings, sections, members, taSections, ancestor] = await Promise.all([
    read.selectFrom('course_listing').select('code').where('course_id', '=', courseId).orderBy('code').execute(),
    read.selectFrom('section').select(['id', 'name']).where('course_id', '=', courseId).orderBy('name').execute(),
    read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id')
      .select(['membership.id', 'membership.role', 'membership.state', 'membership.pseudonym', 'membership.version', 'membership.section_id as sectionId', 'person.id as personId', 'person.display_name as name', 'person.email_norm as email', 'person.state as accountState'])
      .where('membership.course_id', '=', courseId).orderBy('person.display_name').orderBy('membership.id').execute(),
    read.selectFrom('ta_section').select(['membership_id', 'section_id']).where('course_id', '=', courseId).execute(),
    course.ancestor_id === null ? undefined : read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select(['course.id', 'term.name as term']).where('course.id', '=', course.ancestor_id).executeTakeFirst(),
  ])
  return {
    id: course.id, code: course.code, title: course.title, state: course.courseState, alsoListedAs: listings.map(row => row.code), lateRule: lateRule.parse(JSON.parse(course.late_rule_json)),
    convention: `${course.conventionKey}, revision ${course.conventionNo}`, version: course.version,
    term: { id: course.termId, name: course.term, state: course.state }, ancestor: ancestor ?? null,
    sections: sections.map(section => ({ ...section, students: members.filter(member => member.sectionId === section.id && member.state === 'active').length })),
    members: members.map(member => ({
      id: member.id, personId: member.personId, name: member.name ?? member.pseudonym, email: member.email ?? '', role: member.role, state: member.state, accountState: member.accountState ?? 'erased' as const,
      version: member.version, sectionIds: member.role === 'ta' ? taSections.filter(row => row.membership_id === member.id).map(row => row.section_id) : member.sectionId === null ? [] : [member.sectionId],
    })),
  }
}
