import { describe, expect, it } from 'vitest'
import { judgeStep, judgeInterface, referenceVersion } from '#shared/marking/judge'
import { fraction, randomSource, seedFromNumber } from '#shared/numerics/random'
import { log, exp } from '#shared/numerics/elementary'
import { quantities } from '#shared/thermo/registry'
import { fromSi, getUnit } from '#shared/units/ucum'
import { fromDouble, toDouble } from '#shared/numerics/rational'
import type { ReadAnswer, StepQuestion } from '#shared/marking/types'
import { judgeTyped, reading, setS, stepOf } from '../../../fixtures/marking/ask'
import { seededQuestion } from '../../../fixtures/marking/questions'

const blank: ReadAnswer = { typed: '', reading: 'empty', valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null, message: '' }

describe('the judge', () => {
  it('says its version and interface', () => {
    expect(referenceVersion).toMatch(/^\d+\.\d+\.\d+$/)
    expect(judgeInterface).toBe(1)
  })
  it('accepts nothing that was not read', () => {
    for (const one of ['empty', 'unreadable', 'wrong_dimension', 'ambiguous', 'none', 'not_reached', 'not_defined', 'class'] as const) {
      expect(judgeStep(stepOf('density', { pressure: 101_325, temperature: 298.15 }), { ...blank, reading: one })).toMatchObject({ isAccepted: false, pointsMilli: 0 })
    }
  })
  it('gives part of the marks for a named slip where the author grants it', () => {
    const step = stepOf('lapse-rate-least-squares', setS, { maxMilli: 3000, slipMilli: 1000 })
    expect(judgeTyped(step, '-10.2')).toMatchObject({ isAccepted: false, pointsMilli: 1000, slip: { key: 'sign' } })
    expect(judgeTyped({ ...step, slipMilli: 0 }, '-10.2').pointsMilli).toBe(0)
    expect(judgeTyped(step, '5').pointsMilli).toBe(0)
  })
  it('takes what rulings have added: a slip, an interval, a variant', () => {
    const step = stepOf('lapse-rate-least-squares', setS)
    expect(judgeTyped({ ...step, accepted: [{ kind: 'slip', slip: 'inverse-fit', ruling: 'r' }] }, '10.40')).toMatchObject({ isAccepted: true, acceptedBy: 'ruling', slip: null, pointsMilli: 1000 })
    expect(judgeTyped({ ...step, accepted: [{ kind: 'slip', slip: 'sign', ruling: 'r' }] }, '10.40').isAccepted).toBe(false)
    expect(judgeTyped({ ...step, accepted: [{ kind: 'value', lowSi: 0.009, highSi: 0.0095, ruling: 'r' }] }, '9.0')).toMatchObject({ acceptedBy: 'ruling' })
    expect(judgeTyped({ ...step, accepted: [{ kind: 'value', lowSi: 0.0095, highSi: 0.009, ruling: 'r' }] }, '9.2').isAccepted).toBe(false)
    const pinned = stepOf('dry-adiabatic-lapse-rate', {}, { variant: 'g-over-cp', digits: 4 })
    expect(judgeTyped(pinned, '9.8').isAccepted).toBe(false)
    expect(judgeTyped({ ...pinned, accepted: [{ kind: 'variant', variant: 'as-printed', ruling: 'r' }] }, '9.8')).toMatchObject({ acceptedBy: 'ruling' })
    expect(judgeTyped({ ...pinned, accepted: [{ kind: 'variant', variant: 'no-such', ruling: 'r' }] }, '9.8').isAccepted).toBe(false)
  })
  it('says why a question cannot be judged, by a code, and never throws', () => {
    const good = stepOf('density', { pressure: 101_325, temperature: 298.15 })
    const cases: [Partial<StepQuestion>, string][] = [
      [{ quantity: 'no-such' }, 'unknown_quantity'], [{ quantity: '__proto__' }, 'unknown_quantity'], [{ unit: 'K' }, 'unit_invalid'], [{ unit: '' }, 'unit_invalid'], [{ digits: 0 }, 'digits_invalid'], [{ digits: 2.5 }, 'digits_invalid'], [{ digits: NaN }, 'digits_invalid'],
      [{ variant: 'no-such' }, 'out_of_range'], [{ inputs: {} }, 'missing_input'], [{ inputs: { pressure: NaN, temperature: 298 } }, 'out_of_range'], [{ inputs: { pressure: 1e308, temperature: 298 } }, 'out_of_range'], [{ inputs: { pressure: 5e-324, temperature: 298 } }, 'out_of_range'],
      [{ inputs: { pressure: [1, 2], temperature: 298 } }, 'series_unusable'], [{ inputs: { pressure: 101_325, temperature: 298, more: 1 } }, 'unknown_input'], [{ convention: { ...good.convention, constants: {} } }, 'not_judged'], [{ convention: { ...good.convention, constants: { ...good.convention.constants, R: NaN } } }, 'not_judged'],
      [{ granted: { relative: -1 } }, 'grant_invalid'],
    ]
    for (const [change, code] of cases) expect(judgeStep({ ...good, ...change }, blank), JSON.stringify(change)).toMatchObject({ outcome: 'refused', refusalCode: code, isAccepted: false, pointsMilli: 0 })
  })
  it('refuses series that determine no layer: empty, too short, of unequal length, with gaps, at one height', () => {
    for (const inputs of [{ height: [], temperature: [] }, { height: [1, 2], temperature: [280, 281] }, { height: [1, 2, 3], temperature: [280, 281] }, { height: [1, 2, NaN], temperature: [280, 281, 282] }, { height: [5, 5, 5], temperature: [280, 281, 282] }, { height: [0, -0, 0], temperature: [280, 281, 282] }]) {
      expect(judgeTyped(stepOf('lapse-rate-least-squares', inputs), '1'), JSON.stringify(inputs)).toMatchObject({ outcome: 'refused' })
    }
  })
  it('judges a series of 200,000 rows', () => {
    const height = Array.from({ length: 200_000 }, (_, at) => at / 100), temperature = height.map(z => 290 - 0.0065 * z)
    expect(judgeTyped(stepOf('lapse-rate-least-squares', { height, temperature }), '6.50')).toMatchObject({ isAccepted: true })
    expect(judgeTyped(stepOf('lapse-rate-end-points', { height, temperature }), '6.50')).toMatchObject({ isAccepted: true })
  })
  it('gives an isothermal layer no NaN anywhere', () => {
    const flat = { height: [0, 50, 100], temperature: [280, 280, 280] }
    for (const quantity of ['lapse-rate-least-squares', 'lapse-rate-end-points', 'lapse-rate-standard-error']) {
      const judgement = judgeTyped(stepOf(quantity, flat), '0')
      expect(JSON.stringify(judgement)).not.toMatch(/null,"value"|NaN/)
      expect(judgement).toMatchObject({ isAccepted: true, band: { center: 0 } })
    }
  })
  it('answers the same to the same, and as plain JSON', () => {
    const judgement = judgeTyped(stepOf('lapse-rate-least-squares', setS), '10.40')
    expect(judgement).toEqual(judgeTyped(stepOf('lapse-rate-least-squares', setS), '10.40'))
    expect(JSON.parse(JSON.stringify(judgement))).toEqual(judgement)
  })
})

