import { countedMilli } from '#shared/marking/late'
import { lateRule } from '#shared/schemas/lab'

export interface MarkedAttempt {
  submissionId: string
  attempt: number
  lateUnits: number
  lateRuleJson: string
  marks: readonly { pointsMilli: number, maxMilli: number }[]
}

export interface LabTotal { submissionId: string, attempt: number, earnedMilli: number, maxMilli: number, totalMilli: number, lateDays: number }

/** The total of one attempt: the steps' marks added up, and lateness, as it was decided at receipt, applied once. */
export function totalOfAttempt(attempt: MarkedAttempt): LabTotal {
  const earnedMilli = attempt.marks.reduce((sum, mark) => sum + mark.pointsMilli, 0)
  const maxMilli = attempt.marks.reduce((sum, mark) => sum + mark.maxMilli, 0)
  const totalMilli = countedMilli(lateRule.parse(JSON.parse(attempt.lateRuleJson)), attempt.lateUnits, earnedMilli, maxMilli)
  return { submissionId: attempt.submissionId, attempt: attempt.attempt, earnedMilli, maxMilli, totalMilli, lateDays: attempt.lateUnits }
}

/**
 * The lab's total: that of the attempt that counts, chosen after lateness: the last, or the best (of equals the earlier, which is the less late).
 * Null where nothing was handed in.
 */
export function labTotal(attempts: readonly MarkedAttempt[], keep: 'last' | 'best'): LabTotal | null {
  let chosen: LabTotal | null = null
  for (const attempt of attempts.toSorted((a, b) => a.attempt - b.attempt)) {
    const total = totalOfAttempt(attempt)
    if (chosen === null || keep === 'last' || total.totalMilli > chosen.totalMilli) chosen = total
  }
  return chosen
}
