import type { Read } from '../../db/writer'
import { acceptedLateness } from '../repairs/acceptedLateness'
import type { MarkedAttempt } from './labTotal'

export interface StoredAttempt extends MarkedAttempt {
  shareId: string
  labId: string
  receivedAt: number
  receiptNo: string
  /** Staff accepted its lateness: the late rule counts as they accepted it, not as it was decided at receipt. */
  isAccepted: boolean
  /** When the device says it was sent, where it could not be sent at once: a claim. */
  claimedSentAt: number | null
}

/** The attempts of some shares with their current marks, by share, first attempt first. */
export async function attemptsOfShares(read: Read, shareIds: readonly string[]): Promise<Map<string, StoredAttempt[]>> {
  const found = new Map<string, StoredAttempt[]>()
  if (shareIds.length === 0) return found
  const submissions = await read.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id')
    .select(['submission.id', 'submission.share_id', 'share.lab_id', 'submission.attempt', 'submission.late_units', 'submission.late_rule_json', 'submission.received_at', 'submission.receipt_no', 'submission.claimed_sent_at'])
    .where('submission.share_id', 'in', [...shareIds]).orderBy('submission.attempt').execute()
  if (submissions.length === 0) return found
  const marks = await read.selectFrom('mark_current').select(['submission_id', 'step_key', 'points_milli', 'max_milli']).where('submission_id', 'in', submissions.map(row => row.id)).execute()
  const accepted = await acceptedLateness(read, submissions.map(row => row.id))
  const bySubmission = groupBy(marks, mark => mark.submission_id)
  for (const row of submissions) {
    const attempt: StoredAttempt = {
      submissionId: row.id, shareId: row.share_id, labId: row.lab_id, attempt: row.attempt, lateUnits: row.late_units, lateRuleJson: row.late_rule_json, ...accepted.get(row.id), isAccepted: accepted.has(row.id),
      receivedAt: row.received_at, receiptNo: row.receipt_no, claimedSentAt: row.claimed_sent_at,
      marks: (bySubmission.get(row.id) ?? []).map(mark => ({ pointsMilli: mark.points_milli, maxMilli: mark.max_milli })),
    }
    found.set(row.share_id, [...(found.get(row.share_id) ?? []), attempt])
  }
  return found
}

function groupBy<K, T>(items: readonly T[], key: (item: T) => K): Map<K, T[]> {
  const groups = new Map<K, T[]>()
  for (const item of items) {
    const group = groups.get(key(item))
    if (group) group.push(item)
    else groups.set(key(item), [item])
  }
  return groups
}
