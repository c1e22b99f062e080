import { refuse } from '#shared/errors'
import { lateRule } from '#shared/schemas/lab'
import type { MarkedStep, SubmissionMarks } from '#shared/schemas/marks'
import type { Read } from '../../db/writer'
import { getDraw, itemOf } from '../shares/draws'
import { attemptsOfShares } from './attemptsOf'
import { labTotal, totalOfAttempt } from './labTotal'
import { lateWords } from './lateWords'
import { markedStep, stepsOfBody } from './markedStep'
import { markHistory } from './markHistory'
import { objectUntil } from './objectUntil'
import { currentSteps } from './readEvaluations'

/**
 * Everything about the marks of one submission. A student gets it once marks are released to their section; before that, where
 * the lab gives feedback at once, only whether each step is right and its marks. Staff look at it at any time.
 * @throws {DomainError} `not_found`, `not_released`
 */
export async function submissionMarks(read: Read, who: { isStaff: boolean, membershipId: string }, submissionId: string): Promise<SubmissionMarks> {
  const row = await read.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('lab', 'lab.id', 'share.lab_id')
    .innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').innerJoin('membership', 'membership.id', 'holder_member.membership_id')
    .innerJoin('lab_revision', 'lab_revision.id', 'submission.lab_revision_id')
    .leftJoin('posting', join => join.onRef('posting.lab_id', '=', 'share.lab_id').onRef('posting.section_id', '=', 'membership.section_id'))
    .select(['submission.id', 'submission.share_id', 'submission.receipt_no', 'submission.attempt', 'submission.received_at', 'submission.due_at_applied',
      'lab.id as labId', 'lab.title', 'lab_revision.no as revisionNo', 'lab_revision.body_json', 'share.ordinal', 'share.draw_id', 'membership.id as membershipId',
      'posting.released_at', 'posting.feedback', 'posting.zone', 'posting.keep'])
    .where('submission.id', '=', submissionId).execute()
  const submission = who.isStaff ? row[0] : row.find(each => each.membershipId === who.membershipId)
  if (!submission) return refuse('not_found')
  const isWhole = who.isStaff || submission.released_at !== null
  if (!isWhole && submission.feedback !== 'at_once') return refuse('not_released')
  const [steps, attempts, history, draw] = await Promise.all([
    currentSteps(read, [submissionId]), attemptsOfShares(read, [submission.share_id]), markHistory(read, submissionId), getDraw(read, submission.draw_id),
  ])
  const { asks } = itemOf(draw, submission.ordinal)
  const made = attempts.get(submission.share_id) ?? []
  const own = made.find(attempt => attempt.submissionId === submissionId)
  const build = await read.selectFrom('evaluation').innerJoin('reference_build', 'reference_build.digest', 'evaluation.reference_digest').innerJoin('convention_revision', 'convention_revision.id', 'evaluation.convention_revision_id')
    .select(['reference_build.version', 'convention_revision.convention_key', 'convention_revision.no']).where('evaluation.submission_id', '=', submissionId).limit(1).executeTakeFirst()
  if (!own || !build) throw new Error(`Submission ${submissionId} has no marks.`)
  const total = totalOfAttempt(own)
  // As staff accepted it, where they did.
  const rule = lateRule.parse(JSON.parse(own.lateRuleJson))
  return {
    submissionId, labId: submission.labId, labTitle: submission.title, revisionNo: submission.revisionNo, receiptNo: submission.receipt_no, attempt: submission.attempt,
    counts: labTotal(made, submission.keep ?? 'best')?.submissionId === submissionId,
    submittedAt: new Date(submission.received_at).toISOString(), zone: submission.zone ?? 'UTC', lateDays: own.lateUnits, lateWords: own.isAccepted ? `${lateWords(rule, own.lateUnits)}, as staff accepted it` : lateWords(rule, own.lateUnits),
    releasedAt: submission.released_at === null ? null : new Date(submission.released_at).toISOString(),
    isWhole, objectUntil: submission.released_at === null || submission.zone === null ? null : new Date(objectUntil(submission.released_at, submission.zone)).toISOString(),
    earnedMilli: total.earnedMilli, maxMilli: total.maxMilli, totalMilli: total.totalMilli,
    reference: build.version, convention: `${build.convention_key}, revision ${build.no}`, shareNo: submission.ordinal + 1,
    steps: stepsOfBody(submission.body_json).flatMap((step, at) => {
      const stored = steps.find(each => each.stepKey === step.key)
      const marked = stored ? markedStep(step, at + 1, asks[step.key] ?? step.title, stored) : null
      return marked ? [isWhole ? marked : rightOrNot(marked)] : []
    }),
    history,
  }
}

/** Feedback at once: right or not, and the marks. No band, no worked value, no slip and no direction, which further attempts could search. */
function rightOrNot(step: MarkedStep): MarkedStep {
  const isWrong = step.judged === 'above' || step.judged === 'below'
  return { ...step, judged: isWrong ? 'wrong' : step.judged, bar: null, carriedBar: null, carriedNote: null, slip: null, worked: { value: '', unit: '', reason: null, lines: [] }, notes: [] }
}
