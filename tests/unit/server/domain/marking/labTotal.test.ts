import { describe, expect, it } from 'vitest'
import type { LateRule } from '#shared/schemas/lab'
import { labTotal, totalOfAttempt, type MarkedAttempt } from '../../../../../server/domain/marking/labTotal'

const ofMaximum = (percent: number): LateRule => ({ kind: 'of_maximum', percent, closesAfterDays: 30 })
const ofEarned = (percent: number): LateRule => ({ kind: 'of_earned', percent, closesAfterDays: 30 })
const attempt = (no: number, points: readonly number[], max: readonly number[], lateUnits = 0, rule: LateRule = { kind: 'none' }): MarkedAttempt =>
  ({ submissionId: `s${no}`, attempt: no, lateUnits, lateRuleJson: JSON.stringify(rule), marks: points.map((pointsMilli, at) => ({ pointsMilli, maxMilli: max[at]! })) })

describe('a lab’s total', () => {
  it('K1: 82 of 100 over two steps, one started day at 10 of the maximum, is 72, taken off once', () => {
    expect(totalOfAttempt(attempt(1, [50_000, 32_000], [60_000, 40_000], 1, ofMaximum(10)))).toMatchObject({ earnedMilli: 82_000, maxMilli: 100_000, totalMilli: 72_000 })
  })

  it('K2: 20 % late on 60 of 100 is 48 of what was earned, 40 of the maximum', () => {
    expect(totalOfAttempt(attempt(1, [60_000], [100_000], 1, ofEarned(20))).totalMilli).toBe(48_000)
    expect(totalOfAttempt(attempt(1, [60_000], [100_000], 1, ofMaximum(20))).totalMilli).toBe(40_000)
  })

  it('K3: the best attempt is chosen after lateness: 70 on time stays against 85 late at 20 % of what was earned', () => {
    const attempts = [attempt(1, [70_000], [100_000]), attempt(2, [85_000], [100_000], 1, ofEarned(20))]
    expect(labTotal(attempts, 'best')).toMatchObject({ attempt: 1, totalMilli: 70_000 })
    expect(labTotal(attempts, 'last')).toMatchObject({ attempt: 2, totalMilli: 68_000 })
  })

  it('of equal attempts is that of the earlier one, and does not depend on the order in which they are read', () => {
    const attempts = [attempt(2, [5_000], [9_000]), attempt(1, [5_000], [9_000])]
    expect(labTotal(attempts, 'best')?.attempt).toBe(1)
    expect(labTotal(attempts.toReversed(), 'best')?.attempt).toBe(1)
  })

  it('K13: is rounded half up once: 8.350 marks at 10 % of what was earned is 7.515', () => {
    expect(totalOfAttempt(attempt(1, [8_350], [10_000], 1, ofEarned(10))).totalMilli).toBe(7_515)
    expect(totalOfAttempt(attempt(1, [1], [10_000], 1, ofEarned(50))).totalMilli).toBe(1)
  })

  it('is null where nothing was handed in', () => {
    expect(labTotal([], 'best')).toBeNull()
  })
})
