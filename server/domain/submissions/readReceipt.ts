import { refuse } from '#shared/errors'
import type { Receipt } from '#shared/schemas/work'
import type { Read } from '../../db/writer'

/** The receipt of a submission, made of what is stored: the same bytes each time. */
export async function readReceipt(read: Read, receiptNo: string): Promise<Receipt> {
  const row = await read.selectFrom('submission')
    .innerJoin('ledger_entry', join => join.onRef('ledger_entry.chain_id', '=', 'submission.ledger_chain').onRef('ledger_entry.seq', '=', 'submission.ledger_seq'))
    .select(['submission.receipt_no as no', 'submission.received_at as receivedAt', 'ledger_entry.digest', 'ledger_entry.chain_id as chain', 'ledger_entry.seq as seq'])
    .where('submission.receipt_no', '=', receiptNo).executeTakeFirst()
  if (!row) return refuse('not_found')
  return { no: row.no, at: new Date(row.receivedAt).toISOString(), digest: row.digest.toString('hex'), ledger: { chain: row.chain, seq: row.seq } }
}
