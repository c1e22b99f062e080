import type { NoticeFacts } from '#shared/schemas/notices'
import type { Letter } from '../letter'
import { instantIn } from '../instantIn'

/** Says that a submission arrived, and carries the ledger's number and digest out of the house. */
export function receipt(facts: NoticeFacts<'receipt'>, link: (path: string) => string): Letter {
  return {
    subject: `Receipt ${facts.receiptNo}: ${facts.lab}`,
    says: [`Your work for ${facts.lab} (${facts.course}) has arrived. Keep this mail: it proves what arrived and when.`],
    facts: [
      ['Receipt', facts.receiptNo],
      ['Received', instantIn(facts.at, facts.zone)],
      ['Received (UTC)', new Date(facts.at).toISOString()],
      ['Digest (SHA-256)', facts.digest],
      ['Ledger', `${facts.chain} no. ${facts.seq}`],
    ],
    link: { words: 'See what you sent', url: link(facts.path) },
  }
}
