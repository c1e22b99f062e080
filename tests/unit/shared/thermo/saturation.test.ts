import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Formulae } from '#shared/thermo/definition'
import { evaluateQuantity, plainFormulae } from '#shared/thermo/evaluate'
import { mixingRatioFrom, specificHumidityFrom, vaporPressureFrom, virtualTemperatureFrom } from '#shared/thermo/humidity'
import { cubicLatentHeat, kirchhoffLatentHeat, linearLatentHeat, murphyKoopSublimation, quadraticSublimation, sublimationForms, vaporizationForms } from '#shared/thermo/latentHeat'
import { findQuantity } from '#shared/thermo/registry'
import { boltonOverWater, goffGratchOverIce, goffGratchOverWater, industrialOverWater, murphyKoopOverIce, murphyKoopOverWater, overIceForms, overWaterForms, sublimationPressure, wagnerPrussOverWater } from '#shared/thermo/saturation'
import { iceSaturationPressureFunction, latentHeatFunction, saturationNotes, saturationPressureFunction, sublimationHeatFunction } from '#shared/thermo/saturationFunction'
import { judgeTyped, stepOf } from '../../../fixtures/marking/ask'

const constants = defaultConvention.constants
const off = (value: number, reference: number) => Math.abs(value / reference - 1)

describe('examples of the docstrings', () => {
  it('give what they say', () => {
    expect(boltonOverWater(293.15)).toBeCloseTo(2336.95, 2)
    expect(murphyKoopOverWater(300)).toBeCloseTo(3536.76, 2)
    expect(wagnerPrussOverWater(300)).toBeCloseTo(3536.7, 1)
    expect(industrialOverWater(300)).toBeCloseTo(3536.59, 2)
    expect(goffGratchOverWater(293.15)).toBeCloseTo(2337.3, 1)
    expect(murphyKoopOverIce(240)).toBeCloseTo(27.272, 3)
    expect(sublimationPressure(230)).toBeCloseTo(8.94735, 5)
    expect(goffGratchOverIce(253.15)).toBeCloseTo(103.17, 2)
    expect(linearLatentHeat(293.15)).toBeCloseTo(2_453_600, 6)
    expect(kirchhoffLatentHeat(293.15, constants)).toBeCloseTo(2_454_600, 6)
    expect(cubicLatentHeat(293.15)).toBeCloseTo(2_453_760, 6)
    expect(murphyKoopSublimation(273.15) / 1000).toBeCloseTo(2834.25, 2)
    expect(quadraticSublimation(253.15)).toBeCloseTo(2_838_300, 6)
    expect(mixingRatioFrom(1000, 100_000, 0.62189)).toBeCloseTo(0.0062817, 7)
    expect(vaporPressureFrom(0.0062817, 100_000, 0.62189)).toBeCloseTo(1000, 1)
    expect(specificHumidityFrom(0.015)).toBeCloseTo(0.014778, 6)
    expect(virtualTemperatureFrom(303.15, 0.02, 0.62189)).toBeCloseTo(306.76, 2)
    expect(saturationPressureFunction(constants, plainFormulae)(293.15)).toBeCloseTo(2336.95, 2)
  })
})

