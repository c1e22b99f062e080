/** The convective condensation level: where a sounding meets the saturation mixing ratio line of the air at its lowest row. */
import { exp, log, pow } from '../numerics/elementary'
import { findRoot } from '../numerics/rootFinding'
import type { Constants, Formulae, InputDefinition, Inputs, Outcome, QuantityDefinition, Slip, TraceStep } from './definition'
import { OutOfRangeError } from './errors'
import { mixingRatioFrom } from './humidity'
import { seriesOf } from './inputs'
import { moistAir, type MoistAir } from './moistAir'
import { inCelsius, inGrams, inHectopascal } from './moistTex'
import { overWaterKey, saturationNotes } from './saturationFunction'
import { texNumber } from './tex'

export interface ConvectiveLevel { pressure: number, temperature: number, mixingRatio: number, surfacePressure: number }

const series = (name: string, label: string, symbol: string, range: readonly [number, number], order: 'none' | 'descending'): InputDefinition => ({ name, label, symbol, unit: name === 'pressure' ? 'Pa' : 'K', shownUnit: name === 'pressure' ? 'hPa' : 'Cel', kind: name === 'pressure' ? 'ratio' : 'temperature', shape: 'series', range, needs: { least: 2, order } })
const inputs: readonly InputDefinition[] = [
  series('pressure', 'pressures of the rows, from the ground up', 'p', [1000, 110_000], 'descending'),
  series('temperature', 'air temperatures of the rows', 'T', [150, 340], 'none'),
  series('dewpoint', 'dewpoints of the rows', 'T_d', [130, 320], 'none'),
]

/**
 * The lowest level above the first row at which the sounding is as cold as saturation with the first row's mixing ratio; temperature linear in ln p
 * between rows. Null where the data end before it.
 *
 *   wₛ(T(p), p) = wₛ(T_d0, p₀)
 *
 * Source: AMS Glossary of Meteorology, "convective condensation level". Limits: the moisture is the first row's, not that of a mixed layer.
 *
 * @throws {OutOfRangeError} for a dewpoint at which the water would boil
 * @example convectiveLevel([99300, 95700, 92500, …], [307.75, 304.25, …], 292.75, air) // 758.3 hPa
 */
export function convectiveLevel(pressures: readonly number[], temperatures: readonly number[], surfaceDewpoint: number, air: MoistAir): ConvectiveLevel | null {
  const surface = pressures[0] ?? 0, e = air.es(surfaceDewpoint)
  if (!(e < surface)) throw new OutOfRangeError('dewpoint', surfaceDewpoint, `dewpoints whose vapor pressure is below ${surface} Pa`)
  const w = mixingRatioFrom(e, surface, air.epsilon)
  const excess = (T: number, p: number): number => {
    const es = air.es(T)
    return es < p ? mixingRatioFrom(es, p, air.epsilon) - w : Infinity
  }
  if (excess(temperatures[0] ?? 0, surface) <= 0) return { pressure: surface, temperature: temperatures[0] ?? 0, mixingRatio: w, surfacePressure: surface }
  for (let at = 1; at < pressures.length; at++) {
    const p = pressures[at] ?? 0, T = temperatures[at] ?? 0
    if (excess(T, p) > 0) continue
    const low = log(pressures[at - 1] ?? p), high = log(p), below = temperatures[at - 1] ?? T
    const between = (x: number) => below + (T - below) * (x - low) / (high - low)
    const root = findRoot(x => excess(between(x), exp(x)), low, high)
    return { pressure: exp(root), temperature: between(root), mixingRatio: w, surfacePressure: surface }
  }
  return null
}

/** The temperature that the ground air needs for convection to reach the level: down the dry adiabat, T_c = T (p₀/p)^κ. */
export const convectiveTemperatureOf = (level: ConvectiveLevel, kappa: number): number => level.temperature * pow(level.surfacePressure / level.pressure, kappa)

interface Convective extends Pick<QuantityDefinition, 'key' | 'name' | 'symbol' | 'unit' | 'shownUnit' | 'kind' | 'ask' | 'example'> {
  value: (level: ConvectiveLevel, air: MoistAir) => number
  last: (level: ConvectiveLevel, air: MoistAir, value: number) => TraceStep
  slips: (find: (inputs: Inputs, constants: Constants, formulae: Formulae) => { level: ConvectiveLevel | null, air: MoistAir }) => readonly Slip[]
}

function find(given: Inputs, constants: Constants, formulae: Formulae): { level: ConvectiveLevel | null, air: MoistAir } {
  const air = moistAir(constants, formulae)
  return { level: convectiveLevel(seriesOf(given, 'pressure'), seriesOf(given, 'temperature'), seriesOf(given, 'dewpoint')[0] ?? 0, air), air }
}

export function convectiveDefinition({ value, last, slips, ...named }: Convective): QuantityDefinition {
  const missing = 'The data end before the sounding is as cold as saturation with the mixing ratio of the lowest row.'
  const outcome = (given: Inputs, constants: Constants, formulae: Formulae): Outcome => {
    const { level, air } = find(given, constants, formulae)
    return level ? { is: 'value', value: value(level, air), more: { pressure: level.pressure, temperature: level.temperature } } : { is: 'not_reached', why: missing }
  }
  return {
    ...named,
    inputs,
    variants: [{ key: 'lowest-row', label: 'moisture of the lowest row', source: { text: 'AMS Glossary of Meteorology, "convective condensation level"', status: 'common practice' }, validity: 'a sounding from the ground', knownError: 'the spacing of the rows; 0.3 hPa by the formula of eₛ', evaluate: outcome }],
    constants: ['R', 'Rv', 'cp', 'kappa', 'enhancementFactor'],
    uses: [overWaterKey],
    notes: (given, _constants, formulae) => saturationNotes(seriesOf(given, 'dewpoint').slice(0, 1), formulae),
    trace(given, constants, _variant, formulae) {
      const { level, air } = find(given, constants, formulae)
      if (!level) return [{ text: missing, formula: 'w_s(T(p), p) > w', filled: '\\text{not reached}' }]
      const result = value(level, air)
      return [
        { text: 'Mixing ratio of the lowest row', formula: 'w = w_s(T_{d0}, p_0)', filled: `w = ${inGrams(level.mixingRatio)}`, value: level.mixingRatio, unit: '1' },
        { text: 'Where the sounding is as cold as saturation with it; T linear in ln p between rows', formula: 'w_s(T(p), p) = w', filled: `p = ${inHectopascal(level.pressure)},\\ T = ${inCelsius(level.temperature)}`, value: level.pressure, unit: 'Pa' },
        ...named.unit === 'Pa' ? [] : [last(level, air, result)],
      ].map((step, at, all) => (at === all.length - 1 ? { ...step, value: result, unit: named.unit } : step))
    },
    slips: slips(find),
  }
}

export const downStep = (level: ConvectiveLevel, air: MoistAir, value: number): TraceStep => (
  { text: 'Down the dry adiabat to the ground', formula: 'T_c = T\\left(\\frac{p_0}{p}\\right)^{\\kappa}', filled: `T_c = ${texNumber(level.temperature, 6)}\\left(\\frac{${texNumber(level.surfacePressure / 100, 6)}}{${texNumber(level.pressure / 100, 6)}}\\right)^{${texNumber(air.kappa)}} = ${inCelsius(value)}` })
