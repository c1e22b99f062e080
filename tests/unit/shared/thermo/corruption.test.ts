import { describe, expect, it } from 'vitest'
import { logGamma, lanczos } from '#shared/numerics/studentT'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Constants, Inputs } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity } from '#shared/thermo/registry'
import { dependsOnConstants, publishedRows, rowIsOff } from '../../../fixtures/thermo/publishedRows'
import { describeWithShared } from '../../../fixtures/sharedFolder'

const { constants } = defaultConvention

function value(key: string, inputs: Inputs, with_: Constants, variant?: string): number {
  const definition = findQuantity(key)
  if (!definition) throw new Error(key)
  const outcome = evaluateQuantity(definition, inputs, with_, variant)
  return outcome.is === 'value' ? outcome.value : NaN
}

/** Published values of constants that no row of the table turns on: they enter by variants that are not taught first, or in digits that no row prints. */
const published: readonly { constant: string, what: string, got: (with_: Constants) => number, expected: number, tolerance: number, source: string }[] = [
  { constant: 'zeroCelsius', what: '0 °C in kelvin', got: with_ => with_.zeroCelsius ?? NaN, expected: 273.15, tolerance: 0, source: 'SI Brochure, 9th ed. (2019), 2.3.1: exact (verified)' },
  { constant: 'latentHeat', what: 'latent heat of vaporization at 0.01 °C, kJ/kg, by Kirchhoff’s relation', got: with_ => value('latent-heat-of-vaporization', { temperature: 273.16 }, with_, 'kirchhoff') / 1000, expected: 2500.9, tolerance: 2.5, source: 'steam tables, IAPWS-95 (verified)' },
  { constant: 'cw', what: 'specific heat of liquid water, J/(kg K)', got: with_ => with_.cw ?? NaN, expected: 4186, tolerance: 42, source: 'ASHRAE Handbook – Fundamentals (2017), ch. 1: enthalpy of condensed water 4.186 t (from memory); 1 %: 4176 to 4220 between 0 and 40 °C' },
  { constant: 'cpv', what: 'specific heat of water vapor, J/(kg K)', got: with_ => with_.cpv ?? NaN, expected: 1860, tolerance: 19, source: 'ASHRAE Handbook – Fundamentals (2017), ch. 1: enthalpy of vapor 2501 + 1.86 t (from memory); 1 %: 1850 to 1885 taught' },
  { constant: 'latentHeatIce', what: 'latent heat of sublimation at 0 °C, kJ/kg', got: with_ => (with_.latentHeatIce ?? NaN) / 1000, expected: 2834.5, tolerance: 5, source: 'AMS Glossary of Meteorology, "latent heat" (2.834·10⁶ J/kg; from memory)' },
  { constant: 'earthRadius', what: 'geopotential height of 30 000 m, m', got: with_ => value('geopotential-height', { geometricHeight: 30_000 }, with_), expected: 29_859, tolerance: 0.5, source: 'U.S. Standard Atmosphere 1976, Table I (from memory); half of the last printed digit' },
]

/** No constant of nature: how near Γd a layer is called neutral. What it does is in the traps of the classes. */
const notPublished: readonly string[] = ['neutralTolerance']

describe('published values of constants', () => {
  it.each(published)('$what: $expected ± $tolerance ($source)', ({ got, expected, tolerance }) => {
    expect(Math.abs(got(constants) - expected)).toBeLessThanOrEqual(tolerance)
  })
})

describeWithShared('a constant that is 2 % off turns a published check red', () => {
  const rows = publishedRows.filter(dependsOnConstants)
  it('starts from rows that are all green', () => {
    expect(rows.length).toBeGreaterThan(100)
    expect(rows.filter(row => rowIsOff(row, constants)).map(row => row.id)).toEqual([])
  })
  const names = Object.keys(constants).filter(name => !notPublished.includes(name))
  it.each(names.flatMap(name => [[name, 0.98], [name, 1.02]] as const))('%s × %d', (name, factor) => {
    const corrupted: Constants = { ...constants, [name]: (constants[name] ?? NaN) * factor }
    const red = rows.filter(row => rowIsOff(row, corrupted)).map(row => row.id ?? '')
    const others = published.filter(one => !(Math.abs(one.got(corrupted) - one.expected) <= one.tolerance)).map(one => one.what)
    expect([...red, ...others]).not.toEqual([])
  })
})

describe('a coefficient that is off', () => {
  // 10! and √π are known
  const isOff = (with_: readonly number[]) => Math.abs(logGamma(11, with_) - Math.log(3_628_800)) > 1e-11 || Math.abs(logGamma(0.5, with_) - Math.log(Math.PI) / 2) > 1e-11
  it.each(lanczos.map((_one, at) => at))('of ln Γ turns ln 10! or ln √π red (number %d)', (at) => {
    expect(isOff(lanczos)).toBe(false)
    expect(isOff(lanczos.map((one, n) => (n === at ? one * 1.02 : one)))).toBe(true)
  })
})
