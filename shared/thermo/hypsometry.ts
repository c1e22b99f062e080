/**
 * Heights and pressures of a hydrostatic column, by its mean virtual temperature or by levels.
 *
 *   Δz = (R T̄v/g) ln(p₁/p₂)     p₂ = p₁ exp[−g Δz/(R T̄v)]
 *
 * Source: AMS Glossary of Meteorology, "hypsometric equation". T̄v is weighted by the logarithm of pressure. Limits: g constant.
 * The thickness itself: `quantities/hypsometricThickness.ts`.
 */
import { exp, log } from '../numerics/elementary'
import { type Kelvin, kelvin, type Meter, type Pascal, pascal } from '../units/brands'
import { constant } from './constants'
import type { Constants } from './definition'
import { SeriesError } from './errors'
import { standardConstants } from './standardAtmosphere'

/**
 * Pressure at a height above (below, where it is negative) a level of known pressure.
 * @example pressureAtHeight(pascal(100000), meter(1500), kelvin(283.15), closed1004.constants) // 83437 Pa
 */
export function pressureAtHeight(pressure: Pascal, heightDifference: Meter, meanVirtualTemperature: Kelvin, constants: Constants): Pascal {
  return pascal(pressure * exp(-constant(constants, 'g') * heightDifference / (constant(constants, 'R') * meanVirtualTemperature)))
}

/**
 * Mean temperature of levels, weighted by the logarithm of pressure, with the mean of both ends in each layer between two levels.
 *
 *   T̄ = Σ ½ (Tᵢ + Tᵢ₊₁) ln(pᵢ/pᵢ₊₁) / ln(p₁/pₙ)
 *
 * @throws {SeriesError} with fewer than two levels
 * @example logPressureMean([100000, 85000, 70000], [293.15, 285.15, 277.15]) // 284.79 K
 */
export function logPressureMean(pressures: readonly number[], temperatures: readonly number[]): Kelvin {
  let sum = 0, weights = 0
  for (let at = 1; at < pressures.length; at++) {
    const below = pressures[at - 1] ?? NaN, above = pressures[at] ?? NaN
    const weight = log(below / above)
    sum += weight * ((temperatures[at - 1] ?? NaN) + (temperatures[at] ?? NaN)) / 2
    weights += weight
  }
  if (!(weights > 0)) throw new SeriesError('pressure', 'at least two levels are needed, from the bottom upwards')
  return kelvin(sum / weights)
}

/** Of the fictitious air between a station and sea level, K m⁻¹: the mean lapse rate of the standard atmosphere. */
export const reductionLapseRate = -(standardConstants.layers[0]?.lapse ?? NaN)

/**
 * Mean temperature of the fictitious layer between a station and sea level: half way along 6.5 K km⁻¹, or the station's own.
 * Source: WMO-No. 8, reduction of pressure to sea level, common practice.
 * @example fictitiousMeanTemperature(kelvin(283.15), meter(320), 0.0065) // 284.19 K
 */
export const fictitiousMeanTemperature = (stationTemperature: Kelvin, stationHeight: Meter, lapseRate: number): Kelvin => kelvin(stationTemperature + lapseRate * stationHeight / 2)
