import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs, Outcome } from '#shared/thermo/definition'
import { dewpointFunction, frostPoint } from '#shared/thermo/dewpoints'
import { evaluateQuantity, plainFormulae } from '#shared/thermo/evaluate'
import { psychrometerVaporPressure } from '#shared/thermo/psychrometerDefinition'
import { findQuantity } from '#shared/thermo/registry'
import { reversibleTemperature } from '#shared/thermo/reversiblePath'
import { overWaterForms } from '#shared/thermo/saturation'
import { moistAir } from '#shared/thermo/moistAir'
import { lclFunction } from '#shared/thermo/liftingCondensation'
import { isobaricWetBulb, mixingRatioFromWetBulb, pseudoadiabaticWetBulb, stullWetBulb } from '#shared/thermo/wetBulb'
import { formulaeOf } from '#shared/marking/alternatives'
import { judgeTyped, stepOf } from '../../../fixtures/marking/ask'

const constants = defaultConvention.constants
const air = moistAir(constants, plainFormulae)
function outcome(quantity: string, inputs: Inputs, by = constants): Outcome {
  const definition = findQuantity(quantity)
  if (!definition) throw new Error(quantity)
  return evaluateQuantity(definition, inputs, by, undefined, formulaeOf(defaultConvention))
}
function value(quantity: string, inputs: Inputs, by = constants): number {
  const found = outcome(quantity, inputs, by)
  if (found.is !== 'value') throw new Error(`${quantity}: ${found.is}`)
  return found.value
}
const temperatures = fc.double({ min: 250, max: 308, noNaN: true })
const depressions = fc.double({ min: 0.1, max: 18, noNaN: true })
const pressures = fc.double({ min: 60_000, max: 104_000, noNaN: true })
const humidities = fc.double({ min: 0.1, max: 1, noNaN: true })

describe('examples of the docstrings', () => {
  it('give what they say', () => {
    expect(dewpointFunction(constants, plainFormulae)(1401.539)).toBeCloseTo(285.15, 3)
    expect(frostPoint(200, constants, plainFormulae)).toMatchObject({ is: 'value', value: expect.closeTo(260.23, 2) })
    expect(mixingRatioFromWetBulb(303.15, 298.15, 95_461, air)).toBeCloseTo(0.0192, 4)
    expect(isobaricWetBulb(303.15, 0.0192, 95_461, air)).toBeCloseTo(298.1, 1)
    expect(pseudoadiabaticWetBulb(95_461, lclFunction(constants, plainFormulae)(303.15, 296.49, 95_461), air)).toBeCloseTo(298.15, 1)
    expect(stullWetBulb(293.15, 0.5)).toBeCloseTo(286.85, 2)
    expect(psychrometerVaporPressure(1704, 100_000, 5, 6.62e-4)).toBeCloseTo(1373, 0)
    expect(reversibleTemperature(278.15, 92_500, 70_000, 0.006, air)).toBeCloseTo(264.3, 1)
  })
})

describe('the convective condensation level', () => {
  const pressure = [993, 957, 925, 886, 850, 813, 798, 732, 716, 700].map(p => 100 * p), temperature = [34.6, 31.1, 27.8, 24.3, 21.4, 19.6, 18.7, 13, 13.5, 13].map(t => t + 273.15), dewpoint = [19.6, 18.7, 17.8, 16.3, 12.4, -0.4, -3.8, -6, -13.2, -11].map(t => t + 273.15)
  it('of a published sounding: 758.35 hPa and 38.43 °C (MetPy documentation, ccl; from memory)', () => {
    expect(Math.abs(value('convective-condensation-level-pressure', { pressure, temperature, dewpoint }) / 100 - 758.348)).toBeLessThan(1.2)
    expect(Math.abs(value('convective-temperature', { pressure, temperature, dewpoint }) - 273.15 - 38.434)).toBeLessThan(0.12)
  })
  it('lies above the lifting condensation level, at the ground where the air is saturated, and is not reached where the data end', () => {
    const lcl = value('lifting-condensation-level-pressure', { pressure: 99_300, temperature: temperature[0] ?? 0, dewpoint: dewpoint[0] ?? 0 })
    expect(value('convective-condensation-level-pressure', { pressure, temperature, dewpoint })).toBeLessThan(lcl)
    expect(value('convective-condensation-level-pressure', { pressure, temperature, dewpoint: [temperature[0] ?? 0, ...dewpoint.slice(1)] })).toBe(99_300)
    expect(outcome('convective-temperature', { pressure: pressure.slice(0, 4), temperature: temperature.slice(0, 4), dewpoint: dewpoint.slice(0, 4) })).toMatchObject({ is: 'not_reached' })
    expect(judgeTyped(stepOf('convective-temperature', { pressure: pressure.slice(0, 4), temperature: temperature.slice(0, 4), dewpoint: dewpoint.slice(0, 4) }), 'not reached').outcome).toBe('not_reached')
  })
})

