import type { Read } from '../../db/writer'
import type { Actor } from './actor'

/** Everything the mast needs: a person's courses, newest term first, with the role in each. */
export async function describeSelf(read: Read, actor: Actor) {
  const courseIds = actor.memberships.map(member => member.courseId)
  const [courses, sections] = courseIds.length === 0
    ? [[], []]
    : await Promise.all([
        read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id')
          .select(['course.id', 'course.code', 'course.title', 'course.state', 'term.name as term', 'term.state as termState', 'term.zone', 'term.starts_on as startsOn'])
          .where('course.id', 'in', courseIds).orderBy('term.starts_on', 'desc').orderBy('course.code').execute(),
        read.selectFrom('section').select(['id', 'name', 'course_id']).where('course_id', 'in', courseIds).orderBy('name').execute(),
      ])
  return {
    id: actor.personId,
    name: actor.displayName,
    email: actor.email,
    courses: courses.map((course) => {
      const member = actor.memberships.find(held => held.courseId === course.id)!
      const own = sections.filter(section => section.course_id === course.id && (member.sectionIds.length === 0 || member.sectionIds.includes(section.id)))
      return { id: course.id, code: course.code, title: course.title, state: course.state, term: course.term, termState: course.termState, zone: course.zone, role: member.role, sections: own.map(({ id, name }) => ({ id, name })) }
    }),
    department: actor.departmentRoles.map(held => held.role),
  }
}
