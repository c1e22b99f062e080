/** A second opinion on water and ice: python3-iapws of Debian, which follows the releases of IAPWS. Its figures are kept beside it, so that the checks run without it. */
import { describe, expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import { evaluateQuantity, plainFormulae } from '#shared/thermo/evaluate'
import { cubicLatentHeat, kirchhoffLatentHeat, linearLatentHeat, murphyKoopSublimation, quadraticSublimation } from '#shared/thermo/latentHeat'
import { findQuantity } from '#shared/thermo/registry'
import { overIceForms, overWaterForms } from '#shared/thermo/saturation'
import { waterFigures, waterFiguresAnew, waterFiguresOf } from '../../../fixtures/thermo/waterByIapws'

const { constants } = defaultConvention
/** The farthest that a form is off, over its range. */
function farthest(what: string, of: (temperature: number) => number, [low, high]: readonly [number, number]): number {
  return Math.max(...waterFiguresOf(what, low, high).map(({ temperature, value }) => Math.abs(of(temperature) / value - 1)))
}

/** Known errors as the handbook prints them, over the stated range; beyond it a form is not held to anything. */
const overWater: Readonly<Record<string, number>> = { 'bolton': 0.0011, 'wmo': 0.0035, 'murphy-koop': 0.0005, 'wagner-pruss': 0.0002, 'industrial': 0.0003, 'goff-gratch': 0.0011, 'buck': 0.0014, 'tetens': 0.0013 }
const overIce: Readonly<Record<string, number>> = { 'murphy-koop': 0.0007, 'sublimation': 1e-8, 'wmo': 0.0025, 'goff-gratch': 0.0035 }

describe('saturation pressure', () => {
  it.each(overWaterForms.map(form => [form.key, form] as const))('over water by %s is within its stated error of IAPWS-95', (key, form) => {
    expect(farthest('saturation pressure over water', form.pressure, form.holds)).toBeLessThan(overWater[key] ?? 0)
  })
  it('over water by the industrial formulation is that of R7-97 to the last digit kept', () => {
    const form = overWaterForms.find(one => one.key === 'industrial')
    expect(farthest('saturation pressure over water, industrial', form?.pressure ?? (() => NaN), [273.15, 373.15])).toBeLessThan(1e-8)
  })
  it.each(overIceForms.map(form => [form.key, form] as const))('over ice by %s is within its stated error of R14-08', (key, form) => {
    expect(farthest('sublimation pressure', form.pressure, form.holds)).toBeLessThan(overIce[key] ?? 0)
  })
})

describe('latent heat', () => {
  it.each([
    ['linear', linearLatentHeat, 1100], ['cubic', cubicLatentHeat, 2000], ['Kirchhoff’s relation', (temperature: number) => kirchhoffLatentHeat(temperature, constants), 3000],
  ] as const)('of vaporization, %s, within its stated error between 0 and 40 °C', (_name, of, most) => {
    for (const { temperature, value } of waterFiguresOf('latent heat of vaporization', 273, 313.15)) expect(Math.abs(of(temperature) - value), String(temperature)).toBeLessThan(most)
  })
  it.each([['Murphy & Koop', murphyKoopSublimation, 1000], ['quadratic', quadraticSublimation, 1000]] as const)('of sublimation, %s, within 1 kJ/kg above −40 °C', (_name, of, most) => {
    for (const { temperature, value } of waterFiguresOf('latent heat of sublimation')) expect(Math.abs(of(temperature) - value), String(temperature)).toBeLessThan(most)
  })
  it('of sublimation as taught, a constant, is within 0.2 % above −40 °C', () => {
    expect(farthest('latent heat of sublimation', () => constants.latentHeatIce ?? NaN, [233, 274])).toBeLessThan(0.002)
  })
  it('of fusion at 0 °C, by the difference and as a constant, within 0.3 %', () => {
    const definition = findQuantity('latent-heat-of-fusion'), [published] = waterFiguresOf('latent heat of fusion')
    for (const variant of ['difference', 'constant']) {
      const found = definition && evaluateQuantity(definition, { temperature: 273.15 }, constants, variant, plainFormulae)
      expect(found?.is === 'value' ? Math.abs(found.value / (published?.value ?? NaN) - 1) : NaN, variant).toBeLessThan(0.003)
    }
  })
})

describe('specific heats', () => {
  it('of liquid water is within 1 % between 0 and 40 °C', () => expect(farthest('specific heat of liquid water', () => constants.cw ?? NaN, [273, 314])).toBeLessThan(0.01))
  it('of water vapor is within 2.5 % of saturated vapor between 0 and 30 °C, and nearest where it is thinnest', () => {
    expect(farthest('specific heat of water vapor', () => constants.cpv ?? NaN, [273, 304])).toBeLessThan(0.026)
    expect(farthest('specific heat of water vapor', () => constants.cpv ?? NaN, [273, 274])).toBeLessThan(0.008)
  })
})

const anew = waterFiguresAnew()
describe.skipIf(!anew)('python3-iapws, where it is installed', () => {
  it('gives the figures that are kept', () => {
    expect(anew?.rows.length).toBe(waterFigures.rows.length)
    anew?.rows.forEach((row, at) => {
      const other = waterFigures.rows[at]
      expect(row).toMatchObject({ what: other?.what, temperature: other?.temperature, source: other?.source })
      expect(Math.abs(row.value / (other?.value ?? NaN) - 1), `${row.what} ${row.temperature}`).toBeLessThan(1e-8)
    })
  })
})