describe('published verification values', () => {
  // each form against the numbers that its own source prints for checking computer programs
  it.each([
    ['Murphy & Koop (2005), Table C1, water', murphyKoopOverWater, 240, 37.667, 0.0005], ['Murphy & Koop (2005), Table C1, water', murphyKoopOverWater, 300, 3536.8, 0.05],
    ['Murphy & Koop (2005), Table C1, ice', murphyKoopOverIce, 180, 0.0053975, 5e-8], ['Murphy & Koop (2005), Table C1, ice', murphyKoopOverIce, 210, 0.70202, 5e-6], ['Murphy & Koop (2005), Table C1, ice', murphyKoopOverIce, 240, 27.272, 0.0005],
    ['IAPWS R7-97, Table 35', industrialOverWater, 300, 3536.58941, 5e-6], ['IAPWS R7-97, Table 35', industrialOverWater, 500, 2_638_897.76, 0.005],
    ['IAPWS R14-08, check value (from memory)', sublimationPressure, 230, 8.94735, 5e-6],
    ['IAPWS SR1-86, Table 1 (from memory)', wagnerPrussOverWater, 273.16, 611.657, 0.002], ['IAPWS SR1-86, Table 1 (from memory)', wagnerPrussOverWater, 373.1243, 101_325, 100],
    ['Bolton (1980) Eq. 10 as NCAR prints it', boltonOverWater, 288.15, 1704.077, 0.03],
    ['Smithsonian Meteorological Tables, Table 94 (from memory)', goffGratchOverWater, 273.15, 610.78, 0.005], ['Smithsonian Meteorological Tables, Table 94 (from memory)', goffGratchOverWater, 293.15, 2337.3, 0.05],
    ['Smithsonian Meteorological Tables, Table 94 (from memory)', goffGratchOverWater, 263.15, 286.27, 0.005], ['Smithsonian Meteorological Tables, Table 96 (from memory)', goffGratchOverIce, 263.15, 259.7, 0.05], ['Smithsonian Meteorological Tables, Table 96 (from memory)', goffGratchOverIce, 253.15, 103.2, 0.05],
  ] as const)('%s', (_source, form, T, expected, tolerance) => expect(Math.abs(form(T) - expected)).toBeLessThanOrEqual(tolerance))
})

describe('what has to hold of every form', () => {
  // known error as stated, against IAPWS-95 above 0 °C and Murphy & Koop below
  const stated: Record<string, number> = { 'bolton': 0.0021, 'wmo': 0.0075, 'murphy-koop': 0.0005, 'wagner-pruss': 0.0002, 'industrial': 0.0003, 'goff-gratch': 0.0015, 'buck': 0.0015, 'tetens': 0.0014 }
  it.each(overWaterForms.map(form => [form.key, form] as const))('over water, %s: rises, keeps to its stated error within its range, and is solved for T where it says so', (key, form) => {
    const [low, high] = form.holds
    const temperatures = fc.double({ min: Math.max(low, 228.15), max: Math.min(high, 373.15), noNaN: true })
    fc.assert(fc.property(temperatures, (T) => {
      const reference = T >= 273.16 ? wagnerPrussOverWater(T) : murphyKoopOverWater(T)
      const limit = key === 'goff-gratch' && T < 243.15 ? 0.004 : stated[key] ?? 0
      expect(off(form.pressure(T), reference), `${T} K`).toBeLessThan(limit)
      expect(form.pressure(T * (1 + 1e-6))).toBeGreaterThan(form.pressure(T))
      if (form.temperature) expect(Math.abs(form.temperature(form.pressure(T)) - T)).toBeLessThan(1e-9)
      expect(form.filled(T)).not.toMatch(/NaN|undefined/)
    }))
  })
  it.each(overIceForms.map(form => [form.key, form] as const))('over ice, %s: rises, lies below that over water, keeps to its stated error', (_key, form) => {
    fc.assert(fc.property(fc.double({ min: Math.max(form.holds[0], 173.15), max: 273.1, noNaN: true }), (T) => {
      expect(off(form.pressure(T), murphyKoopOverIce(T))).toBeLessThan(0.0035)
      if (T < 268) expect(form.pressure(T)).toBeLessThan(murphyKoopOverWater(T))
      expect(form.pressure(T * (1 + 1e-6))).toBeGreaterThan(form.pressure(T))
      if (form.temperature) expect(Math.abs(form.temperature(form.pressure(T)) - T)).toBeLessThan(1e-9)
    }))
  })
  it('latent heats lie within 0.3 % of each other where they hold, the constant one apart', () => {
    fc.assert(fc.property(fc.double({ min: 248.15, max: 313.15, noNaN: true }), (T) => {
      for (const form of vaporizationForms.filter(one => one.key !== 'constant')) expect(off(form.of(constants)(T), linearLatentHeat(T))).toBeLessThan(0.003)
    }))
    fc.assert(fc.property(fc.double({ min: 233.15, max: 273.15, noNaN: true }), (T) => {
      for (const form of sublimationForms) expect(off(form.of(constants)(T), murphyKoopSublimation(T))).toBeLessThan(0.002)
    }))
  })
  it('humidities go there and back', () => {
    fc.assert(fc.property(fc.double({ min: 1, max: 12_000, noNaN: true }), fc.double({ min: 20_000, max: 105_000, noNaN: true }), (e, p) => {
      expect(off(vaporPressureFrom(mixingRatioFrom(e, p, 0.622), p, 0.622), e)).toBeLessThan(1e-13)
    }))
  })
})

