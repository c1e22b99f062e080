import { keptQuery } from '../../db/keptQuery'
import type { Read } from '../../db/writer'
import type { Actor } from './actor'
import { heldSessions } from './heldSessions'
import { sessionLimits } from './sessionLimits'

export interface LiveSession { personId: string, displayName: string, email: string, seenAt: number }

/** Finds who a session belongs to, with roles as they are now; null when the session has ended in any way. */
export async function loadActor(read: Read, tokenSha256: Buffer, now: number): Promise<Actor | null> {
  const session = await findSession(read, tokenSha256, now)
  return session && loadRoles(read, session, tokenSha256, now)
}

const sessionByToken = keptQuery((db, given: { tokenSha256: Buffer }) => db.selectFrom('session').innerJoin('person', 'person.id', 'session.person_id')
  .select(['person.id as personId', 'person.display_name as displayName', 'person.email_norm as email', 'person.state as state', 'person.credential_epoch as epoch',
    'session.credential_epoch as sessionEpoch', 'session.ends_at as endsAt', 'session.ended_at as endedAt', 'session.seen_at as seenAt'])
  .where('session.token_sha256', '=', given.tokenSha256))

/** The session behind a token, unless it was ended, ran out, lay idle too long, or its person was closed or changed the passphrase since. */
export async function findSession(read: Read, tokenSha256: Buffer, now: number): Promise<LiveSession | null> {
  const session = (await sessionByToken(read, { tokenSha256 }))[0] ?? await findHeld(read, tokenSha256)
  if (!session || session.state !== 'active' || session.endedAt !== null || session.endsAt <= now || session.epoch !== session.sessionEpoch) return null
  if (session.seenAt + sessionLimits().idleMs <= now) return null
  return { personId: session.personId, displayName: session.displayName ?? '', email: session.email ?? '', seenAt: session.seenAt }
}

async function findHeld(read: Read, tokenSha256: Buffer) {
  const held = heldSessions.find(tokenSha256)
  if (!held) return undefined
  const person = await read.selectFrom('person').select(['id as personId', 'display_name as displayName', 'email_norm as email', 'state', 'credential_epoch as epoch']).where('id', '=', held.personId).executeTakeFirst()
  return person && { ...person, sessionEpoch: held.credentialEpoch, endsAt: held.endsAt, endedAt: null, seenAt: held.seenAt }
}

interface Of { personId: string }

/** A draft of a course is its staff's alone: for its students it is not there. */
const membershipsOf = keptQuery((db, given: Of) => db.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id').select(['membership.id', 'course_id', 'role', 'section_id'])
  .where('person_id', '=', given.personId).where('membership.state', '=', 'active').where(eb => eb.or([eb('role', '<>', 'student'), eb('course.state', '<>', 'draft')])))
const taSectionsOf = keptQuery((db, given: Of) => db.selectFrom('ta_section').innerJoin('membership', 'membership.id', 'ta_section.membership_id')
  .select(['ta_section.membership_id as id', 'ta_section.section_id as sectionId']).where('membership.person_id', '=', given.personId))
const departmentRolesOf = keptQuery((db, given: Of) => db.selectFrom('department_role').select(['id', 'role', 'scope_json', 'until_at']).where('person_id', '=', given.personId).where('state', '=', 'active'))

export async function loadRoles(read: Read, session: LiveSession, tokenSha256: Buffer, now: number): Promise<Actor> {
  const [memberships, taSections, departmentRoles] = await Promise.all([membershipsOf(read, session), taSectionsOf(read, session), departmentRolesOf(read, session)])
  return {
    personId: session.personId,
    displayName: session.displayName,
    email: session.email,
    sessionId: tokenSha256.toString('hex'),
    memberships: memberships.map(row => ({
      id: row.id, courseId: row.course_id, role: row.role,
      sectionIds: row.role === 'student' ? (row.section_id === null ? [] : [row.section_id]) : taSections.filter(ta => ta.id === row.id).map(ta => ta.sectionId),
    })),
    departmentRoles: departmentRoles.filter(row => row.until_at === null || row.until_at > now)
      .map(row => ({ id: row.id, role: row.role, scopeJson: row.scope_json, untilAt: row.until_at })),
  }
}
