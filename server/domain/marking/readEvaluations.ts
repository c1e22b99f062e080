import type { EvaluationTable } from '../../db/schema/work'
import type { Read } from '../../db/writer'

export interface StoredStep {
  submissionId: string
  stepKey: string
  typed: string
  pointsMilli: number
  maxMilli: number
  evaluation: EvaluationTable | null
}

/** What stands now for each step of some submissions: what was typed, the mark in force, and the evaluation that it rests on. */
export async function currentSteps(read: Read, submissionIds: readonly string[]): Promise<StoredStep[]> {
  if (submissionIds.length === 0) return []
  const marks = await read.selectFrom('mark_current').innerJoin('answer', join => join.onRef('answer.submission_id', '=', 'mark_current.submission_id').onRef('answer.step_key', '=', 'mark_current.step_key'))
    .select(['mark_current.submission_id', 'mark_current.step_key', 'answer.typed', 'mark_current.points_milli', 'mark_current.max_milli', 'mark_current.evaluation_id'])
    .where('mark_current.submission_id', 'in', [...submissionIds]).execute()
  const evaluations = await read.selectFrom('evaluation').selectAll().where('submission_id', 'in', [...submissionIds]).orderBy('id').execute()
  const byId = new Map(evaluations.map(row => [row.id, row]))
  // A mark given by hand names no evaluation: the step is still explained by the last one made for it.
  const lastOf = new Map(evaluations.map(row => [`${row.submission_id} ${row.step_key}`, row]))
  return marks.map(row => ({
    submissionId: row.submission_id, stepKey: row.step_key, typed: row.typed, pointsMilli: row.points_milli, maxMilli: row.max_milli,
    evaluation: (row.evaluation_id === null ? undefined : byId.get(row.evaluation_id)) ?? lastOf.get(`${row.submission_id} ${row.step_key}`) ?? null,
  }))
}
