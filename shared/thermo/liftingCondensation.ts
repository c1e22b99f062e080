/** Where a parcel that is lifted becomes saturated, by the forms that are in use: plain numbers, SI. */
import { exp, log, pow } from '../numerics/elementary'
import { findRoot } from '../numerics/rootFinding'
import type { Constants, Formulae } from './definition'
import { mixingRatioFrom } from './humidity'
import { moistAir, type MoistAir } from './moistAir'

export interface LiftingCondensationLevel { temperature: number, pressure: number, heightAboveStart: number }

/**
 * Temperature at the lifting condensation level.
 *
 *   T_L = 1 / [1/(T_d − 56) + ln(T/T_d)/800] + 56     K
 *
 * Source: Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 15. Valid: −35 to 35 °C, within 0.1 K.
 *
 * @example boltonLclTemperature(293.15, 285.15) // 283.35 K
 */
export const boltonLclTemperature = (temperature: number, dewpoint: number): number => 1 / (1 / (dewpoint - 56) + log(temperature / dewpoint) / 800) + 56

/** The constants of Romps' formula as its author sets them: the formula stands with them. */
const romps = { Ra: 287.04, Rv: 461, cva: 719, cvv: 1418, cvl: 4119, g: 9.81, triple: 273.16, E0v: 2.3740e6 }

/**
 * The lifting condensation level in closed form, with the heat capacity of the vapor.
 *
 *   T_L = c [W₋₁(RH^(1/a) c eᶜ)]⁻¹ T,   p_L = p (T_L/T)^(cpm/Rm),   z_L = (cpm/g)(T − T_L)
 *   a = cpm/Rm + (cvl − cpv)/Rv,   b = −(E₀ − (cvv − cvl) T₀)/(Rv T),   c = b/a
 *
 * Source: Romps (2017), J. Atmos. Sci. 74, 3891–3900, Eq. 22, with its constants. Valid: RH ≤ 1, within 5 m of exact.
 *
 * @example rompsLcl(300, 0.5, 100000, 0.011).heightAboveStart // 1433.8 m
 */
export function rompsLcl(temperature: number, relativeHumidity: number, pressure: number, specificHumidity: number): LiftingCondensationLevel {
  const { Ra, Rv, cva, cvv, cvl, g, triple, E0v } = romps
  const Rm = (1 - specificHumidity) * Ra + specificHumidity * Rv
  const cpm = (1 - specificHumidity) * (cva + Ra) + specificHumidity * (cvv + Rv)
  const a = cpm / Rm + (cvl - (cvv + Rv)) / Rv
  const c = -(E0v - (cvv - cvl) * triple) / (Rv * temperature) / a
  // W₋₁(x) = −y with y − ln y = −ln(−x): Newton from y = −c, where RH is 1
  const target = -(log(relativeHumidity) / a + log(-c) + c)
  let y = -c
  for (let n = 0; n < 50; n++) {
    const change = (y - log(y) - target) / (1 - 1 / y)
    y -= change
    if (Math.abs(change) <= 1e-15 * y) break
  }
  const lcl = c / -y * temperature
  return { temperature: lcl, pressure: pressure * pow(lcl / temperature, cpm / Rm), heightAboveStart: cpm / g * (temperature - lcl) }
}

/** Romps' own saturation vapor pressure, for its self-test: p₀ (T/T₀)^((cpv − cvl)/Rv) exp[(E₀ − (cvv − cvl)T₀)/Rv (1/T₀ − 1/T)]. */
export function rompsSaturationPressure(temperature: number): number {
  const { Rv, cvv, cvl, triple, E0v } = romps
  return 611.65 * pow(temperature / triple, (cvv + Rv - cvl) / Rv) * exp((E0v - (cvv - cvl) * triple) / Rv * (1 / triple - 1 / temperature))
}

/**
 * The temperature at which the parcel's mixing ratio is that of saturation along its dry adiabat, found by a bracket.
 *
 *   wₛ(T_L, p (T_L/T)^(1/κ)) = w
 *
 * Source: common practice; AMS Glossary of Meteorology, "lifting condensation level".
 *
 * @example solvedLclTemperature(293.15, 285.15, 100000, moistAir(constants, formulae)) // 283.34 K
 */
export function solvedLclTemperature(temperature: number, dewpoint: number, pressure: number, air: MoistAir): number {
  if (dewpoint >= temperature) return temperature
  const w = mixingRatioFrom(air.es(dewpoint), pressure, air.epsilon)
  const excess = (T: number) => {
    const p = pressure * pow(T / temperature, 1 / air.kappa)
    const e = air.es(T)
    return e < p ? mixingRatioFrom(e, p, air.epsilon) - w : Infinity
  }
  return findRoot(excess, Math.max(dewpoint - 60, 150), temperature)
}

export const lclTemperatureKey = 'lifting-condensation-level-temperature'

/**
 * The lifting condensation level as the convention computes it: by Bolton where it names nothing. A dewpoint above the temperature is taken as
 * saturation at the start, which the quantities note.
 *
 * @example lclFunction(constants, formulae)(293.15, 285.15, 100000).heightAboveStart // 1003 m
 */
export function lclFunction(constants: Constants, formulae: Formulae, variant = formulae.variants[lclTemperatureKey]): (temperature: number, dewpoint: number, pressure: number) => LiftingCondensationLevel {
  const air = moistAir(constants, formulae)
  return (temperature, given, pressure) => {
    const dewpoint = Math.min(given, temperature)
    if (variant === 'romps') {
      const e = air.es(dewpoint), w = mixingRatioFrom(e, pressure, air.epsilon)
      return rompsLcl(temperature, e / air.es(temperature), pressure, w / (1 + w))
    }
    const lcl = variant === 'solved' ? solvedLclTemperature(temperature, dewpoint, pressure, air) : boltonLclTemperature(temperature, dewpoint)
    return { temperature: lcl, pressure: pressure * pow(lcl / temperature, 1 / air.kappa), heightAboveStart: air.cp / air.g * (temperature - lcl) }
  }
}
