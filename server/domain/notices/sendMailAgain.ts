import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { appendEntry, departmentChain } from '../ledger/appendEntry'

/** Puts a mail that was given up, or that waits for its next try, at the head of the outbox again, under the same Message-ID. */
export function sendMailAgain({ write }: Stores, input: Asked & { mailId: string }, now: number): Promise<{ state: 'waiting' }> {
  return write(trx => doOnce(trx, input, async () => {
    const mail = await trx.selectFrom('outbox').select(['id', 'state', 'template']).where('id', '=', input.mailId).executeTakeFirst()
    if (!mail) return refuse('not_found')
    if (mail.state === 'sent') refuse('invalid', {}, [{ path: 'state', message: 'This mail went out.' }])
    await trx.updateTable('outbox').set({ state: 'waiting', attempts: 0, next_at: now }).where('id', '=', mail.id).execute()
    await appendEntry(trx, { chain: departmentChain, at: now, actor: input.actorId, action: 'mail.sent_again', facts: { mailId: mail.id, template: mail.template, before: mail.state } })
    return { state: 'waiting' as const }
  }))
}