describe('what has to hold whatever the numbers', () => {
  it('humidities go there and back, by every formula of the vapor pressure', () => {
    fc.assert(fc.property(temperatures, pressures, fc.constantFrom(...overWaterForms.map(form => form.key)), (Td, p, key) => {
      const formulae = { ...plainFormulae, variants: { 'saturation-vapor-pressure': key } }
      const at = (quantity: string, inputs: Inputs): number => {
        const definition = findQuantity(quantity)
        const found = definition && evaluateQuantity(definition, inputs, constants, undefined, formulae)
        return found?.is === 'value' ? found.value : NaN
      }
      expect(Math.abs(at('dewpoint', { vaporPressure: at('vapor-pressure', { dewpoint: Td }) }) - Td)).toBeLessThan(1e-8)
      expect(Math.abs(at('dewpoint-from-mixing-ratio', { pressure: p, mixingRatio: at('mixing-ratio', { pressure: p, dewpoint: Td }) }) - Td)).toBeLessThan(1e-8)
      const RH = at('relative-humidity', { temperature: Td + 5, dewpoint: Td })
      expect(Math.abs(at('dewpoint-from-relative-humidity', { temperature: Td + 5, relativeHumidity: RH }) - Td)).toBeLessThan(1e-8)
      const w = at('mixing-ratio', { pressure: p, dewpoint: Td }), e = at('vapor-pressure', { dewpoint: Td })
      expect(Math.abs(at('mixing-ratio-from-vapor-pressure', { pressure: p, vaporPressure: e }) - w)).toBeLessThan(1e-15)
      expect(Math.abs(at('specific-humidity', { mixingRatio: w }) - at('specific-humidity-from-dewpoint', { pressure: p, dewpoint: Td }))).toBeLessThan(1e-15)
    }))
  })
  it('dewpoint ≤ wet bulb ≤ temperature, condensation level below the dewpoint; the virtual temperature above the temperature', () => {
    fc.assert(fc.property(temperatures, depressions, pressures, (T, spread, pressure) => {
      const inputs = { pressure, temperature: T, dewpoint: T - spread }
      const Tw = value('wet-bulb-temperature', inputs), lifted = value('pseudoadiabatic-wet-bulb-temperature', inputs), TL = value('lifting-condensation-level-temperature', inputs)
      for (const one of [Tw, lifted]) {
        expect(one).toBeGreaterThan(T - spread)
        expect(one).toBeLessThan(T)
      }
      expect(Math.abs(Tw - lifted)).toBeLessThan(1)
      expect(TL).toBeLessThan(T - spread + 0.01)
      const w = value('mixing-ratio', { pressure, dewpoint: T - spread })
      expect(value('virtual-temperature', { temperature: T, mixingRatio: w })).toBeGreaterThan(T)
      expect(Math.abs(value('mixing-ratio-from-wet-bulb', { pressure, temperature: T, wetBulb: Tw }) - w)).toBeLessThan(1e-9)
    }))
  })
  it('θ ≤ θv, θ ≤ θe ≤ θes; θw of a parcel is that of its level; saturated air is a condensation level itself', () => {
    fc.assert(fc.property(temperatures, depressions, pressures, (T, spread, pressure) => {
      const inputs = { pressure, temperature: T, dewpoint: T - spread }
      const theta = value('potential-temperature', { pressure, temperature: T }), e = value('equivalent-potential-temperature', inputs)
      expect(value('virtual-potential-temperature', inputs)).toBeGreaterThan(theta)
      expect(e).toBeGreaterThan(theta)
      expect(value('saturation-equivalent-potential-temperature', { pressure, temperature: T })).toBeGreaterThan(e)
      const lcl = { pressure: value('lifting-condensation-level-pressure', inputs), temperature: value('lifting-condensation-level-temperature', inputs) }
      expect(Math.abs(value('equivalent-potential-temperature', { ...lcl, dewpoint: lcl.temperature }) - e)).toBeLessThan(0.4)
      expect(Math.abs(value('wet-bulb-potential-temperature', { ...lcl, dewpoint: lcl.temperature }) - value('wet-bulb-potential-temperature', inputs))).toBeLessThan(1e-4)
      expect(value('lifting-condensation-level-height', { pressure, temperature: T, dewpoint: T })).toBeCloseTo(0, 6)
    }))
  })
  it('saturated ascent and descent undo each other; Γm lies between 0 and Γd, and is larger where it is colder', () => {
    fc.assert(fc.property(temperatures, fc.double({ min: 40_000, max: 90_000, noNaN: true }), (T, pressureEnd) => {
      const up = value('saturated-ascent-temperature', { pressureStart: 95_000, temperature: T, pressureEnd })
      expect(Math.abs(value('saturated-descent-temperature', { pressureStart: pressureEnd, temperature: up, pressureEnd: 95_000 }) - T)).toBeLessThan(1e-4)
      const rate = value('saturated-adiabatic-lapse-rate', { pressure: 95_000, temperature: T })
      expect(rate).toBeGreaterThan(0.0025)
      expect(rate).toBeLessThan(value('dry-adiabatic-lapse-rate', {}))
      expect(value('saturated-adiabatic-lapse-rate', { pressure: 95_000, temperature: T - 2 })).toBeGreaterThan(rate)
      const reversible = value('reversible-ascent-temperature', { pressureStart: 95_000, temperature: T, pressureEnd })
      expect(Math.abs(reversible - up)).toBeLessThan(3.5)
    }))
  })
  it('mixing keeps the vapor, and a body with itself is itself', () => {
    fc.assert(fc.property(temperatures, humidities, pressures, fc.double({ min: 0.01, max: 100, noNaN: true }), (T, RH, pressure, mass) => {
      const same = { massFirst: mass, temperatureFirst: T, massSecond: 1, temperatureSecond: T }
      expect(value('isobaric-mixing-temperature', same)).toBeCloseTo(T, 9)
      expect(value('isobaric-mixing-relative-humidity', { ...same, relativeHumidityFirst: RH, relativeHumiditySecond: RH, pressure })).toBeCloseTo(RH, 9)
    }))
  })
  it('an input times 1 + 1e-6 moves every result smoothly', () => {
    const cases: [string, Inputs][] = [
      ['equivalent-potential-temperature', { pressure: 90_000, temperature: 293, dewpoint: 286 }], ['wet-bulb-temperature', { pressure: 90_000, temperature: 293, dewpoint: 286 }], ['wet-bulb-potential-temperature', { pressure: 90_000, temperature: 293, dewpoint: 286 }],
      ['saturated-ascent-temperature', { pressureStart: 95_000, temperature: 288, pressureEnd: 60_000 }], ['lifting-condensation-level-pressure', { pressure: 90_000, temperature: 293, dewpoint: 286 }], ['lifting-condensation-level-height', { pressure: 90_000, temperature: 293, dewpoint: 286 }],
      ['adiabatic-liquid-water', { pressureStart: 95_000, temperature: 293, dewpoint: 289, pressureEnd: 75_000 }], ['dewpoint-from-relative-humidity', { temperature: 293, relativeHumidity: 0.6 }], ['reversible-ascent-temperature', { pressureStart: 95_000, temperature: 288, pressureEnd: 60_000 }],
    ]
    for (const [quantity, inputs] of cases) {
      const right = value(quantity, inputs)
      for (const [name, given] of Object.entries(inputs)) if (typeof given === 'number') expect(Math.abs(value(quantity, { ...inputs, [name]: given * (1 + 1e-6) }) / right - 1), `${quantity} ${name}`).toBeLessThan(2e-4)
    }
  })
  it('what cannot be is refused with the input and its range: water that boils, a bulb too cold, humidity of 0', () => {
    expect(() => outcome('mixing-ratio', { pressure: 5000, dewpoint: 310 })).toThrow('dewpoint')
    expect(() => outcome('equivalent-potential-temperature', { pressure: 5000, temperature: 320, dewpoint: 290 })).toThrow('temperature')
    expect(() => outcome('vapor-pressure-from-psychrometer', { pressure: 100_000, temperature: 308.15, wetBulb: 278.15 })).toThrow('wetBulb')
    expect(() => outcome('dewpoint-from-relative-humidity', { temperature: 293, relativeHumidity: 0 })).toThrow('relativeHumidity')
    expect(() => outcome('mixing-ratio-from-vapor-pressure', { pressure: 10_000, vaporPressure: 12_000 })).toThrow('pressure')
    expect(outcome('frost-point', { vaporPressure: 900 })).toMatchObject({ is: 'not_defined' })
  })
})

