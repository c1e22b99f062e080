import type { Stores } from '../../db/writer'
import { queueNotice } from '../notices/queueNotice'
import { issueToken } from './oneTimeToken'

/** Mails the link to a new passphrase, where there is an active account with this address. */
export async function sendReset({ read, write }: Stores, { email, jobId }: { email: string, jobId: string }, now: number): Promise<void> {
  const person = await read.selectFrom('person').select('id').where('email_norm', '=', email).where('state', '=', 'active').executeTakeFirst()
  await write(async (trx) => {
    // What was typed may be anybody's address: it is not kept.
    await trx.updateTable('job').set({ payload_json: '{}' }).where('id', '=', jobId).execute()
    if (!person) return
    const tokenId = await issueToken(trx, { purpose: 'reset', personId: person.id, now })
    await queueNotice(trx, { eventKey: `passphrase_reset:${tokenId}`, template: 'passphrase_reset', facts: { tokenId }, toPersonId: person.id, now })
  })
}
