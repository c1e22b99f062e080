import type { Policy } from '../../server/domain/policies'
import type { WorldObjects, WorldPerson } from '../fixtures/world'

/** What should come of it: the asker gets through to the work itself, or is refused with this code. */
export type Expected = 'through' | 'not_signed_in' | 'not_found' | 'not_allowed' | 'term_closed'

/** What a request names. `object` is null where there is no such thing; `reaches` says what the narrowest parameter is. */
export interface Named {
  object: WorldObjects | null
  /** Nothing is named: the route has no parameter that lies anywhere. */
  isNothing: boolean
  /** The narrowest thing: all of a course, what belongs to a section, or one student's own. */
  reaches: 'course' | 'section' | 'holder'
  /** It hangs on a lab, which may not be open yet. */
  isOfLab: boolean
}

/**
 * Who may what, said once more and apart from the product: it reads the table of policies, but neither `authorize` nor `locate` nor the database.
 */
export function expected(policy: Policy, person: WorldPerson | null, { object, isNothing, reaches, isOfLab }: Named): Expected {
  if (policy.scope === 'public') return 'through'
  if (person === null || person.isClosed) return 'not_signed_in'
  if (policy.scope === 'session') return 'through'
  const ofDepartment = person.department.some(role => policy.roles.includes(role))
  if (policy.scope === 'department') return ofDepartment ? 'through' : 'not_found'
  if (isNothing) return ofDepartment ? 'through' : 'not_found'
  if (object === null) return 'not_found'

  const held = person.memberships.find(membership => membership.course === object.course)
  const isClosedTerm = policy.openTerm === true && object.course === 'past'
  const whenOpen = isClosedTerm ? 'term_closed' : 'through'
  if (held === undefined || !policy.roles.includes(held.role)) {
    if (ofDepartment) return whenOpen
    return held === undefined ? 'not_found' : 'not_allowed'
  }
  switch (held.role) {
    case 'lead':
    case 'instructor':
      return whenOpen
    case 'ta':
      return policy.scope !== 'course' && reaches !== 'course' && !held.sections.includes(object.section) ? 'not_found' : whenOpen
    case 'student': {
      const isTheirSection = held.sections.includes(object.section)
      if (policy.opened && isOfLab && !(object.isOpen && isTheirSection)) return 'not_found'
      if (policy.scope !== 'course' && reaches !== 'course' && !isTheirSection) return 'not_found'
      const isTheirs = person.memberships.some(one => one.course === object.course) && object.owner === person.name.split(' ')[0]
      if (policy.scope === 'own' && reaches === 'holder' && !isTheirs) return 'not_found'
      return whenOpen
    }
  }
}
