import type { Stores } from '../../db/writer'

export interface OutboxMail { template: string, facts: unknown, to: { name: string, address: string }, messageId: string }

/** A mail that can never be sent as it is: its facts or its address are wrong. */
export class UnsendableMail extends Error {
  override readonly name = 'UnsendableMail'
}

const mostAttempts = 12
/** Minutes to wait after each failed attempt; the last one repeats. */
const backoffMinutes = [1, 2, 5, 15, 30, 60, 120, 240]

export interface Delivered { sent: number, failed: number, dead: number }

/**
 * Sends what waits in the outbox, oldest first. Marked as sent only after the mail server took it: a crash in between
 * sends the same mail again under the same Message-ID, so that nobody goes without and a mail program shows it once.
 * A receipt's place in the ledger is noted as anchored outside.
 */
export async function deliverOutbox({ read, write }: Stores, send: (mail: OutboxMail) => Promise<void>, now: () => number, most = 50): Promise<Delivered> {
  const rows = await read.selectFrom('outbox')
    .leftJoin('membership', 'membership.id', 'outbox.to_membership_id')
    .leftJoin('person as direct', 'direct.id', 'outbox.to_person_id')
    .leftJoin('person as member', 'member.id', 'membership.person_id')
    .select(['outbox.id', 'outbox.template', 'outbox.facts_json', 'outbox.attempts', 'outbox.message_id', 'outbox.to_membership_id', 'outbox.to_person_id',
      'direct.email_norm as directEmail', 'direct.display_name as directName', 'direct.state as directState', 'member.email_norm as memberEmail', 'member.display_name as memberName', 'member.state as memberState'])
    .where('outbox.state', '=', 'waiting').where('outbox.next_at', '<=', now()).orderBy('outbox.next_at').orderBy('outbox.id').limit(most).execute()
  const delivered: Delivered = { sent: 0, failed: 0, dead: 0 }
  for (const row of rows) {
    const address = row.directEmail ?? row.memberEmail
    const state = row.directState ?? row.memberState
    const facts: unknown = JSON.parse(row.facts_json)
    try {
      if (address === null || (state !== 'active' && state !== 'invited')) throw new UnsendableMail('nobody to write to')
      await send({ template: row.template, facts, to: { name: row.directName ?? row.memberName ?? '', address }, messageId: row.message_id })
    }
    catch (error) {
      const isDead = error instanceof UnsendableMail || row.attempts + 1 >= mostAttempts
      const wait = 60_000 * (backoffMinutes[row.attempts] ?? 240)
      await write(trx => trx.updateTable('outbox').set({ state: isDead ? 'dead' : 'waiting', attempts: row.attempts + 1, next_at: now() + wait }).where('id', '=', row.id).execute())
      delivered[isDead ? 'dead' : 'failed']++
      continue
    }
    await write(async (trx) => {
      await trx.updateTable('outbox').set({ state: 'sent', attempts: row.attempts + 1 }).where('id', '=', row.id).execute()
      const anchored = row.template === 'receipt' ? placeInLedger(facts) : null
      const entry = anchored && await trx.selectFrom('ledger_entry').select('digest').where('chain_id', '=', anchored.chain).where('seq', '=', anchored.seq).executeTakeFirst()
      if (anchored && entry) {
        await trx.insertInto('ledger_anchor').values({ chain_id: anchored.chain, seq: anchored.seq, sent_to: row.to_membership_id ?? row.to_person_id ?? '', digest: entry.digest, sent_at: now() })
          .onConflict(conflict => conflict.columns(['chain_id', 'seq', 'sent_to']).doNothing()).execute()
      }
    })
    delivered.sent++
  }
  return delivered
}

function placeInLedger(facts: unknown): { chain: string, seq: number } | null {
  if (typeof facts !== 'object' || facts === null || !('chain' in facts) || !('seq' in facts)) return null
  return typeof facts.chain === 'string' && typeof facts.seq === 'number' ? { chain: facts.chain, seq: facts.seq } : null
}
