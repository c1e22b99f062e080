import type { SubmissionListEntry } from '#shared/schemas/work'
import type { Read } from '../../db/writer'
import { acceptedLateness } from '../repairs/acceptedLateness'

/** The attempts that were handed in for a share, first attempt first. */
export async function listSubmissions(read: Read, shareId: string): Promise<SubmissionListEntry[]> {
  const rows = await read.selectFrom('submission').select(['id', 'attempt', 'receipt_no', 'received_at', 'late_units']).where('share_id', '=', shareId).orderBy('attempt').execute()
  const accepted = await acceptedLateness(read, rows.map(row => row.id))
  return rows.map(row => ({ submissionId: row.id, attempt: row.attempt, receiptNo: row.receipt_no, at: new Date(row.received_at).toISOString(), lateDays: accepted.get(row.id)?.lateUnits ?? row.late_units }))
}
