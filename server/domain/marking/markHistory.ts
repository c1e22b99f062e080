import type { MarkHistoryEntry } from '#shared/schemas/marks'
import type { Read } from '../../db/writer'
import { erasedText, readPrivateTexts } from '../ledger/readPrivateTexts'

/** Everything that touched the marks of a submission, as the ledger has it: when, who in which role, before and after, and why. */
export async function markHistory(read: Read, submissionId: string): Promise<MarkHistoryEntry[]> {
  const rows = await read.selectFrom('mark')
    .innerJoin('ledger_entry', join => join.onRef('ledger_entry.chain_id', '=', 'mark.ledger_chain').onRef('ledger_entry.seq', '=', 'mark.ledger_seq'))
    .leftJoin('ruling', join => join.onRef('ruling.ledger_chain', '=', 'mark.ledger_chain').onRef('ruling.ledger_seq', '=', 'mark.ledger_seq'))
    .leftJoin('membership', 'membership.id', 'ledger_entry.actor').leftJoin('person', 'person.id', 'membership.person_id')
    .select(['mark.step_key', 'mark.version', 'mark.points_milli', 'mark.max_milli', 'mark.cause', 'ledger_entry.at', 'ledger_entry.seq', 'ruling.reason_digest', 'membership.role', 'membership.pseudonym', 'person.display_name'])
    .where('mark.submission_id', '=', submissionId).orderBy('ledger_entry.seq').orderBy('mark.step_key').execute()
  const reasons = await readPrivateTexts(read, rows.flatMap(row => row.reason_digest ?? []))
  const last = new Map<string, number>()
  return rows.map((row) => {
    const beforeMilli = last.get(row.step_key) ?? null
    last.set(row.step_key, row.points_milli)
    return {
      seq: row.seq, at: new Date(row.at).toISOString(), stepKey: row.step_key, cause: row.cause, beforeMilli, afterMilli: row.points_milli, maxMilli: row.max_milli,
      by: row.display_name ?? row.pseudonym, role: row.role, reason: row.reason_digest === null ? null : reasons.get(row.reason_digest) ?? erasedText,
    }
  })
}