describe('the function inside other quantities', () => {
  const by = (key: string, beyond: Formulae['beyond']): Formulae => ({ variants: { 'saturation-vapor-pressure': key, 'latent-heat-of-vaporization': 'linear' }, beyond })
  it('is the variant that the convention names, and the value of the quantity', () => {
    const definition = findQuantity('saturation-vapor-pressure')
    if (!definition) throw new Error()
    for (const { key } of overWaterForms) {
      expect(evaluateQuantity(definition, { temperature: 290 }, constants, undefined, by(key, 'compute'))).toMatchObject({ value: saturationPressureFunction(constants, by(key, 'compute'))(290) })
    }
  })
  it('goes on beyond the stated range, takes the next form, or refuses, as the convention says; and notes it', () => {
    expect(saturationPressureFunction(constants, by('bolton', 'compute'))(313.15)).toBe(boltonOverWater(313.15))
    expect(saturationPressureFunction(constants, by('bolton', 'next'))(313.15)).toBe(overWaterForms[1]?.pressure(313.15))
    expect(saturationPressureFunction(constants, by('bolton', 'next'))(300)).toBe(boltonOverWater(300))
    expect(() => saturationPressureFunction(constants, by('bolton', 'refuse'))(313.15)).toThrow('temperature = 313.15')
    expect(saturationNotes([290, 313.15], by('bolton', 'compute'))).toHaveLength(1)
    expect(saturationNotes([290], by('bolton', 'compute'))).toEqual([])
  })
  it('knows the enhancement factor where a convention names one', () => {
    expect(saturationPressureFunction({ ...constants, enhancementFactor: 1.004 }, plainFormulae)(293.15)).toBeCloseTo(1.004 * 2336.947, 2)
    expect(iceSaturationPressureFunction(constants, plainFormulae)(263.15)).toBe(murphyKoopOverIce(263.15))
    expect(latentHeatFunction(constants, plainFormulae)(273.15)).toBe(2.501e6)
    expect(sublimationHeatFunction(constants, plainFormulae)(263.15)).toBe(2.834e6)
  })
})

describe('how far honest answers differ', () => {
  it.each([
    ['Bolton', 23.37], ['IAPWS-95', 23.39], ['Magnus form of WMO-No. 8', 23.33], ['Smithsonian', 23.37], ['with the enhancement factor', 23.47],
  ])('es at 20 °C by %s, %s hPa, earns its marks with three digits and nothing granted', (_name, typed) => {
    expect(judgeTyped(stepOf('saturation-vapor-pressure', { temperature: 293.15 }), typed.toFixed(1)).isAccepted).toBe(true)
  })
  it('ice for water below 0 °C is a mistake, never within the width, and named', () => {
    for (const [t, typed] of [[-10, '2.60'], [-20, '1.03']] as const) {
      expect(judgeTyped(stepOf('saturation-vapor-pressure', { temperature: t + 273.15 }), typed)).toMatchObject({ isAccepted: false, slip: { key: 'ice-for-water' } })
    }
    expect(judgeTyped(stepOf('saturation-vapor-pressure-over-ice', { temperature: 263.15 }), '2.87')).toMatchObject({ isAccepted: false, slip: { key: 'water-for-ice' } })
  })
  it('a latent heat that is taught as a constant is accepted at 20 °C: 2.45, 2.50 and 2.501 MJ kg⁻¹', () => {
    for (const typed of ['2450', '2454', '2500', '2501']) expect(judgeTyped(stepOf('latent-heat-of-vaporization', { temperature: 293.15 }), typed).isAccepted, typed).toBe(true)
    expect(judgeTyped(stepOf('latent-heat-of-vaporization', { temperature: 293.15 }), '2834')).toMatchObject({ isAccepted: false, slip: { key: 'sublimation' } })
  })
})
