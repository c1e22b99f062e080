/** Equivalent potential temperatures: plain numbers, SI; the mixing ratio in kg kg⁻¹, whatever unit the printed formula takes. */
import { exp, pow } from '../numerics/elementary'
import { boltonLclTemperature } from './liftingCondensation'
import { mixingRatioFrom } from './humidity'
import type { MoistAir } from './moistAir'

/**
 * Equivalent potential temperature by θ of the dry air at the lifting condensation level.
 *
 *   θe = θ_DL exp[(3036/T_L − 1.78) w (1 + 0.448 w)],   θ_DL = T (p₀/(p − e))^κ (T/T_L)^(0.28 w)     w in kg kg⁻¹
 *
 * Source: Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eqs. 24 and 39. Valid: θe below 480 K, within 0.02 K.
 *
 * @example bolton39(293.15, 285, 85000, 2064, 0.0155, 0.2857) // 353.94 K
 */
export function bolton39(temperature: number, lclTemperature: number, pressure: number, vaporPressure: number, mixingRatio: number, kappa: number): number {
  const dry = temperature * pow(100_000 / (pressure - vaporPressure), kappa) * pow(temperature / lclTemperature, 0.28 * mixingRatio)
  return dry * exp((3036 / lclTemperature - 1.78) * mixingRatio * (1 + 0.448 * mixingRatio))
}

/**
 * Equivalent potential temperature by θ of the moist air.
 *
 *   θe = T (p₀/p)^[0.2854 (1 − 0.28 w)] exp[(3376/T_L − 2.54) w (1 + 0.81 w)]     w in kg kg⁻¹
 *
 * Source: Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 43. Valid: θe below 380 K, within 0.3 K.
 *
 * @example bolton43(293.15, 285, 85000, 0.0155) // 353.94 K
 */
export function bolton43(temperature: number, lclTemperature: number, pressure: number, mixingRatio: number): number {
  return temperature * pow(100_000 / pressure, 0.2854 * (1 - 0.28 * mixingRatio)) * exp((3376 / lclTemperature - 2.54) * mixingRatio * (1 + 0.81 * mixingRatio))
}

/**
 * θe of a parcel with a temperature and a dewpoint at a pressure: by equation 43 where the variant says so, else by 39. T_L by Bolton's equation 15.
 *
 * @example equivalentPotentialTemperature(293.15, 291.15, 85000, moistAir(constants, formulae)) // 353.9 K
 */
export function equivalentPotentialTemperature(temperature: number, dewpoint: number, pressure: number, air: MoistAir, variant?: string): number {
  const e = air.es(dewpoint), w = mixingRatioFrom(e, pressure, air.epsilon)
  const lcl = dewpoint >= temperature ? temperature : boltonLclTemperature(temperature, dewpoint)
  return variant === 'bolton-43' ? bolton43(temperature, lcl, pressure, w) : bolton39(temperature, lcl, pressure, e, w, air.kappa)
}

/**
 * The shortcut that many books print, another quantity than θe itself: with w and T of the parcel, not of its condensation level.
 *
 *   θ exp[L w / (cp T)]
 *
 * Source: common practice; 0.1 to 16 K below θe.
 *
 * @example equivalentShortcut(293.15, 291.15, 85000, moistAir(constants, formulae)) // 349.35 K
 */
export function equivalentShortcut(temperature: number, dewpoint: number, pressure: number, air: MoistAir): number {
  const w = mixingRatioFrom(air.es(dewpoint), pressure, air.epsilon)
  return temperature * pow(100_000 / pressure, air.kappa) * exp(air.L(temperature) * w / (air.cp * temperature))
}

/**
 * Wet-bulb potential temperature from θe, a rational fit.
 *
 *   θw = θe − exp[(7.101574 − 20.68208 X + 16.11182 X² + 2.574631 X³ − 5.205688 X⁴)/(1 − 3.552497 X + 3.781782 X² − 0.6899655 X³ − 0.5929340 X⁴)]
 *   X = θe/273.15 K
 *
 * Source: Davies-Jones (2008), Mon. Wea. Rev. 136, 2764–2785, Eq. 3.8. Valid: θe 257–377 K, within 0.02 K of its pseudoadiabats.
 *
 * @example daviesJonesWetBulbPotential(353.94) // 297.41 K
 */
export function daviesJonesWetBulbPotential(equivalentPotential: number): number {
  const x = equivalentPotential / 273.15
  const above = 7.101574 + x * (-20.68208 + x * (16.11182 + x * (2.574631 - x * 5.205688)))
  const below = 1 + x * (-3.552497 + x * (3.781782 + x * (-0.6899655 - x * 0.5929340)))
  return equivalentPotential - exp(above / below)
}
