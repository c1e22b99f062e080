import type { Trx } from '../../db/writer'
import { newId } from '../ids'
import { queueNotice } from '../notices/queueNotice'

/**
 * Stores a passphrase that was hashed before, ends every session but the one named, and tells the person by mail.
 * `credential_epoch` moves, so that a session which slipped in between is no good either.
 */
export async function setPassphrase(trx: Trx, { personId, argon2id, keepSession, why, now }: { personId: string, argon2id: string, keepSession?: Buffer, why: string, now: number }): Promise<void> {
  const { credential_epoch: epoch } = await trx.updateTable('person').set(({ eb }) => ({ credential_epoch: eb('credential_epoch', '+', 1) })).where('id', '=', personId).returning('credential_epoch').executeTakeFirstOrThrow()
  await trx.insertInto('credential').values({ person_id: personId, argon2id, changed_at: now })
    .onConflict(conflict => conflict.column('person_id').doUpdateSet({ argon2id, changed_at: now })).execute()
  if (keepSession) await trx.updateTable('session').set({ credential_epoch: epoch }).where('token_sha256', '=', keepSession).where('person_id', '=', personId).where('ended_at', 'is', null).execute()
  await trx.updateTable('session').set({ ended_at: now, ended_why: why }).where('person_id', '=', personId).where('ended_at', 'is', null).where('credential_epoch', '<', epoch).execute()
  await trx.updateTable('one_time_token').set({ used_at: now }).where('person_id', '=', personId).where('purpose', '=', 'reset').where('used_at', 'is', null).execute()
  await queueNotice(trx, { eventKey: `passphrase_changed:${newId(now)}`, template: 'passphrase_changed', facts: { at: now }, toPersonId: personId, now })
}
