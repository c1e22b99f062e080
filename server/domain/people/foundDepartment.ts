import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { newId } from '../ids'
import { appendEntry, departmentChain } from '../ledger/appendEntry'
import { addInvited } from './invitePerson'
import { freeDepartmentPseudonym } from './departmentRoles'

/**
 * The first step in an empty installation: one admin, who is invited by mail and lets everybody else in. The house itself stands in the
 * ledger as the one who did it.
 * @throws {DomainError} `already_exists` once there is anybody
 */
export function foundDepartment({ write }: Stores, admin: { name: string, email: string }, now: number): Promise<{ personId: string, roleId: string }> {
  return write(async (trx) => {
    if (await trx.selectFrom('person').select('id').limit(1).executeTakeFirst()) refuse('already_exists', { what: 'The department' })
    const personId = await addInvited(trx, admin, now)
    const roleId = newId(now)
    const house = newId(now)
    await trx.insertInto('actor').values([{ id: house, kind: 'system' }, { id: roleId, kind: 'department_role' }]).execute()
    await trx.insertInto('department_role').values({
      id: roleId, person_id: personId, pseudonym: await freeDepartmentPseudonym(trx), role: 'admin', scope_json: null, until_at: null, state: 'active', created_at: now,
    }).execute()
    await appendEntry(trx, { chain: departmentChain, at: now, actor: house, action: 'department.founded', facts: { personId, roleId, role: 'admin' } })
    return { personId, roleId }
  })
}
