/** Means of winds. Directions are those that the wind comes from, in radians clockwise from north; north is a full turn, 0 is no direction. */
import { atan2, cos, sin } from '../numerics/angles'
import { mean } from '../numerics/regression'
import type { InputDefinition, Inputs } from './definition'
import { seriesOf } from './inputs'
import { windComponents } from './richardson'

export const fullTurn = 6.283185307179586
/** What is left of unit vectors that cancel, by rounding: a shorter resultant has no direction. */
const noResultant = 1e-9
export const perDegree = fullTurn / 360

const series = (input: Omit<InputDefinition, 'shape' | 'needs'>): InputDefinition => ({ ...input, shape: 'series', needs: { least: 1, order: 'none' } })
export const windSpeedSeries = series({ name: 'windSpeed', label: 'wind speeds', symbol: 's', unit: 'm/s', shownUnit: 'm/s', kind: 'difference', range: [0, 200] })
export const windDirectionSeries = series({ name: 'windDirection', label: 'wind directions', symbol: 'd', unit: 'rad', shownUnit: 'deg', kind: 'difference', range: [0, 6.283185307179587] })

export interface MeanWind { u: number, v: number, speed: number }

/**
 * Mean of the wind vectors.
 *
 *   ū = −mean(s sin d),  v̄ = −mean(s cos d),  V̄ = √(ū² + v̄²)
 *
 * Source: WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 5. SI, radians.
 *
 * @example vectorMean({ windSpeed: [5, 5], windDirection: [0, π/2] }).speed // 3.54 m/s
 */
export function vectorMean(inputs: Inputs): MeanWind {
  const speeds = seriesOf(inputs, 'windSpeed'), directions = seriesOf(inputs, 'windDirection')
  const parts = speeds.map((speed, at) => windComponents(speed, directions[at] ?? 0))
  const u = mean(parts.map(part => part.u)), v = mean(parts.map(part => part.v))
  return { u, v, speed: Math.sqrt(u * u + v * v) }
}

/**
 * The direction that a wind comes from, (0, 2π]; null where there is next to no wind against `scale`.
 *
 *   d = atan2(−u, −v)     north is a full turn, as on a wind vane's dial
 *
 * Source: AMS Glossary of Meteorology, "wind direction".
 *
 * @example directionOf(10, 0, 10) // 270°, in radians
 */
export function directionOf(u: number, v: number, scale: number): number | null {
  if (!(Math.sqrt(u * u + v * v) > noResultant * scale)) return null
  const angle = atan2(-u, -v)
  // less than rounding can tell from north is north
  return angle > 1e-12 ? angle : angle < -1e-12 ? angle + fullTurn : fullTurn
}

export interface MeanDirection { direction: number | null, resultant: number, count: number }

/**
 * Mean direction by unit vectors; calm rows stay out.
 *
 *   d̄ = atan2(mean(sin d), mean(cos d)),  R = √(mean(sin d)² + mean(cos d)²)
 *
 * Source: Mardia & Jupp (2000), Directional Statistics, section 2.2; WMO-No. 8, vol. I, ch. 5 (from memory). Null where the vectors cancel or all is calm.
 *
 * @example meanDirection({ windDirection: [350°, 10°] }).direction // 360°, in radians
 */
export function meanDirection(inputs: Inputs): MeanDirection {
  const speeds = 'windSpeed' in inputs ? seriesOf(inputs, 'windSpeed') : null
  const blowing = seriesOf(inputs, 'windDirection').filter((_direction, at) => speeds === null || (speeds[at] ?? 0) > 0)
  if (blowing.length === 0) return { direction: null, resultant: 0, count: 0 }
  const east = mean(blowing.map(sin)), north = mean(blowing.map(cos))
  return { direction: directionOf(-east, -north, 1), resultant: Math.sqrt(east * east + north * north), count: blowing.length }
}
