import { log } from '../numerics/elementary'
import { findRoot } from '../numerics/rootFinding'
import { mixingRatioFrom } from './humidity'
import type { MoistAir } from './moistAir'

/**
 * Temperature of saturated air that keeps its water, after a change of pressure: its moist entropy stays.
 *
 *   (cp + w_t cw) ln T − R ln(p − eₛ) + L wₛ/T = const.     w_t all water
 *
 * Source: Emanuel (1994), Atmospheric Convection, Eq. 4.5.9, for saturated air. Valid: over liquid water, while there is any.
 *
 * @example reversibleTemperature(278.15, 92500, 70000, 0.006, moistAir(constants, formulae)) // 264.4 K
 */
export function reversibleTemperature(temperature: number, from: number, to: number, totalWater: number, air: MoistAir): number {
  const entropy = (T: number, p: number): number => {
    const e = air.es(T)
    return e < p ? (air.cp + totalWater * air.cw) * log(T) - air.R * log(p - e) + air.L(T) * mixingRatioFrom(e, p, air.epsilon) / T : Infinity
  }
  const kept = entropy(temperature, from)
  return findRoot(T => entropy(T, to) - kept, 130, 400)
}
