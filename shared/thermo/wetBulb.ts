/** Wet-bulb temperatures, and what a wet bulb tells of the humidity: plain numbers, SI. */
import { pow } from '../numerics/elementary'
import { findRoot } from '../numerics/rootFinding'
import { arctangent } from './arctangent'
import { mixingRatioFrom } from './humidity'
import type { LiftingCondensationLevel } from './liftingCondensation'
import type { MoistAir } from './moistAir'
import { pseudoadiabaticTemperature } from './pseudoadiabat'

/**
 * Mixing ratio of air whose (thermodynamic) wet bulb is known: the heat of the air pays for the water that evaporates into it.
 *
 *   (cp + w cpv)(T − T_w) = L(T_w) [wₛ(T_w) − w]
 *
 * Source: AMS Glossary of Meteorology, "wet-bulb temperature"; ASHRAE Handbook – Fundamentals (2017), ch. 1, Eq. 33.
 * Valid: liquid water on the bulb; without `vaporHeat` the heat capacity of the vapor is left out.
 *
 * @example mixingRatioFromWetBulb(303.15, 298.15, 95461, moistAir(constants, formulae)) // 0.0192 kg kg⁻¹
 */
export function mixingRatioFromWetBulb(temperature: number, wetBulb: number, pressure: number, air: MoistAir, vaporHeat = true): number {
  const ws = mixingRatioFrom(air.es(wetBulb), pressure, air.epsilon), L = air.L(wetBulb), depression = temperature - wetBulb
  return (L * ws - air.cp * depression) / (L + (vaporHeat ? air.cpv * depression : 0))
}

/**
 * Isobaric wet-bulb temperature: what the equation above gives for T_w, by a bracket.
 *
 * @example isobaricWetBulb(303.15, 0.0192, 95461, moistAir(constants, formulae)) // 298.1 K
 */
export function isobaricWetBulb(temperature: number, mixingRatio: number, pressure: number, air: MoistAir, vaporHeat = true): number {
  const at = (wetBulb: number) => mixingRatioFromWetBulb(temperature, wetBulb, pressure, air, vaporHeat) - mixingRatio
  if (at(temperature) <= 0) return temperature
  return findRoot(at, Math.max(temperature - 80, 150), temperature)
}

/**
 * Pseudoadiabatic wet-bulb temperature (Normand's rule): up the dry adiabat to the condensation level, and down the pseudoadiabat to the start.
 *
 * Source: AMS Glossary of Meteorology, "wet-bulb temperature" (adiabatic). Up to 0.3 K below the isobaric one.
 *
 * @example pseudoadiabaticWetBulb(95461, lcl, air) // K
 */
export function pseudoadiabaticWetBulb(pressure: number, lcl: LiftingCondensationLevel, air: MoistAir): number {
  return pseudoadiabaticTemperature(lcl.temperature, lcl.pressure, pressure, air)
}

/**
 * A fit to the wet bulb at 1013.25 hPa from temperature and relative humidity.
 *
 *   T_w = t atan[0.151977 (RH + 8.313659)^½] + atan(t + RH) − atan(RH − 1.676331) + 0.00391838 RH^1.5 atan(0.023101 RH) − 4.686035     °C, RH in %
 *
 * Source: Stull (2011), J. Appl. Meteor. Climatol. 50, 2267–2269, Eq. 1. Valid: 1013.25 hPa, RH 5–99 %, −20 to 50 °C. Error: −1.0 to +0.65 K by the paper,
 * which leaves out air both cold and dry; −1.2 to +1.3 K above 0 °C as measured against another program.
 *
 * @example stullWetBulb(293.15, 0.5) // 286.85 K
 */
export function stullWetBulb(temperature: number, relativeHumidity: number): number {
  const t = temperature - 273.15, RH = 100 * relativeHumidity
  return 273.15 + t * arctangent(0.151977 * pow(RH + 8.313659, 0.5)) + arctangent(t + RH) - arctangent(RH - 1.676331) + 0.00391838 * pow(RH, 1.5) * arctangent(0.023101 * RH) - 4.686035
}

export interface PsychrometerCoefficient { key: string, label: string, source: { text: string, status: 'verified' | 'common practice' | 'from memory' }, of: (wetBulb: number) => number, tex: string }

/** A of a ventilated psychrometer whose bulb is wet, K⁻¹. */
export const ventilatedCoefficients: readonly PsychrometerCoefficient[] = [
  { key: 'wmo', label: 'WMO-No. 8, 6.53·10⁻⁴ (1 + 0.000944 t_w)', source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B, Assmann type', status: 'from memory' }, of: wetBulb => 6.53e-4 * (1 + 0.000944 * (wetBulb - 273.15)), tex: '6.53\\times 10^{-4}\\,(1 + 0.000944\\,t_w)' },
  { key: 'ferrel', label: 'Ferrel, 6.60·10⁻⁴ (1 + 0.00115 t_w)', source: { text: 'AMS Glossary of Meteorology, "psychrometric formula"; Ferrel (1886)', status: 'verified' }, of: wetBulb => 6.60e-4 * (1 + 0.00115 * (wetBulb - 273.15)), tex: '6.60\\times 10^{-4}\\,(1 + 0.00115\\,t_w)' },
  { key: 'assmann', label: 'Assmann, 6.62·10⁻⁴', source: { text: 'common practice: the constant of the aspirated psychrometer', status: 'common practice' }, of: () => 6.62e-4, tex: '6.62\\times 10^{-4}' },
]
/** A of a naturally ventilated bulb in a screen, at about 1 m s⁻¹. */
export const screenCoefficients: readonly PsychrometerCoefficient[] = [
  { key: 'screen', label: 'screen, 7.99·10⁻⁴', source: { text: 'common practice: psychrometer tables for screens with natural ventilation of about 1 m s⁻¹', status: 'common practice' }, of: () => 7.99e-4, tex: '7.99\\times 10^{-4}' },
]
/** A of a ventilated psychrometer whose bulb bears ice. */
export const iceCoefficients: readonly PsychrometerCoefficient[] = [
  { key: 'wmo', label: 'WMO-No. 8, 5.75·10⁻⁴', source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B, Assmann type, ice', status: 'from memory' }, of: () => 5.75e-4, tex: '5.75\\times 10^{-4}' },
  { key: 'assmann', label: 'Assmann, 5.84·10⁻⁴', source: { text: 'common practice: the constant of the aspirated psychrometer with ice', status: 'common practice' }, of: () => 5.84e-4, tex: '5.84\\times 10^{-4}' },
]