describe('how far honest answers differ: both ends of a spread are accepted with three digits and nothing granted', () => {
  const typed = (quantity: string, inputs: Inputs, answer: string, more = {}) => judgeTyped(stepOf(quantity, inputs, more), answer).isAccepted
  it('the vapor pressure inside a mixing ratio, with the enhancement factor or without', () => {
    // 959 hPa, dewpoint 19 °C: 14.64 as the sounding archive prints it with the factor, 14.57 by Bolton, 14.53 by WMO-No. 8
    for (const answer of ['14.64', '14.6', '14.57', '14.53']) expect(typed('mixing-ratio', { pressure: 95_900, dewpoint: 292.15 }, answer), answer).toBe(true)
  })
  it('κ and the equation of θe; the latent heat of Γm; the condensation level', () => {
    const parcel = { pressure: 85_000, temperature: 293.15, dewpoint: 291.15 }
    for (const answer of ['353.9', '353.8', '354.0']) expect(typed('equivalent-potential-temperature', parcel, `${answer} K`), answer).toBe(true)
    for (const answer of ['4.31', '4.22', '4.27']) expect(typed('saturated-adiabatic-lapse-rate', { pressure: 100_000, temperature: 293.15 }, answer), answer).toBe(true)
    for (const answer of ['877', '878']) expect(typed('lifting-condensation-level-pressure', { pressure: 94_300, temperature: 306.15, dewpoint: 301.15 }, answer), answer).toBe(true)
    expect(typed('lifting-condensation-level-pressure', { pressure: 94_300, temperature: 306.15, dewpoint: 301.15 }, '871')).toBe(false)
  })
  it('another question is never accepted by width', () => {
    const hot = { pressure: 101_325, temperature: 308.15, dewpoint: 293.15 }
    expect(typed('equivalent-potential-temperature', hot, `${value('equivalent-potential-temperature-shortcut', hot).toFixed(1)} K`)).toBe(false)
    const dry = { pressure: 101_325, temperature: 313.15, dewpoint: 273.15 }
    const isobaric = value('wet-bulb-temperature', dry), lifted = value('pseudoadiabatic-wet-bulb-temperature', dry)
    expect(Math.abs(isobaric - lifted)).toBeGreaterThan(0.2)
    expect(typed('wet-bulb-temperature', dry, `${(lifted - 273.15).toFixed(1)} °C`)).toBe(false)
  })
})
