/** The rows of a sounding, from the ground up, as parcels need them: arrays of plain numbers, made once. */
import { log } from '../numerics/elementary'
import type { InputDefinition, Inputs } from './definition'
import { OutOfRangeError, SeriesError } from './errors'
import { mixingRatioFrom, virtualTemperatureFrom } from './humidity'
import { numberOf, seriesOf } from './inputs'
import type { MoistAir } from './moistAir'

export const soundingInputs: readonly InputDefinition[] = [
  { name: 'pressure', label: 'pressures of the rows, from the ground up', symbol: 'p', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'series', range: [100, 110_000], needs: { least: 2, order: 'descending' } },
  { name: 'temperature', label: 'air temperatures of the rows', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'series', range: [150, 340], needs: { least: 2, order: 'none' } },
  { name: 'dewpoint', label: 'dewpoints of the rows', symbol: 'T_d', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'series', range: [130, 320], needs: { least: 2, order: 'none' } },
]
/** Rows below the ground, which some archives list, are left out by it. */
export const surfacePressureInput: InputDefinition = { name: 'surfacePressure', label: 'pressure at the ground; rows below it are left out', symbol: 'p_s', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [30_000, 110_000], isOptional: true }

/** Neighboring rows may be at most this far apart, as a ratio of pressures: beyond it the air between is not known. */
export const widestGap = 2

export interface Sounding {
  count: number
  pressure: Float64Array
  logPressure: Float64Array
  temperature: Float64Array
  dewpoint: Float64Array
  mixingRatio: Float64Array
  virtualTemperature: Float64Array
}

/** Room for a sounding of so many rows, in one piece of memory. */
export function roomForSounding(count: number): Sounding {
  const memory = new ArrayBuffer(6 * 8 * count)
  const column = (at: number) => new Float64Array(memory, 8 * count * at, count)
  return { count, pressure: column(0), logPressure: column(1), temperature: column(2), dewpoint: column(3), mixingRatio: column(4), virtualTemperature: column(5) }
}

/**
 * A sounding from its columns. Rows have to fall in pressure without a gap. `into` is filled and given back where it has room for just these rows,
 * so that a loop over many soundings takes no memory.
 *
 * @throws {SeriesError} for a gap wider than a factor of 2 in pressure, or where the ground leaves fewer than two rows
 * @throws {OutOfRangeError} for a dewpoint at which the vapor pressure is that of the air
 * @example makeSounding([100000, 85000], [300, 291], [293, 285], air).mixingRatio[0] // 0.0148
 */
export function makeSounding(pressures: readonly number[], temperatures: readonly number[], dewpoints: readonly number[], air: MoistAir, ground = Infinity, into?: Sounding): Sounding {
  let first = 0
  while (first < pressures.length && (pressures[first] ?? 0) > ground) first++
  const count = pressures.length - first
  if (count < 2) throw new SeriesError('pressure', 'fewer than two rows are above the ground')
  const sounding = into?.count === count ? into : roomForSounding(count)
  const { pressure, logPressure, temperature, dewpoint, mixingRatio, virtualTemperature } = sounding
  let before = 0
  for (let at = 0; at < count; at++) {
    const p = pressures[first + at] ?? 0, T = temperatures[first + at] ?? 0, Td = dewpoints[first + at] ?? 0
    if (at > 0 && before > widestGap * p) throw new SeriesError('pressure', `a gap from ${before / 100} to ${p / 100} hPa; an ascent needs rows that are at most a factor of ${widestGap} apart`)
    before = p
    const e = air.es(Td)
    if (!(e < p)) throw new OutOfRangeError('dewpoint', Td, `dewpoints whose vapor pressure is below ${p} Pa`)
    const w = mixingRatioFrom(e, p, air.epsilon)
    pressure[at] = p
    logPressure[at] = log(p)
    temperature[at] = T
    dewpoint[at] = Td
    mixingRatio[at] = w
    virtualTemperature[at] = virtualTemperatureFrom(T, w, air.epsilon)
  }
  return sounding
}

/** The sounding of a definition's inputs. */
export function soundingOf(inputs: Inputs, air: MoistAir): Sounding {
  return makeSounding(seriesOf(inputs, 'pressure'), seriesOf(inputs, 'temperature'), seriesOf(inputs, 'dewpoint'), air, 'surfacePressure' in inputs ? numberOf(inputs, 'surfacePressure') : Infinity)
}

/**
 * A column's value at a pressure, linear in ln p between rows; null below the lowest or above the highest row: nothing is extrapolated.
 *
 * @example atPressure(sounding, sounding.temperature, 50000)
 */
export function atPressure(sounding: Sounding, column: Float64Array, pressure: number): number | null {
  const { count, pressure: p, logPressure } = sounding
  const bottom = p[0] ?? 0, top = p[count - 1] ?? 0
  if (!(pressure <= bottom && pressure >= top)) return null
  let low = 0, high = count - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if ((p[middle] ?? 0) >= pressure) low = middle
    else high = middle
  }
  const below = column[low] ?? 0, above = column[high] ?? 0
  if (pressure === p[low]) return below
  if (pressure === p[high]) return above
  const from = logPressure[low] ?? 0, to = logPressure[high] ?? 0
  return below + (log(pressure) - from) / (to - from) * (above - below)
}
