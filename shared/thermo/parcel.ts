/** Where a parcel comes from: the ground, the mean of the air near it, the level that has most energy, or as stated. */
import { log, pow } from '../numerics/elementary'
import { equivalentPotentialTemperature } from './equivalentPotential'
import { OutOfRangeError } from './errors'
import { mixingRatioFrom, vaporPressureFrom } from './humidity'
import type { MoistAir } from './moistAir'
import type { Sounding } from './sounding'

export interface Parcel { pressure: number, temperature: number, dewpoint: number, mixingRatio: number }

const p0 = 100_000

/**
 * The dewpoint at a vapor pressure, by Newton's steps with the slope of Clausius and Clapeyron.
 *
 *   T ← T + Rv T²/L · ln(e/eₛ(T))
 *
 * Source: the convention's eₛ solved for T. Valid: 150–370 K.
 *
 * @example dewpointAt(2336.95, air) // 293.15 K
 * @throws {OutOfRangeError} where no dewpoint is found
 */
export function dewpointAt(vaporPressure: number, air: MoistAir): number {
  if (!(vaporPressure > 0)) throw new OutOfRangeError('vaporPressure', vaporPressure, 'positive pressures')
  // first by Bolton's eₛ
  const ratio = log(vaporPressure / 611.2)
  let T = 273.15 + 243.5 * ratio / (17.67 - ratio)
  for (let n = 0; n < 60; n++) {
    const change = air.Rv * T * T / air.L(T) * log(vaporPressure / air.es(T))
    T += change
    if (!(T > 100 && T < 400)) break
    if (Math.abs(change) < 1e-11) return T
  }
  throw new OutOfRangeError('vaporPressure', vaporPressure, 'vapor pressures that have a dewpoint')
}

/** A parcel of a level. */
export function levelParcel(sounding: Sounding, at: number): Parcel {
  return { pressure: sounding.pressure[at] ?? 0, temperature: sounding.temperature[at] ?? 0, dewpoint: sounding.dewpoint[at] ?? 0, mixingRatio: sounding.mixingRatio[at] ?? 0 }
}

/** The parcel of the lowest row at or above the ground. */
export const surfaceParcel = (sounding: Sounding): Parcel => levelParcel(sounding, 0)

/**
 * A parcel with a potential temperature and a mixing ratio, started at a pressure.
 *
 *   T = θ (p/p₀)^κ,  e = w p/(ε + w),  T_d from eₛ(T_d) = e
 *
 * @example statedParcel(299.46, 0.01385, 95900, air) // T 295.9 K, T_d 291.3 K
 */
export function statedParcel(theta: number, mixingRatio: number, pressure: number, air: MoistAir): Parcel {
  return { pressure, temperature: theta * pow(pressure / p0, air.kappa), dewpoint: dewpointAt(vaporPressureFrom(mixingRatio, pressure, air.epsilon), air), mixingRatio }
}

export interface LayerMean { theta: number, mixingRatio: number, top: number }

/**
 * Means of θ and w over the lowest layer of a sounding, weighted by pressure.
 *
 *   θ̄ = ∫θ dp / ∫dp,  w̄ = ∫w dp / ∫dp     trapezoids between rows; at the layer's top θ and w linear in ln p
 *
 * Source: AMS Glossary of Meteorology, "mixed-layer CAPE" in use; weights and depth are stated in the ask. Null where the data end below the layer's top.
 *
 * @example mixedLayerMean(sounding, 10000, air)
 */
export function mixedLayerMean(sounding: Sounding, depth: number, air: MoistAir): LayerMean | null {
  const { count, pressure, logPressure, temperature, mixingRatio } = sounding
  const bottom = pressure[0] ?? 0, top = bottom - depth
  if (!(top > 0 && (pressure[count - 1] ?? 0) <= top)) return null
  let theta = (temperature[0] ?? 0) * pow(p0 / bottom, air.kappa), w = mixingRatio[0] ?? 0, p = bottom
  let thetaSum = 0, wSum = 0
  for (let at = 1; at < count && p > top; at++) {
    let nextP = pressure[at] ?? 0, nextTheta = (temperature[at] ?? 0) * pow(p0 / nextP, air.kappa), nextW = mixingRatio[at] ?? 0
    if (nextP < top) {
      const part = (log(top) - (logPressure[at - 1] ?? 0)) / ((logPressure[at] ?? 0) - (logPressure[at - 1] ?? 0))
      nextTheta = theta + part * (nextTheta - theta)
      nextW = w + part * (nextW - w)
      nextP = top
    }
    thetaSum += 0.5 * (theta + nextTheta) * (p - nextP)
    wSum += 0.5 * (w + nextW) * (p - nextP)
    theta = nextTheta
    w = nextW
    p = nextP
  }
  return { theta: thetaSum / depth, mixingRatio: wSum / depth, top }
}

/** The parcel of the mean layer, started at the pressure of the ground; null where the data end below the layer's top. */
export function mixedLayerParcel(sounding: Sounding, depth: number, air: MoistAir): Parcel | null {
  const mean = mixedLayerMean(sounding, depth, air)
  return mean && statedParcel(mean.theta, mean.mixingRatio, sounding.pressure[0] ?? 0, air)
}

/** The depth in which the most unstable level is looked for, Pa. */
export const unstableDepth = 30_000

/**
 * The parcel of the row with the largest θe within 300 hPa above the ground; the lower one of two alike.
 *
 * Source: common practice (largest θe in the lowest 300 hPa).
 */
export function mostUnstableParcel(sounding: Sounding, air: MoistAir, variant?: string): Parcel {
  const top = (sounding.pressure[0] ?? 0) - unstableDepth
  let best = 0, most = -Infinity
  for (let at = 0; at < sounding.count && (sounding.pressure[at] ?? 0) >= top; at++) {
    const theta = equivalentPotentialTemperature(sounding.temperature[at] ?? 0, sounding.dewpoint[at] ?? 0, sounding.pressure[at] ?? 0, air, variant)
    if (theta > most) {
      most = theta
      best = at
    }
  }
  return levelParcel(sounding, best)
}

/** Mixing ratio of saturated air, kg kg⁻¹. */
export const saturationMixingRatio = (temperature: number, pressure: number, air: MoistAir): number => mixingRatioFrom(air.es(temperature), pressure, air.epsilon)
