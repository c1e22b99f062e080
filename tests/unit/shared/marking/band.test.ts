import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { judgeStep } from '#shared/marking/judge'
import { checkBand } from '#shared/marking/proof'
import { digitsInWords, lastPlaceAsked } from '#shared/marking/rounding'
import { fromDecimal, compare, toDecimal, fromDouble } from '#shared/numerics/rational'
import { defaultConvention } from '#shared/thermo/conventions/index'
import { findQuantity, quantities } from '#shared/thermo/registry'
import { fromSi, getUnit } from '#shared/units/ucum'
import type { QuantityDefinition } from '#shared/thermo/definition'
import type { ReadAnswer } from '#shared/marking/types'
import { judgeTyped, kelvins, setS, stepOf } from '../../../fixtures/marking/ask'
import { seededQuestion } from '../../../fixtures/marking/questions'

const numbers = quantities.filter(one => one.kind !== 'class')
const any = fc.record({ definition: fc.constantFrom(...numbers), seed: fc.integer({ min: 1, max: 1e6 }) })
const answerOf = (decimal: string, digits = 6): ReadAnswer => ({ typed: decimal, reading: 'ok', valueSi: null, decimal, unitUcum: null, digits, halfUnitSi: 0, message: '' })
const definitionOf = (key: string): QuantityDefinition => findQuantity(key) ?? (() => { throw new Error(key) })()

describe('a band', () => {
  it('is the sum of its parts, exactly, and every part is at least 0', () => {
    fc.assert(fc.property(any, fc.double({ min: 0, max: 0.1, noNaN: true }), ({ definition, seed }, granted) => {
      const { question } = seededQuestion(definition, seed)
      const { band } = judgeStep({ ...question, granted: { absoluteSi: granted } }, answerOf('0'))
      if (!band) return
      let below = 0, above = 0
      for (const part of band.parts) {
        expect(part.below >= 0 && part.above >= 0).toBe(true)
        below += part.below
        above += part.above
      }
      expect(band.low).toBe(band.center - below)
      expect(band.high).toBe(band.center + above)
    }))
  })
  it('gives full marks to the reference itself, to its rounding at the digits asked, and to every accepted way', () => {
    fc.assert(fc.property(any, ({ definition, seed }) => {
      const { question } = seededQuestion(definition, seed)
      const { band } = judgeStep(question, answerOf('0'))
      if (!band) return
      const unit = getUnit(question.unit), isDifference = definition.kind !== 'temperature'
      const hull = band.parts.find(part => part.key === 'formulae')
      for (const si of [band.center, band.center + (hull?.above ?? 0), band.center - (hull?.below ?? 0)]) {
        const decimal = toDecimal(fromSi(fromDouble(si), unit, isDifference), 40)
        expect(judgeStep(question, answerOf(decimal)), decimal).toMatchObject({ isAccepted: true, acceptedBy: 'band', pointsMilli: 3000 })
        const place = lastPlaceAsked(definition, band.center, unit, 3)
        const rounded = Number(decimal).toFixed(Math.max(0, -place))
        if (place <= 0) expect(judgeStep(question, answerOf(rounded)), `${decimal} → ${rounded}`).toMatchObject({ isAccepted: true })
      }
    }))
  })
  it('has its decimals outwards of its doubles by at most 1e-9 of its size', () => {
    fc.assert(fc.property(any, ({ definition, seed }) => {
      const { question } = seededQuestion(definition, seed)
      const { band } = judgeStep(question, answerOf('0'))
      if (!band) return
      const unit = getUnit(question.unit), isDifference = definition.kind !== 'temperature'
      const low = fromSi(fromDouble(band.low), unit, isDifference), high = fromSi(fromDouble(band.high), unit, isDifference)
      const [lowDecimal, highDecimal] = [fromDecimal(band.lowDecimal), fromDecimal(band.highDecimal)]
      if (!lowDecimal || !highDecimal) throw new Error('edges are decimals')
      expect(compare(lowDecimal, low)).toBeLessThanOrEqual(0)
      expect(compare(high, highDecimal)).toBeLessThanOrEqual(0)
      const size = Math.max(Math.abs(Number(band.lowDecimal)), Math.abs(Number(band.highDecimal)), isDifference ? 0 : Math.abs(band.high))
      expect(Number(band.highDecimal) - Number(toDecimal(high, 40))).toBeLessThanOrEqual(2e-9 * size)
    }))
  })
  it('does not depend on the unit in which it is asked, but for where digits end', () => {
    const inKelvinPerMeter = judgeTyped(stepOf('lapse-rate-least-squares', setS, { unit: 'K/m' }), '0.0102')
    const inFeet = judgeTyped(stepOf('lapse-rate-least-squares', setS, { unit: 'K/[ft_i]' }), '10.2 K/km')
    expect(inKelvinPerMeter.isAccepted).toBe(true)
    expect(inFeet.band?.center).toBe(inKelvinPerMeter.band?.center)
    expect(inFeet.isAccepted).toBe(true)
  })
  it('is not widened by few typed digits', () => {
    const wide = judgeTyped(stepOf('lapse-rate-least-squares', setS), '10')
    expect(wide).toMatchObject({ isAccepted: false })
    expect(wide.band).toEqual(judgeTyped(stepOf('lapse-rate-least-squares', setS), '10.2').band)
  })
  it('takes the wider of an absolute and a relative grant, and refuses what grants nothing sensible', () => {
    const density = { pressure: 101_325, temperature: 298.15 }
    const both = judgeTyped(stepOf('density', density, { granted: { absoluteSi: 0.001, relative: 0.01 } }), '')
    expect(both.band?.parts.find(part => part.key === 'granted')?.above).toBeCloseTo(0.0118, 4)
    for (const granted of [{ absoluteSi: -1 }, { absoluteSi: NaN }, { relative: 2 }, { relative: NaN }, { absoluteSi: Infinity }]) {
      expect(judgeTyped(stepOf('density', density, { granted }), '1.18'), JSON.stringify(granted)).toMatchObject({ outcome: 'refused', refusalCode: 'grant_invalid', isAccepted: false })
    }
  })
  it('counts digits on a fixed place for temperatures and on a floor near zero', () => {
    const theta = definitionOf('potential-temperature'), rate = definitionOf('lapse-rate-least-squares')
    expect(lastPlaceAsked(theta, 307.08, getUnit('K'), 3)).toBe(-1)
    expect(lastPlaceAsked(theta, 273.2, getUnit('Cel'), 3)).toBe(-1)
    expect(lastPlaceAsked(rate, 0.0098, getUnit('K/km'), 3)).toBe(-2)
    expect(lastPlaceAsked(rate, 0.012, getUnit('K/km'), 3)).toBe(-1)
    expect(lastPlaceAsked(rate, 0.0000001, getUnit('K/km'), 3)).toBe(-2)
    expect([1, 2, 3, 4].map(digits => digitsInWords(theta, digits))).toEqual(['to 10 degrees', 'to 1 degree', 'to 0.1 degree', 'to 0.01 degree'])
    expect(digitsInWords(rate, 3)).toBe('3 significant digits')
  })
})