describe('naming slips', () => {
  /** A value as a student types it, with as many digits as a slide rule to a notebook. */
  const typedAs = (si: number, definition: (typeof quantities)[number], digits: number) => {
    const inUnit = toDouble(fromSi(fromDouble(si), getUnit(definition.shownUnit), definition.kind !== 'temperature'))
    return `${Number(inUnit.toPrecision(digits))} ${definition.kind === 'temperature' ? (definition.shownUnit === 'Cel' ? '°C' : 'K') : ''}`.trim()
  }
  it('names at least 80 % of known mistakes: each slip of each quantity on 20 seeded inputs', () => {
    let made = 0, found = 0
    const missed = new Map<string, number>()
    for (const definition of quantities) {
      for (let seed = 101; seed <= 120; seed++) {
        const { question } = seededQuestion(definition, seed)
        for (const slip of judgeStep(question, blank).slipValues) {
          const judgement = judgeStep(question, reading(definition.key, typedAs(slip.value, definition, 5), question.unit))
          if (judgement.isAccepted) continue
          made++
          if (judgement.slip?.key === slip.key) found++
          else missed.set(`${definition.key} ${slip.key}`, (missed.get(`${definition.key} ${slip.key}`) ?? 0) + 1)
        }
      }
    }
    console.info(`known mistakes named: ${found} of ${made} (${(100 * found / made).toFixed(1)} %); most missed: ${JSON.stringify([...missed].sort((a, b) => b[1] - a[1]).slice(0, 6))}`)
    expect(made).toBeGreaterThan(1000)
    expect(found / made).toBeGreaterThanOrEqual(0.8)
  }, 240_000)
  it('falsely names at most 2 % of 5,000 wrong values, log-uniform from 0.1 to 10 times the reference, one in five with its sign turned', () => {
    const source = randomSource(seedFromNumber(5000))
    let wrong = 0, named = 0
    const numbers = quantities.filter(one => one.kind !== 'class')
    for (let n = 0; wrong < 5000; n++) {
      const definition = numbers[n % numbers.length]
      if (!definition) break
      const { question } = seededQuestion(definition, 1 + (n % 997))
      const { band } = judgeStep(question, blank)
      if (!band) continue
      const factor = exp((2 * fraction(source) - 1) * log(10)) * (fraction(source) < 0.2 ? -1 : 1)
      const judgement = judgeStep(question, reading(definition.key, typedAs(band.center * factor, definition, 4), question.unit))
      if (judgement.isAccepted) continue
      wrong++
      if (judgement.slip) named++
    }
    console.info(`falsely named: ${named} of ${wrong} (${(100 * named / wrong).toFixed(2)} %)`)
    expect(named / wrong).toBeLessThanOrEqual(0.02)
  }, 240_000)
  it('is silent where the right value explains few digits as well', () => {
    const theta = stepOf('potential-temperature', { temperature: 293.15, pressure: 85_000 })
    expect(judgeTyped(theta, '307 K')).toMatchObject({ isAccepted: false, slip: null })
    expect(judgeTyped(theta, '306.9 K').slip?.key).toBe('zero-273')
  })
  it('is silent where two slips explain a value', () => {
    const step = stepOf('isobaric-heat-of-mass', { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 })
    const alone = judgeTyped(step, '25.1')
    expect(alone.slip?.key).toBe('mass-left-out')
    // with 1.4 kg leaving the mass out and taking cv for cp come together: 717/1004 = 1/1.4003
    expect(judgeTyped({ ...step, inputs: { ...step.inputs, mass: 1.4003 } }, '25.1').slip).toBeNull()
  })
})
