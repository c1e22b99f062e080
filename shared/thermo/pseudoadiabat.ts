/**
 * Saturated ascent and descent in which condensed water leaves at once (or is always there on the way down): the pseudoadiabat.
 *
 *   dT/d ln p = (R T + L wₛ) / (cp + L² wₛ ε / (R T²))     wₛ = ε eₛ(T) / (p − eₛ(T))
 *
 * Source: AMS Glossary of Meteorology, "adiabatic lapse rate", moist-adiabatic, with dp = −ρ g dz. Valid: saturated air over liquid water.
 * Errors: with the latent heat constant or by temperature up to 0.6 K over 600 hPa; the heat capacity of the vapor is left out, below 1 % of the rate.
 *
 * The integration is deterministic: fourth-order Runge–Kutta in ln p, in equal steps of at most 0.05 between two levels; a step
 * ten times shorter moves no temperature by 1e-5 K (a test says so).
 */
import { exp, log } from '../numerics/elementary'
import { OutOfRangeError } from './errors'
import type { MoistAir } from './moistAir'

/** The longest step in ln p. */
export const longestStep = 0.05

/** dT/d ln p at a saturated state, K. @throws {OutOfRangeError} where the water would boil */
export const pseudoadiabaticSlope = (temperature: number, pressure: number, air: MoistAir): number => slopeAt(temperature, pressure, air.es(temperature), air)

/** The same where the saturation vapor pressure is known: what the innermost loop of an ascent calls. @throws {OutOfRangeError} where the water would boil */
export function slopeAt(temperature: number, pressure: number, saturationPressure: number, air: MoistAir): number {
  if (!(saturationPressure < pressure)) throw new OutOfRangeError('temperature', temperature, `temperatures whose saturation vapor pressure is below ${pressure} Pa`)
  const w = air.epsilon * saturationPressure / (pressure - saturationPressure)
  const L = air.L(temperature)
  const RT = air.R * temperature
  return (RT + L * w) / (air.cp + L * L * w * air.epsilon / (RT * temperature))
}

/**
 * Temperature of saturated air after it is brought from one pressure to another along its pseudoadiabat, up or down.
 *
 * @example pseudoadiabaticTemperature(278.15, 92500, 70000, moistAir(constants, formulae)) // 264.3 K
 * @throws {OutOfRangeError}
 */
export function pseudoadiabaticTemperature(temperature: number, from: number, to: number, air: MoistAir, step = longestStep): number {
  if (from === to) return temperature
  const start = log(from), whole = log(to) - start
  const count = Math.ceil(Math.abs(whole) / step)
  const h = whole / count
  let T = temperature
  let p = from
  for (let n = 1; n <= count; n++) {
    const middle = exp(start + (n - 0.5) * h)
    const next = n === count ? to : exp(start + n * h)
    const k1 = pseudoadiabaticSlope(T, p, air)
    const k2 = pseudoadiabaticSlope(T + 0.5 * h * k1, middle, air)
    const k3 = pseudoadiabaticSlope(T + 0.5 * h * k2, middle, air)
    const k4 = pseudoadiabaticSlope(T + h * k3, next, air)
    T += h / 6 * (k1 + 2 * k2 + 2 * k3 + k4)
    p = next
  }
  return T
}

/**
 * Temperatures along one pseudoadiabat at a list of pressures, each reached from the one before it; the first from the start.
 * `into` is filled and given back, so that a loop over many parcels makes no arrays.
 *
 * @example pseudoadiabatThrough([85000, 70000], 278.15, 92500, air) // Float64Array [274.1, 264.3]
 * @throws {OutOfRangeError}
 */
export function pseudoadiabatThrough(pressures: ArrayLike<number>, temperature: number, pressure: number, air: MoistAir, into: Float64Array = new Float64Array(pressures.length)): Float64Array {
  let T = temperature, p = pressure
  for (let at = 0; at < pressures.length; at++) {
    const next = pressures[at] ?? p
    T = pseudoadiabaticTemperature(T, p, next, air)
    p = next
    into[at] = T
  }
  return into
}
