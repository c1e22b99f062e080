import { describe, expect, it } from 'vitest'
import { carriedFrom } from '#shared/marking/graph'
import { judgeStep } from '#shared/marking/judge'
import { countedMilli, latenessOf, personalDue } from '#shared/marking/late'
import { showMilli, splitMilli, withinStep } from '#shared/marking/points'
import { findQuantity } from '#shared/thermo/registry'
import { judgeTyped, kelvins, reading, stepOf } from '../../fixtures/marking/ask'

const at = (iso: string) => Date.parse(iso)
/** Due moved by n local dates where no clock changes. */
const plain = (dueAt: number) => (days: number) => dueAt + days * 86_400_000
const parcel = { temperature: 288.15, heightDifference: 1500 }
const input = (quantity: string, name: string) => {
  const found = findQuantity(quantity)?.inputs.find(one => one.name === name)
  if (!found) throw new Error(name)
  return found
}

describe('traps K: lateness', () => {
  it('K1: the personal due is the latest, then the rule once: 82 − 10 = 72, not 52', () => {
    const section = at('2026-11-06T17:00Z'), extension = at('2026-11-08T17:00Z')
    const due = personalDue(section, extension, null)
    const rule = { kind: 'of_maximum', percent: 10, closesAfterDays: 10 } as const
    const late = latenessOf(rule, at('2026-11-08T20:00Z'), due, plain(due))
    expect(late).toEqual({ isLate: true, startedDays: 1, isClosed: false })
    expect(countedMilli(rule, late.startedDays, 82_000, 100_000)).toBe(72_000)
  })
  it('K2: 20 % of what was earned or of the maximum: 48 or 40 of 60/100', () => {
    expect(countedMilli({ kind: 'of_earned', percent: 20, closesAfterDays: 5 }, 1, 60_000, 100_000)).toBe(48_000)
    expect(countedMilli({ kind: 'of_maximum', percent: 20, closesAfterDays: 5 }, 1, 60_000, 100_000)).toBe(40_000)
  })
  it('K3: the best attempt is chosen after lateness: 70 on time stays before 85 less 20 %', () => {
    expect(Math.max(70_000, countedMilli({ kind: 'of_earned', percent: 20, closesAfterDays: 5 }, 1, 85_000, 100_000))).toBe(70_000)
  })
  it('K4: open loses nothing until it closes; none counts nothing and never closes; nothing falls below 0', () => {
    const due = at('2026-11-06T17:00Z')
    const open = { kind: 'open', closesAfterDays: 3 } as const
    expect(countedMilli(open, 2, 60_000, 100_000)).toBe(60_000)
    expect(latenessOf(open, due + 3 * 86_400_000, due, plain(due))).toMatchObject({ startedDays: 3, isClosed: false })
    expect(latenessOf(open, due + 3 * 86_400_000 + 60_000, due, plain(due))).toMatchObject({ isClosed: true })
    expect(countedMilli({ kind: 'none' }, 1, 60_000, 100_000)).toBe(0)
    expect(latenessOf({ kind: 'none' }, due + 900 * 86_400_000, due, plain(due))).toMatchObject({ isLate: true, isClosed: false })
    expect(countedMilli({ kind: 'of_maximum', percent: 30, closesAfterDays: 9 }, 4, 60_000, 100_000)).toBe(0)
  })
  it('K5: due 23:59 is through 23:59:59.999', () => {
    const due = at('2026-11-06T23:59Z')
    expect(latenessOf({ kind: 'none' }, at('2026-11-06T23:59:30Z'), due, plain(due)).isLate).toBe(false)
    expect(latenessOf({ kind: 'none' }, at('2026-11-06T23:59:59.999Z'), due, plain(due)).isLate).toBe(false)
    expect(latenessOf({ kind: 'none' }, at('2026-11-07T00:00Z'), due, plain(due)).isLate).toBe(true)
  })
  it('K8: late days are local dates: due Sat 2026-10-24 23:59 Berlin, in Sun 23:58 (24 h 59 min later) is 1 day', () => {
    const due = at('2026-10-24T23:59+02:00')
    const moved = (days: number) => (days === 1 ? at('2026-10-25T23:59+01:00') : at('2026-10-26T23:59+01:00'))
    const received = at('2026-10-25T23:58+01:00')
    expect(received - due).toBe((24 * 60 + 59) * 60_000)
    expect(latenessOf({ kind: 'open', closesAfterDays: 5 }, received, due, moved).startedDays).toBe(1)
    expect(latenessOf({ kind: 'open', closesAfterDays: 5 }, at('2026-10-26T00:00+01:00'), due, moved).startedDays).toBe(2)
  })
  it('fractions of a thousandth are rounded half up once', () => {
    // 12.5 % of 1.001 marks leave 875.875; of 1.004: 878.5
    expect(countedMilli({ kind: 'of_earned', percent: 12.5, closesAfterDays: 5 }, 1, 1001, 2000)).toBe(876)
    expect(countedMilli({ kind: 'of_earned', percent: 12.5, closesAfterDays: 5 }, 1, 1004, 2000)).toBe(879)
  })
})

