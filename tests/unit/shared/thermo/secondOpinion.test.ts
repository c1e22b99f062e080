/** A second opinion on moist air: PsychroLib 1.1.1 (MIT), which follows the ASHRAE Handbook; from the registry, for tests alone. */
import { createRequire } from 'node:module'
import { describe, expect, it } from 'vitest'
import { formulaeOf } from '#shared/marking/alternatives'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity } from '#shared/thermo/registry'
import { stullWetBulb } from '#shared/thermo/wetBulb'
import { fraction, randomSource, seedFromNumber } from '#shared/numerics/random'

type Library = Readonly<Record<string, number | ((...numbers: number[]) => number)>>
const isLibrary = (found: unknown): found is Library => typeof found === 'object' && found !== null && 'GetSatVapPres' in found

/** Its functions by name, all of numbers; null where it is not installed. */
function load(): ((name: string, ...numbers: number[]) => number) | null {
  try {
    const found: unknown = createRequire(import.meta.url)('psychrolib')
    if (!isLibrary(found)) return null
    const call = (name: string, ...numbers: number[]): number => {
      const work = found[name]
      if (typeof work !== 'function') throw new Error(`psychrolib has no ${name}`)
      return work.apply(found, numbers)
    }
    call('SetUnitSystem', Number(found.SI))
    return call
  }
  catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'MODULE_NOT_FOUND') return null
    throw error
  }
}
const second = load()
if (!second && process.env.CI === 'true') throw new Error('CI=true and psychrolib is not installed: npm ci brings it.')

const formulae = { ...formulaeOf(defaultConvention), variants: { 'saturation-vapor-pressure': 'industrial' } }
function value(quantity: string, inputs: Inputs): number {
  const definition = findQuantity(quantity)
  const found = definition && evaluateQuantity(definition, inputs, defaultConvention.constants, undefined, formulae)
  return found?.is === 'value' ? found.value : NaN
}

describe.skipIf(!second)('PsychroLib agrees', () => {
  const states = Array.from({ length: 300 }, (_, n) => {
    const source = randomSource(seedFromNumber(700 + n))
    return { t: 1 + 39 * fraction(source), RH: 0.1 + 0.88 * fraction(source), p: 70_000 + 33_000 * fraction(source) }
  })
  const by = (name: string, ...numbers: number[]): number => second?.(name, ...numbers) ?? NaN
  const farthest = (off: (state: { t: number, RH: number, p: number }) => number): number => Math.max(...states.map(state => Math.abs(off(state))))
  it('on saturation vapor pressure, to 0.05 %', () => {
    expect(farthest(({ t }) => value('saturation-vapor-pressure', { temperature: t + 273.15 }) / by('GetSatVapPres', t) - 1)).toBeLessThan(5e-4)
    expect(farthest(({ t }) => value('saturation-vapor-pressure-over-ice', { temperature: 272.5 - t }) / by('GetSatVapPres', -0.65 - t) - 1)).toBeLessThan(0.001)
  })
  it('on mixing ratio from relative humidity, to 0.1 %', () => {
    expect(farthest(({ t, RH, p }) => value('mixing-ratio-from-vapor-pressure', { pressure: p, vaporPressure: value('vapor-pressure-from-relative-humidity', { temperature: t + 273.15, relativeHumidity: RH }) }) / by('GetHumRatioFromRelHum', t, RH, p) - 1)).toBeLessThan(1e-3)
  })
  it('on the dewpoint, to 0.01 K above 0 °C', () => {
    expect(farthest(({ t, RH }) => {
      const its = by('GetTDewPointFromRelHum', t, RH)
      return its < 0.02 ? 0 : value('dewpoint-from-relative-humidity', { temperature: t + 273.15, relativeHumidity: RH }) - 273.15 - its
    })).toBeLessThan(0.01)
  })
  it('on the wet bulb, to 0.03 K above 0 °C', () => {
    expect(farthest(({ t, RH, p }) => {
      const its = by('GetTWetBulbFromRelHum', t, RH, p)
      return its < 0.1 ? 0 : value('wet-bulb-temperature-from-relative-humidity', { pressure: p, temperature: t + 273.15, relativeHumidity: RH }) - 273.15 - its
    })).toBeLessThan(0.03)
  })
  it('on the error of Stull’s fit: −1.2 to +1.3 K above 0 °C, 0.4 K in the mean', () => {
    const errors: number[] = []
    for (let t = 0; t <= 50; t += 2.5) for (let RH = 5; RH <= 99; RH += 2) errors.push(stullWetBulb(t + 273.15, RH / 100) - 273.15 - by('GetTWetBulbFromRelHum', t, RH / 100, 101_325))
    expect(Math.min(...errors)).toBeGreaterThan(-1.2)
    expect(Math.max(...errors)).toBeLessThan(1.35)
    expect(errors.reduce((sum, one) => sum + Math.abs(one), 0) / errors.length).toBeLessThan(0.4)
    expect(findQuantity('wet-bulb-temperature-from-relative-humidity')?.variants.find(one => one.key === 'stull')?.knownError).toContain('−1.2 to +1.3 K')
  })
  it('on enthalpy and density of moist air, to 0.3 %', () => {
    const w = ({ t, RH, p }: { t: number, RH: number, p: number }) => by('GetHumRatioFromRelHum', t, RH, p)
    expect(farthest(state => value('specific-enthalpy-of-moist-air', { temperature: state.t + 273.15, mixingRatio: w(state) }) / by('GetMoistAirEnthalpy', state.t, w(state)) - 1)).toBeLessThan(0.003)
    expect(farthest((state) => {
      const vaporPressure = value('vapor-pressure-from-mixing-ratio', { pressure: state.p, mixingRatio: w(state) })
      return value('density-of-moist-air', { pressure: state.p, temperature: state.t + 273.15, vaporPressure }) / by('GetMoistAirDensity', state.t, w(state), state.p) - 1
    })).toBeLessThan(0.001)
  })
})
