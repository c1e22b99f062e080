import { describe, expect, it } from 'vitest'
import { logGamma, lanczos } from '#shared/numerics/studentT'
import { withAlternative } from '#shared/thermo/conventions/closes'
import { conventions, defaultConvention } from '#shared/thermo/conventions/index'
import type { Constants, Inputs } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity } from '#shared/thermo/registry'
import { dependsOnConstants, publishedRows, rowIsOff } from '../../../fixtures/thermo/publishedRows'
import { describeWithShared } from '../../../fixtures/sharedFolder'
import { waterFiguresOf } from '../../../fixtures/thermo/waterByIapws'

const { constants } = defaultConvention

function value(key: string, inputs: Inputs, with_: Constants, variant?: string): number {
  const definition = findQuantity(key)
  if (!definition) throw new Error(key)
  const outcome = evaluateQuantity(definition, inputs, with_, variant)
  return outcome.is === 'value' ? outcome.value : NaN
}

function waterFigure(what: string, temperature: number): number {
  const [found] = waterFiguresOf(what, temperature, temperature)
  return found?.value ?? NaN
}

/** Published values of constants that no row of the table turns on: they enter by variants that are not taught first, or in digits that no row prints. */
const published: readonly { constant: string, what: string, got: (with_: Constants) => number, expected: number, tolerance: number, source: string }[] = [
  { constant: 'zeroCelsius', what: '0 °C in kelvin', got: with_ => with_.zeroCelsius ?? NaN, expected: 273.15, tolerance: 0, source: 'SI Brochure, 9th ed. (2019), 2.3.1: exact (verified)' },
  { constant: 'latentHeat', what: 'latent heat of vaporization at 0.01 °C, kJ/kg, by Kirchhoff’s relation', got: with_ => value('latent-heat-of-vaporization', { temperature: 273.16 }, with_, 'kirchhoff') / 1000, expected: waterFigure('latent heat of vaporization', 273.16) / 1000, tolerance: 2.5, source: 'IAPWS-95, by python3-iapws (verified); 2.5 to 2.501 MJ/kg taught' },
  { constant: 'cw', what: 'specific heat of liquid water at 15 °C, J/(kg K)', got: with_ => with_.cw ?? NaN, expected: waterFigure('specific heat of liquid water', 288.15), tolerance: 42, source: 'IAPWS-95, by python3-iapws (verified); 1 %: 4180 to 4220 between 0 and 40 °C' },
  { constant: 'cpv', what: 'specific heat of water vapor at 0.01 °C, J/(kg K)', got: with_ => with_.cpv ?? NaN, expected: waterFigure('specific heat of water vapor', 273.16), tolerance: 19, source: 'IAPWS-95, saturated vapor, by python3-iapws (verified); 1 %: 1865 to 1900 near 0 °C' },
  { constant: 'latentHeatIce', what: 'latent heat of sublimation at 0.01 °C, kJ/kg', got: with_ => (with_.latentHeatIce ?? NaN) / 1000, expected: waterFigure('latent heat of sublimation', 273.16) / 1000, tolerance: 5, source: 'IAPWS-95 and R10-06(2009), by python3-iapws (verified)' },
  { constant: 'vonKarman', what: 'distance of the von Kármán constant from the two that are measured and taught, 0.40 and 0.41', got: with_ => Math.min(Math.abs((with_.vonKarman ?? NaN) - 0.4), Math.abs((with_.vonKarman ?? NaN) - 0.41)), expected: 0, tolerance: 0.001, source: 'Högström (1996), Bound.-Layer Meteor. 78, 215–246: 0.40 ± 0.01; Dyer (1974), Bound.-Layer Meteor. 7, 363–372: 0.41 (from memory)' },
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

/** Constants of the other conventions, and of every accepted alternative: each set apart from those of the default convention where it says something else. */
const others = conventions.flatMap(convention => [
  { title: convention.key, with_: convention.constants, names: Object.keys(convention.constants).filter(name => convention.constants[name] !== constants[name]) },
  ...convention.accepted.map(({ label, constants: changed = {} }) => ({ title: `${convention.key}, ${label}`, with_: withAlternative(convention.constants, changed), names: Object.keys(changed) })),
])
const seen = new Set<string>()
const apart = others.flatMap(({ title, with_, names }) => names.flatMap((name) => {
  // what is said alike by several conventions is planted once
  const mark = JSON.stringify([name, with_[name], with_.cp, with_.R, with_.g, with_.kappa])
  if (seen.has(mark) || notPublished.includes(name)) return []
  seen.add(mark)
  return ([0.98, 1.02] as const).map(factor => [name, factor, title, with_] as const)
}))

describeWithShared('so does one of any other convention, and of any accepted alternative', () => {
  const rows = publishedRows.filter(dependsOnConstants)
  it('of which there are many', () => expect(apart.length).toBeGreaterThan(60))
  it.each(apart)('%s × %d (%s)', (name, factor, _title, with_) => {
    const corrupted: Constants = { ...with_, [name]: (with_[name] ?? NaN) * factor }
    const turned = rows.some(row => rowIsOff(row, corrupted) && !rowIsOff(row, with_))
      || published.some(one => !(Math.abs(one.got(corrupted) - one.expected) <= one.tolerance) && Math.abs(one.got(with_) - one.expected) <= one.tolerance)
    expect(turned).toBe(true)
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