describe('traps K: points', () => {
  it('K13: rounding is for display, thresholds on the thousandths: 89.95 shows as 90.0 and stays below 90', () => {
    expect(showMilli(89_950, 1)).toBe('90.0')
    expect(showMilli(89_949, 1)).toBe('89.9')
    expect(89_950 >= 90_000).toBe(false)
    expect(showMilli(2000, 0)).toBe('2')
    expect(showMilli(5, 2)).toBe('0.01')
    expect(showMilli(-1500, 1)).toBe('−1.5')
  })
  it('K14: thirds of 2 marks add up to 2.000', () => {
    const parts = splitMilli(2000, [1, 1, 1])
    expect(parts).toEqual([667, 667, 666])
    expect(parts.reduce((sum, part) => sum + part, 0)).toBe(2000)
  })
  it('K15: a step stays within 0 and its maximum', () => {
    expect(withinStep(-200, 1000)).toBe(0)
    expect(withinStep(1200, 1000)).toBe(1000)
    expect(judgeTyped(stepOf('dry-adiabatic-lapse-rate', {}, { maxMilli: 1000, slipMilli: 5000 }), '-9.8').pointsMilli).toBe(1000)
  })
})

describe('traps K: carried values', () => {
  it('K16: Γ typed with a sign slip: the later class is judged on the true and on the own value, and either is right', () => {
    const question = stepOf('static-stability', { lapseRate: 0.012 }, { carried: { lapseRate: { valueSi: -0.012, halfUnitSi: 0.00005 } } })
    expect(judgeTyped(question, 'superadiabatic')).toMatchObject({ isAccepted: true, acceptedBy: 'word' })
    expect(judgeTyped(question, 'stable')).toMatchObject({ isAccepted: true, acceptedBy: 'carried' })
    expect(judgeTyped(question, 'neutral').isAccepted).toBe(false)
    expect(judgeTyped(stepOf('static-stability', { lapseRate: 0.012 }), 'stable').isAccepted).toBe(false)
  })
  it('K17: the note says which of the two a step was right by', () => {
    const question = stepOf('parcel-temperature-by-height', { ...parcel, lapseRate: 0.0098 }, { carried: { lapseRate: { valueSi: -0.0098, halfUnitSi: 0.00005 } } })
    const own = judgeTyped(question, '29.7 °C'), right = judgeTyped(question, '0.3 °C')
    expect(own).toMatchObject({ isAccepted: true, acceptedBy: 'carried' })
    expect(own.notes.join()).toContain('your own earlier one')
    expect(right).toMatchObject({ isAccepted: true, acceptedBy: 'band' })
    expect(judgeTyped(stepOf('parcel-temperature-by-height', { ...parcel, lapseRate: 0.0098 }), '29.7 °C').isAccepted).toBe(false)
  })
  it('K16: where the truth is "not defined" and the own earlier value leads to a number, that number counts as well, with its note', () => {
    const layer = { potentialTemperatureBottom: 303, potentialTemperatureTop: 300, depth: 1000 } // θ falls with height
    const question = stepOf('brunt-vaisala-frequency', layer, { carried: { potentialTemperatureTop: { valueSi: 306, halfUnitSi: 0.5 } } })
    const own = Math.sqrt(9.81 / 304.5 * 3 / 1000).toPrecision(3)
    expect(judgeTyped(question, 'not defined')).toMatchObject({ isAccepted: true, acceptedBy: 'word', pointsMilli: 1000 })
    expect(judgeTyped(question, `${own} s-1`)).toMatchObject({ outcome: 'not_defined', isAccepted: true, acceptedBy: 'carried', pointsMilli: 1000, notes: [expect.stringContaining('your own earlier one')] })
    expect(judgeTyped(question, `${2 * Number(own)} s-1`)).toMatchObject({ isAccepted: false, pointsMilli: 0 })
    expect(judgeTyped(stepOf('brunt-vaisala-frequency', layer), `${own} s-1`)).toMatchObject({ isAccepted: false, carriedBand: null })
  })
  it('K18: a carried value that is unphysical or leaves nothing to compute is not carried, and the note says so', () => {
    const lapseRate = input('parcel-temperature-by-height', 'lapseRate')
    expect(carriedFrom(lapseRate, reading('dry-adiabatic-lapse-rate', '0 K/km'))).toMatchObject({ notCarried: expect.stringContaining('leave nothing to compute') })
    expect(carriedFrom(lapseRate, reading('dry-adiabatic-lapse-rate', '980 K/km'))).toMatchObject({ notCarried: expect.stringContaining('outside what is physical') })
    // the judge looks again, whoever calls it
    const question = stepOf('parcel-temperature-by-height', { ...parcel, lapseRate: 0.0098 }, { carried: { lapseRate: { valueSi: 0, halfUnitSi: 0.00005 } } })
    const kept = judgeTyped(question, '15.0 °C')
    expect(kept).toMatchObject({ isAccepted: false, carriedBand: null })
    expect(kept.carriedNote).toContain('leave nothing to compute')
  })
  it('K19: half a unit of the typed earlier value goes into the later band: 9.8 ± 0.05 K/km × 1.5 km = ± 0.075 K', () => {
    const earlier = reading('dry-adiabatic-lapse-rate', '9.8 K/km')
    const carried = carriedFrom(input('parcel-temperature-by-height', 'lapseRate'), earlier)
    if (!carried) throw new Error('nothing carried')
    const { carriedBand, band } = judgeTyped(stepOf('parcel-temperature-by-height', { ...parcel, lapseRate: 9.81 / 1004 }, { carried: { lapseRate: carried } }), '')
    const part = carriedBand?.parts.find(one => one.key === 'carried')
    expect(part?.below).toBeCloseTo(0.075, 9)
    expect(part?.above).toBeCloseTo(0.075, 9)
    expect(band?.parts.some(one => one.key === 'carried')).toBe(false)
  })
  it('K20: a blank earlier step carries nothing: the true value, and no penalty twice', () => {
    expect(carriedFrom(input('parcel-temperature-by-height', 'lapseRate'), reading('dry-adiabatic-lapse-rate', ''))).toBeNull()
    expect(carriedFrom(input('parcel-temperature-by-height', 'lapseRate'), undefined)).toBeNull()
    const question = stepOf('parcel-temperature-by-height', { ...parcel, lapseRate: 0.0098 }, { carried: {} })
    expect(judgeTyped(question, '0.3 °C')).toMatchObject({ isAccepted: true, carriedBand: null, carriedNote: null })
  })
  it('K21: the same share and value give the same mark, and what a ruling accepted is accepted for all', () => {
    const layer = { height: [0, 1000], temperature: kelvins(15, 5.2) }
    const first = stepOf('lapse-rate-end-points', layer)
    expect(judgeTyped(first, '9.3').isAccepted).toBe(false)
    const ruled = { ...first, accepted: [{ kind: 'value' as const, lowSi: 0.0093, highSi: 0.0093, ruling: 'r1' }] }
    expect(judgeTyped(ruled, '9.3')).toMatchObject({ isAccepted: true, acceptedBy: 'ruling' })
    expect(judgeStep(ruled, reading('lapse-rate-end-points', '9.3'))).toEqual(judgeTyped(ruled, '9.3'))
  })
  it('K30: a slip that an accepted method gives as well is silent', () => {
    expect(judgeTyped(stepOf('dry-adiabatic-lapse-rate', {}), '9.8')).toMatchObject({ isAccepted: true, slip: null })
  })
})
