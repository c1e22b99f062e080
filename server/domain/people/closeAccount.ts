import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { appendEntry, departmentChain } from '../ledger/appendEntry'
import { assertOtherAdmin } from './departmentRoles'

/** Closes an account: its sessions end with it, links sent to it stop working, and what the person did stays. */
export function closeAccount({ write }: Stores, input: Asked & { personId: string }, now: number): Promise<{ state: 'closed' }> {
  return write(trx => doOnce(trx, input, async () => {
    const person = await trx.selectFrom('person').select(['state', 'credential_epoch']).where('id', '=', input.personId).executeTakeFirst()
    if (!person || person.state === 'erased') refuse('not_found')
    if (person.state === 'closed') return { state: 'closed' as const }
    await assertOtherAdmin(trx, input.personId, now)
    await trx.updateTable('person').set({ state: 'closed', credential_epoch: person.credential_epoch + 1 }).where('id', '=', input.personId).execute()
    await trx.updateTable('session').set({ ended_at: now, ended_why: 'account_closed' }).where('person_id', '=', input.personId).where('ended_at', 'is', null).execute()
    await trx.updateTable('one_time_token').set({ used_at: now }).where('person_id', '=', input.personId).where('used_at', 'is', null).execute()
    await appendEntry(trx, { chain: departmentChain, at: now, actor: input.actorId, action: 'account.closed', facts: { personId: input.personId } })
    return { state: 'closed' as const }
  }))
}

/** Opens a closed account again; whoever never chose a passphrase is invited anew by `inviteAgain`. */
export function reopenAccount({ write }: Stores, input: Asked & { personId: string }, now: number): Promise<{ state: 'active' | 'invited' }> {
  return write(trx => doOnce(trx, input, async () => {
    const person = await trx.selectFrom('person').leftJoin('credential', 'credential.person_id', 'person.id').select(['person.state', 'credential.changed_at as passphraseAt']).where('person.id', '=', input.personId).executeTakeFirst()
    if (!person || person.state === 'erased') refuse('not_found')
    const state = person.passphraseAt === null ? 'invited' as const : 'active' as const
    if (person.state !== 'closed') return { state }
    await trx.updateTable('person').set({ state }).where('id', '=', input.personId).execute()
    await appendEntry(trx, { chain: departmentChain, at: now, actor: input.actorId, action: 'account.reopened', facts: { personId: input.personId } })
    return { state }
  }))
}
