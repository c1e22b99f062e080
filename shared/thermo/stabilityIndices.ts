/** Indices of three levels: 850, 700 and 500 hPa. Temperatures in °C where the printed formula takes them. */
import type { Constants, Formulae, Inputs } from './definition'
import { parcelTemperatureAt } from './parcelAscent'
import { parcelContext } from './parcelContext'
import { atPressure } from './sounding'

export interface Levels { t850: number, d850: number, t700: number, d700: number, t500: number }

/** Temperatures and dewpoints in K at the three levels, linear in ln p between rows; null where the ground is above 850 hPa or the data end below 500 hPa. */
export function threeLevels(inputs: Inputs, constants: Constants, formulae: Formulae): Levels | null {
  const { sounding } = parcelContext(inputs, constants, formulae)
  const { temperature, dewpoint } = sounding
  const t850 = atPressure(sounding, temperature, 85_000), d850 = atPressure(sounding, dewpoint, 85_000), t700 = atPressure(sounding, temperature, 70_000)
  const d700 = atPressure(sounding, dewpoint, 70_000), t500 = atPressure(sounding, temperature, 50_000)
  return t850 === null || d850 === null || t700 === null || d700 === null || t500 === null ? null : { t850, d850, t700, d700, t500 }
}

/**
 * K index, K (as a Celsius temperature when 273.15 is taken off).
 *
 *   K = T₈₅₀ − T₅₀₀ + T_d,850 − (T₇₀₀ − T_d,700)
 *
 * Source: George (1960), Weather Forecasting for Aeronautics; AMS Glossary of Meteorology, "K index".
 *
 * @example kIndex({ t850: 290.15, d850: 287.15, t700: 281.15, d700: 275.15, t500: 262.15 }) - 273.15 // 36
 */
export const kIndex = ({ t850, d850, t700, d700, t500 }: Levels): number => t850 - t500 + d850 - (t700 - d700)

/**
 * Total totals, K.
 *
 *   TT = T₈₅₀ + T_d,850 − 2 T₅₀₀
 *
 * Source: Miller (1972), AWS Tech. Rep. 200; AMS Glossary of Meteorology, "total totals index".
 *
 * @example totalTotals({ t850: 290.15, d850: 287.15, t700: 281.15, d700: 275.15, t500: 262.15 }) // 53
 */
export const totalTotals = ({ t850, d850, t500 }: Levels): number => t850 + d850 - 2 * t500

/**
 * Showalter index, K: the surroundings less a parcel of 850 hPa, at 500 hPa.
 *
 *   SI = T₅₀₀ − T_p(850 → 500 hPa)
 *
 * Source: Showalter (1953), Bull. Amer. Meteor. Soc. 34, 250–252; AMS Glossary of Meteorology, "Showalter index". Without virtual correction.
 */
export function showalter(levels: Levels, inputs: Inputs, constants: Constants, formulae: Formulae): { parcel: number, index: number } {
  const context = parcelContext(inputs, constants, formulae), { air } = context
  const e = air.es(levels.d850)
  const start = { pressure: 85_000, temperature: levels.t850, dewpoint: levels.d850, mixingRatio: air.epsilon * e / (85_000 - e) }
  const parcel = parcelTemperatureAt(start, context.lcl(start), 50_000, false, air)
  return { parcel, index: levels.t500 - parcel }
}
