import type { Accepted } from '#shared/marking/types'
import type { Read } from '../../db/writer'
import type { EvaluationTable } from '../../db/schema/work'
import { getConvention } from '../labs/conventions'
import type { Reference } from '../marking/reference'
import { questionOfRow, type Judged } from '../marking/storedEvaluation'

/** A submission whose mark an acceptance would raise, with what it was judged from. */
export interface LikeCase {
  submissionId: string
  membershipId: string
  student: string
  shareNo: number
  typed: string
  markVersion: number
  beforeMilli: number
  afterMilli: number
  maxMilli: number
  hasAsked: boolean
  row: EvaluationTable
  judged: Judged
}

/**
 * Judges one step of every submission of a lab again as if `accept` counted as right, and gives those whose mark would rise.
 * What is accepted for one is accepted for all who did the same, whether they asked or not; no mark goes down by it.
 */
export async function likeCases(db: Read, reference: Reference, labId: string, stepKey: string, accept: Accepted): Promise<LikeCase[]> {
  const rows = await db.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id')
    .innerJoin('mark_current', join => join.onRef('mark_current.submission_id', '=', 'submission.id').on('mark_current.step_key', '=', stepKey))
    .innerJoin('answer', join => join.onRef('answer.submission_id', '=', 'submission.id').on('answer.step_key', '=', stepKey))
    .innerJoin('membership', 'membership.id', 'submission.by_membership_id').leftJoin('person', 'person.id', 'membership.person_id')
    .leftJoin('dispute', join => join.onRef('dispute.submission_id', '=', 'submission.id').on('dispute.step_key', '=', stepKey).on('dispute.state', 'in', ['open', 'taken', 'appealed']))
    .select(['submission.id', 'membership.id as membershipId', 'membership.pseudonym', 'person.display_name', 'share.ordinal', 'answer.typed', 'mark_current.version', 'mark_current.points_milli', 'mark_current.max_milli', 'dispute.id as disputeId'])
    .where('share.lab_id', '=', labId).orderBy('submission.seq').execute()
  if (rows.length === 0) return []
  const evaluations = await db.selectFrom('evaluation').selectAll().where('step_key', '=', stepKey).where('submission_id', 'in', rows.map(row => row.id)).orderBy('id').execute()
  const lastOf = new Map(evaluations.map(row => [row.submission_id, row]))
  const conventions = new Map(await Promise.all([...new Set(evaluations.map(row => row.convention_revision_id))].map(async id => [id, await getConvention(db, id)] as const)))
  const cases: LikeCase[] = []
  for (const row of rows) {
    const evaluation = lastOf.get(row.id)
    const convention = evaluation && conventions.get(evaluation.convention_revision_id)
    if (!evaluation || !convention) continue
    const { question, answer } = questionOfRow(evaluation, convention)
    const widened = { ...question, accepted: [...(question.accepted ?? []), accept] }
    const judgement = reference.judgeStep(widened, answer)
    if (judgement.pointsMilli <= row.points_milli) continue
    cases.push({
      submissionId: row.id, membershipId: row.membershipId, student: row.display_name ?? row.pseudonym, shareNo: row.ordinal + 1, typed: row.typed, markVersion: row.version,
      beforeMilli: row.points_milli, afterMilli: judgement.pointsMilli, maxMilli: row.max_milli, hasAsked: row.disputeId !== null, row: evaluation,
      judged: { stepKey, question: widened, answer, judgement },
    })
  }
  return cases
}

