import type { Read } from '../../db/writer'

/** Work as its lateness was decided at receipt, and what may be said against that since. */
export interface LateWork {
  id: string, shareId: string, labId: string, title: string, zone: string, receivedAt: number, dueAt: number, lateUnits: number, lateRuleJson: string, claimedSentAt: number | null
  /** Staff accepted it once already. */
  isAccepted: boolean
  /** The student's due as it stands: the latest of section, extension and accommodation. It is never before the due applied at receipt. */
  presentDueAt: number
}

/** What a student handed in, of one lab or one submission. */
export async function lateWorkOf(db: Read, membershipId: string, of: { labId: string } | { submissionId: string }): Promise<LateWork[]> {
  const rows = await db.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').innerJoin('membership', 'membership.id', 'holder_member.membership_id')
    .innerJoin('lab', 'lab.id', 'share.lab_id').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
    .leftJoin('posting', join => join.onRef('posting.lab_id', '=', 'lab.id').onRef('posting.section_id', '=', 'membership.section_id'))
    .leftJoin('repair', 'repair.submission_id', 'submission.id')
    .select(eb => ['submission.id', 'share.id as shareId', 'lab.id as labId', 'lab.title', 'term.zone', 'submission.received_at as receivedAt', 'submission.due_at_applied as dueAt', 'submission.late_units as lateUnits', 'submission.late_rule_json as lateRuleJson', 'submission.claimed_sent_at as claimedSentAt',
      'repair.id as acceptedBy', 'posting.due_at as sectionDueAt',
      eb.selectFrom('allowance').select(inner => inner.fn.max('allowance.due_at').as('until')).whereRef('allowance.posting_id', '=', 'posting.id').whereRef('allowance.membership_id', '=', 'membership.id').as('allowedUntil')])
    .where('membership.id', '=', membershipId).where('labId' in of ? 'lab.id' : 'submission.id', '=', 'labId' in of ? of.labId : of.submissionId).orderBy('submission.attempt').execute()
  return rows.map(({ acceptedBy, sectionDueAt, allowedUntil, ...row }) => ({ ...row, isAccepted: acceptedBy !== null, presentDueAt: Math.max(row.dueAt, sectionDueAt ?? 0, allowedUntil ?? 0) }))
}
