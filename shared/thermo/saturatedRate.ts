/** Local lapse rates of saturated air: plain numbers, SI. */
import { mixingRatioFrom } from './humidity'
import type { MoistAir } from './moistAir'

/**
 * Saturated adiabatic lapse rate.
 *
 *   Γm = g (1 + L wₛ/(R T)) / (cp + L² wₛ ε/(R T²))
 *
 * Source: AMS Glossary of Meteorology, "adiabatic lapse rate", moist-adiabatic. Valid: saturated air over liquid water; within 1 % of the full form.
 *
 * @example saturatedRate(293.15, 100000, moistAir(constants, formulae)) // 0.00432 K m⁻¹
 */
export function saturatedRate(temperature: number, pressure: number, air: MoistAir): number {
  const w = mixingRatioFrom(air.es(temperature), pressure, air.epsilon), L = air.L(temperature)
  return air.g * (1 + L * w / (air.R * temperature)) / (air.cp + L * L * w * air.epsilon / (air.R * temperature * temperature))
}

/**
 * The same with the heat capacity of the water, of which `liquid` (kg kg⁻¹) stays in the parcel: none for the pseudoadiabat.
 *
 *   Γ = g (1 + w_t)(1 + L wₛ/(R T)) / (cp + wₛ cpv + w_l cw + L² wₛ (ε + wₛ)/(R T²))     w_t = wₛ + w_l
 *
 * Source: AMS Glossary of Meteorology, "moist-adiabatic lapse rate" (pseudoadiabatic and reversible).
 *
 * @example fullSaturatedRate(293.15, 100000, 0, moistAir(constants, formulae)) // 0.0043 K m⁻¹
 */
export function fullSaturatedRate(temperature: number, pressure: number, liquid: number, air: MoistAir): number {
  const w = mixingRatioFrom(air.es(temperature), pressure, air.epsilon), L = air.L(temperature)
  return air.g * (1 + w + liquid) * (1 + L * w / (air.R * temperature))
    / (air.cp + w * air.cpv + liquid * air.cw + L * L * w * (air.epsilon + w) / (air.R * temperature * temperature))
}
