import { describe, expect, it } from 'vitest'
import { readChoice } from '#shared/marking/choice'
import { judgeStep } from '#shared/marking/judge'
import { earnedMilli } from '#shared/marking/points'
import type { StepQuestion } from '#shared/marking/types'
import { judgeTyped, setS, stepOf } from '../../../fixtures/marking/ask'

describe('marks for the digits', () => {
  const step = stepOf('lapse-rate-least-squares', setS, { maxMilli: 3000, digitsMilli: 1000, granted: { absoluteSi: 0.0005 } })
  it('are lost by a right value with fewer digits, and the note says so', () => {
    expect(judgeTyped(step, '10.2')).toMatchObject({ isAccepted: true, pointsMilli: 3000 })
    const coarse = judgeTyped(step, '10')
    expect(coarse).toMatchObject({ isAccepted: true, pointsMilli: 2000 })
    expect(coarse.notes.join()).toContain('fewer digits than asked')
    expect(judgeTyped(step, '10.20')).toMatchObject({ pointsMilli: 3000 }) // U10: trailing zeros count
  })
  it('count a temperature by its place', () => {
    const parcel = stepOf('potential-temperature', { pressure: 100_000, temperature: 293.15 }, { unit: 'K', digits: 3, maxMilli: 2000, digitsMilli: 500, granted: { absoluteSi: 0.5 } })
    expect(judgeTyped(parcel, '293.2 K').pointsMilli).toBe(2000)
    expect(judgeTyped(parcel, '293 K').pointsMilli).toBe(1500)
  })
  it('never take more than the step holds (K15)', () => {
    expect(earnedMilli({ maxMilli: 1000, digitsMilli: 5000 }, { isAccepted: true, hasDigits: false, isSlip: false, isNear: false })).toBe(0)
    expect(earnedMilli({ maxMilli: 1000, slipMilli: 5000 }, { isAccepted: false, hasDigits: true, isSlip: true, isNear: false })).toBe(1000)
  })
})

describe('a near miss', () => {
  const step = stepOf('lapse-rate-least-squares', setS, { maxMilli: 3000, near: { widths: 2, milli: 1000 }, granted: { absoluteSi: 0.00005 } })
  it('earns its part within so many half-widths, and nothing beyond', () => {
    expect(judgeTyped(step, '10.33')).toMatchObject({ isAccepted: false, pointsMilli: 1000 }) // 10.20 ± 0.10, by two widths 10.00 to 10.40
    expect(judgeTyped(step, '10.6')).toMatchObject({ isAccepted: false, pointsMilli: 0 })
  })
  it('is no near miss where a slip explains the value: one slip costs once', () => {
    const inverse = judgeTyped({ ...step, near: { widths: 5, milli: 1000 } }, '10.40') // z fitted on T
    expect(inverse.slip?.key).toBe('inverse-fit')
    expect(inverse.pointsMilli).toBe(0)
  })
})

describe('what is read off a plot, and what students read themselves', () => {
  it('adds half a division for the value itself', () => {
    const step = stepOf('profile-temperature-at-height', { height: [100, 150, 200], temperature: [288.15, 287.75, 287.25], level: 175 }, { unit: 'Cel', readOff: { result: 0.25 } })
    const { band } = judgeTyped(step, '14.6 °C')
    expect(band?.parts.map(part => [part.key, part.below])).toEqual([['reading', 0.25], ['rounding', 0.05]])
    expect(judgeTyped(step, '14.6 °C').isAccepted).toBe(true) // 14.35 ± 0.30
    expect(judgeTyped(step, '14.7 °C').isAccepted).toBe(false)
  })
  it('takes both accuracies where the student has an instrument of their own, and none otherwise (U17)', () => {
    const step = stepOf('observed-air-temperature', { station: 293.15 }, { unit: 'Cel', accuracy: { stationSi: 0.2, ownSi: 0.5 } })
    expect(judgeTyped(step, '20.7 °C').isAccepted).toBe(true)
    expect(judgeTyped(step, '20.8 °C').isAccepted).toBe(false)
    expect(judgeTyped({ ...step, accuracy: undefined } as StepQuestion, '20.2 °C').isAccepted).toBe(false)
  })
})

describe('a choice', () => {
  const options = [{ key: 'a', label: 'It sinks back' }, { key: 'b', label: 'It goes on rising' }, { key: 'c', label: 'It stays' }]
  const question = (right: string[]): StepQuestion => ({ ...stepOf('density', {}), quantity: 'choice', unit: '1', maxMilli: 2000, choice: { options, right, why: ['because'] } })
  it('is right where just the right options are chosen', () => {
    const judge = (typed: string, right: string[]) => judgeStep(question(right), readChoice(typed, options, true))
    expect(judge('a', ['a'])).toMatchObject({ isAccepted: true, pointsMilli: 2000, outcome: 'class' })
    expect(judge('b', ['a'])).toMatchObject({ isAccepted: false, pointsMilli: 0 })
    expect(judge('c, a', ['a', 'c'])).toMatchObject({ pointsMilli: 2000 })
    for (const typed of ['a', 'a, b, c', 'a, b', '']) expect(judge(typed, ['a', 'c']).pointsMilli, typed).toBe(0)
  })
  it('reads what was chosen, and names what is no option', () => {
    expect(readChoice('', options, false).reading).toBe('empty')
    expect(readChoice('d', options, false)).toMatchObject({ reading: 'unreadable', message: 'There is no option d.' })
    expect(readChoice('a, b', options, false).reading).toBe('ambiguous')
    expect(readChoice('a,b', options, true)).toMatchObject({ reading: 'class', message: 'chosen: It sinks back; It goes on rising' })
  })
})
