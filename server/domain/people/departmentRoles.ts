import { refuse } from '#shared/errors'
import type { Stores, Trx } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import type { DepartmentRoleName } from '../policies'
import { newId } from '../ids'
import { appendEntry, departmentChain } from '../ledger/appendEntry'
import { resolveWallTime } from '../terms/wallClock'
import { drawPseudonym } from './pseudonym'

export interface DepartmentRoleGrant { personId: string, role: DepartmentRoleName, courseIds: readonly string[], /** Last day of it, on the department's wall. */ until: string | null }

/** Gives a person a role in the department. A visitor reads stated courses until a stated day. */
export function setDepartmentRole({ write }: Stores, input: Asked & DepartmentRoleGrant, now: number): Promise<{ id: string }> {
  return write(trx => doOnce(trx, input, async () => {
    const person = await trx.selectFrom('person').select('state').where('id', '=', input.personId).executeTakeFirst()
    if (!person || person.state === 'erased' || person.state === 'closed') refuse('not_found')
    if (input.role === 'visitor' && (input.until === null || input.courseIds.length === 0)) refuse('invalid', {}, [{ path: 'until', message: 'A visitor reads stated courses until a stated day.' }])
    const held = await trx.selectFrom('department_role').select('id').where('person_id', '=', input.personId).where('role', '=', input.role).where('state', '=', 'active').executeTakeFirst()
    if (held) refuse('already_exists', { what: `The role of ${input.role}` })
    const untilAt = input.until === null ? null : await endOfDay(trx, input.until)
    const id = newId(now)
    await trx.insertInto('actor').values({ id, kind: 'department_role' }).execute()
    await trx.insertInto('department_role').values({
      id, person_id: input.personId, pseudonym: await freeDepartmentPseudonym(trx), role: input.role,
      scope_json: input.role === 'visitor' ? JSON.stringify({ courseIds: input.courseIds }) : null, until_at: untilAt, state: 'active', created_at: now,
    }).execute()
    await appendEntry(trx, { chain: departmentChain, at: now, actor: input.actorId, action: 'department_role.given', facts: { personId: input.personId, roleId: id, role: input.role, untilAt, courseIds: input.courseIds } })
    return { id }
  }))
}

/** Ends a role in the department. The last admin stays: somebody must be able to open the door. */
export function endDepartmentRole({ write }: Stores, input: Asked & { roleId: string }, now: number): Promise<{ id: string }> {
  return write(trx => doOnce(trx, input, async () => {
    const held = await trx.selectFrom('department_role').select(['id', 'person_id', 'role', 'state']).where('id', '=', input.roleId).executeTakeFirst()
    if (!held) refuse('not_found')
    if (held.state === 'ended') return { id: held.id }
    if (held.role === 'admin' && held.person_id !== null) await assertOtherAdmin(trx, held.person_id, now)
    await trx.updateTable('department_role').set({ state: 'ended' }).where('id', '=', held.id).execute()
    await appendEntry(trx, { chain: departmentChain, at: now, actor: input.actorId, action: 'department_role.ended', facts: { roleId: held.id, role: held.role } })
    return { id: held.id }
  }))
}

/** Refuses when this person is the only one left who can act as admin. */
export async function assertOtherAdmin(trx: Trx, personId: string, now: number): Promise<void> {
  const admins = await trx.selectFrom('department_role').innerJoin('person', 'person.id', 'department_role.person_id').select(['person.id', 'department_role.until_at as untilAt'])
    .where('department_role.role', '=', 'admin').where('department_role.state', '=', 'active').where('person.state', '=', 'active').execute()
  const able = admins.filter(admin => admin.untilAt === null || admin.untilAt > now)
  if (able.some(admin => admin.id === personId) && !able.some(admin => admin.id !== personId)) refuse('last_admin')
}

export async function freeDepartmentPseudonym(trx: Trx): Promise<string> {
  for (;;) {
    const pseudonym = drawPseudonym()
    if (!await trx.selectFrom('department_role').select('id').where('pseudonym', '=', pseudonym).executeTakeFirst()) return pseudonym
  }
}

/** The end of a day where the department's newest term keeps its clock. */
async function endOfDay(trx: Trx, date: string): Promise<number> {
  const term = await trx.selectFrom('term').select('zone').orderBy('starts_on', 'desc').limit(1).executeTakeFirst()
  return resolveWallTime(`${date}T23:59`, term?.zone ?? 'UTC').at + 60_000
}
