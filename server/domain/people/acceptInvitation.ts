import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { checkPassphrase } from './checkPassphrase'
import { spendToken } from './oneTimeToken'
import { hashPassphrase } from './passphrase'
import { readInvitation } from './readInvitation'

/** Takes an invitation up: the first passphrase, and the account is active. The link is good once. */
export async function acceptInvitation({ read, write }: Stores, { token, passphrase }: { token: string, passphrase: string }, now: number): Promise<{ email: string }> {
  const invited = await readInvitation(read, token, now)
  checkPassphrase(passphrase, [invited.email, invited.name])
  const argon2id = await hashPassphrase(passphrase)
  await write(async (trx) => {
    await spendToken(trx, { purpose: 'invite', token, now })
    const changed = await trx.updateTable('person').set({ state: 'active' }).where('id', '=', invited.personId).where('state', '=', 'invited').executeTakeFirst()
    if (changed.numUpdatedRows === 0n) refuse('token_invalid')
    await trx.insertInto('credential').values({ person_id: invited.personId, argon2id, changed_at: now }).onConflict(conflict => conflict.column('person_id').doUpdateSet({ argon2id, changed_at: now })).execute()
  })
  return { email: invited.email }
}
