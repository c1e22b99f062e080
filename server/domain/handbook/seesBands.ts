import type { Read } from '../../db/writer'
import type { Actor } from '../people/actor'

/**
 * Whether the calculator shows a person accepted ranges and slips: those who teach or work for the department, unless they are a student
 * anywhere in a term that is not closed. A TA who takes another course has steps of their own to work.
 */
export async function seesBands(read: Read, actor: Pick<Actor, 'personId' | 'memberships' | 'departmentRoles'>): Promise<boolean> {
  if (!actor.memberships.some(member => member.role !== 'student') && actor.departmentRoles.length === 0) return false
  if (!actor.memberships.some(member => member.role === 'student')) return true
  const studies = await read.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id').innerJoin('term', 'term.id', 'course.term_id').select('membership.id')
    .where('membership.person_id', '=', actor.personId).where('membership.role', '=', 'student').where('membership.state', '=', 'active').where('term.state', '<>', 'closed').executeTakeFirst()
  return studies === undefined
}
