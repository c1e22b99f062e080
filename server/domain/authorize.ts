import { refuse } from '#shared/errors'
import type { Acting, Actor } from './people/actor'
import { policies, type Action, type Policy } from './policies'

/** Where an object belongs: found by `locate.ts` from a route's parameters. */
export interface Place {
  courseId: string | null
  /** Sections to which the object belongs; empty means the whole course. */
  sectionIds: readonly string[]
  /** Memberships whose own it is; empty means nobody's in particular. */
  ownerIds: readonly string[]
  termState: 'planned' | 'running' | 'closed' | null
  /** For a lab and what hangs on it: the sections for which it is open by now. */
  openSectionIds: readonly string[] | null
  /** Department data that every course may use. */
  isDepartmentWide: boolean
}

/**
 * Decides by the table in `policies.ts` whether this person may do this to what lies at this place, and in which role.
 * @throws {DomainError} `not_signed_in`, `not_found` for what is foreign, `not_allowed` inside one's own course, `term_closed`
 */
export function authorize(action: Action, actor: Actor | null, place: Place | null): Acting | null {
  const policy: Policy = policies[action]
  if (policy.scope === 'public') return null
  if (!actor) return refuse('not_signed_in')
  if (policy.scope === 'session') return { actorId: actor.personId, role: 'student', courseId: null, sectionIds: [] }

  if (policy.scope === 'department') {
    const role = actor.departmentRoles.find(held => policy.roles.includes(held.role))
    if (!role) return refuse('not_found')
    return { actorId: role.id, role: role.role, courseId: null, sectionIds: [] }
  }

  if (!place) return refuse('not_found')
  const acting = roleAt(policy, actor, place)
  if (policy.openTerm && place.termState === 'closed') return refuse('term_closed')
  return acting
}

function roleAt(policy: Policy, actor: Actor, place: Place): Acting {
  const member = actor.memberships.find(held => held.courseId === place.courseId)
  if (member && policy.roles.includes(member.role)) {
    if (!reaches(policy, member.role, member.id, member.sectionIds, place)) return refuse('not_found')
    return { actorId: member.id, role: member.role, courseId: member.courseId, sectionIds: member.sectionIds }
  }
  const department = actor.departmentRoles.find(held => policy.roles.includes(held.role))
  if (department) return { actorId: department.id, role: department.role, courseId: place.courseId, sectionIds: [] }
  return refuse(member ? 'not_allowed' : 'not_found')
}

function reaches(policy: Policy, role: Actor['memberships'][number]['role'], id: string, sectionIds: readonly string[], place: Place): boolean {
  if (role === 'lead' || role === 'instructor') return true
  if (role === 'student' && policy.opened && place.openSectionIds && !place.openSectionIds.some(section => sectionIds.includes(section))) return false
  if (policy.scope === 'course') return true
  const inSection = place.sectionIds.length === 0 || place.sectionIds.some(section => sectionIds.includes(section))
  if (!inSection) return false
  if (policy.scope === 'own' && role === 'student') return place.ownerIds.length === 0 || place.ownerIds.includes(id)
  return true
}