describe('the proof of a band', () => {
  it('passes plain steps of every quantity for most shares', () => {
    for (const definition of quantities) {
      let passed = 0
      const reasons: string[] = []
      for (let seed = 1; seed <= 40; seed++) {
        const check = checkBand(seededQuestion(definition, seed).question)
        if (check.ok) passed++
        else reasons.push(...check.reasons)
      }
      expect(passed, `${definition.key}: ${reasons[0]}`).toBeGreaterThanOrEqual(30)
    }
  }, 240_000)
  it('U19: refuses a band wider than half the way to the nearest slip, and says which', () => {
    const check = checkBand(stepOf('potential-temperature', { temperature: 293.15, pressure: 85_000 }, { granted: { absoluteSi: 0.7 } }))
    expect(check.ok).toBe(false)
    expect(check.reasons.join()).toContain('1013.25 hPa for 1000 hPa')
  })
  it('refuses a band wider than half the way to a class limit', () => {
    const check = checkBand(stepOf('lapse-rate-end-points', { height: [0, 1000], temperature: kelvins(15, 5.325) }))
    expect(check.reasons.join()).toContain('class limit')
  })
  it('refuses a layer that accepted constants put in two classes', () => {
    expect(checkBand(stepOf('static-stability', { lapseRate: 0.00966 })).reasons.join()).toContain('different classes (stable, dry-neutral)')
    expect(checkBand(stepOf('static-stability', { lapseRate: 0.0065 }))).toEqual({ ok: true, reasons: [] })
  })
  it('refuses a share in which one accepted constant leads to a value and another to "not reached", either way round', () => {
    const profile = { height: [100, 200, 300], temperature: [280, 276, 273.155] } // ends between two values that 0 °C has in kelvin
    const by = (own: number, other: number) => ({ convention: { ...defaultConvention, constants: { ...defaultConvention.constants, zeroCelsius: own }, accepted: [{ label: 'the other', constants: { zeroCelsius: other } }] } })
    expect(checkBand(stepOf('freezing-level', profile, by(273.15, 273.16))).reasons.join()).toContain('different kinds of answer (not reached, value)')
    expect(checkBand(stepOf('freezing-level', profile, by(273.16, 273.15))).reasons.join()).toContain('different kinds of answer (value, not reached)')
    expect(checkBand(stepOf('freezing-level', { ...profile, temperature: [280, 276, 274] }, by(273.15, 273.16)))).toEqual({ ok: true, reasons: [] })
  })
  it('refuses a share that asks nothing: ΔT of 0, θ at 1000 hPa', () => {
    expect(checkBand(stepOf('isobaric-heat', { temperatureStart: 283.15, temperatureEnd: 283.15 })).ok).toBe(false)
    expect(checkBand(stepOf('potential-temperature', { temperature: 293.15, pressure: 100_000 })).reasons.join()).toContain('asks nothing')
  })
  it('refuses what cannot be judged, with its reason', () => {
    expect(checkBand(stepOf('density', { pressure: 1 })).reasons[0]).toContain('pressure')
    expect(checkBand(stepOf('nothing', {})).ok).toBe(false)
  })
})
