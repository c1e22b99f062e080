/** A sensor that follows the air with one time constant. */
import { exp, log } from '../numerics/elementary'
import type { InputDefinition } from './definition'

export const timeConstantInput: InputDefinition = { name: 'timeConstant', label: 'time constant of the sensor', symbol: 'τ', unit: 's', shownUnit: 's', kind: 'ratio', shape: 'number', range: [0, 3600], trivialWithin: 0 }
export const verticalSpeedInput: InputDefinition = { name: 'verticalSpeed', label: 'vertical speed, positive on ascent', symbol: 'w', unit: 'm/s', shownUnit: 'm/s', kind: 'difference', shape: 'number', range: [-50, 50] }

/**
 * What a first-order sensor shows after a step.
 *
 *   T_i(t) = T_a + (T_0 − T_a) e^(−t/τ)
 *
 * Source: WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 1, "time constant"; dT_i/dt = (T_a − T_i)/τ solved. SI.
 *
 * @example stepResponse({ start: 295.15, air: 288.15, elapsed: 30, timeConstant: 20 }) // 289.712 K
 */
export const stepResponse = (step: { start: number, air: number, elapsed: number, timeConstant: number }): number => step.air + (step.start - step.air) * exp(-step.elapsed / step.timeConstant)

/**
 * Time constant from two readings after a step.
 *
 *   τ = t / ln[(T_0 − T_a)/(T_i − T_a)]     null where the sensor has not come closer to the air, or has passed it
 *
 * Source: as `stepResponse`.
 *
 * @example timeConstantOfStep({ start: 295.15, air: 288.15, elapsed: 30, indicated: 289.712 }) // 20 s
 */
export function timeConstantOfStep(step: { start: number, air: number, elapsed: number, indicated: number }): number | null {
  const ratio = step.indicated === step.air ? 0 : (step.start - step.air) / (step.indicated - step.air)
  return ratio > 1 ? step.elapsed / log(ratio) : null
}

/**
 * Error of a sensor that moves steadily through a layer of one lapse rate, once its start is forgotten (after some 5 τ).
 *
 *   T_i − T = τ w Γ     w positive on ascent, Γ = −dT/dz: too warm on ascent where T falls with height, too cold on descent
 *
 * Source: dT_i/dt = (T − T_i)/τ with T = T_0 − Γ w t solved for t ≫ τ (closed form). SI.
 *
 * @example steadyLagError({ timeConstant: 10, verticalSpeed: 5, lapseRate: 0.0065 }) // +0.325 K
 */
export const steadyLagError = (ascent: { timeConstant: number, verticalSpeed: number, lapseRate: number }): number => ascent.timeConstant * ascent.verticalSpeed * ascent.lapseRate

/**
 * Temperature of the air from what a first-order sensor shows.
 *
 *   T = T_i + τ dT_i/dt     on both legs
 *
 * Source: dT_i/dt = (T − T_i)/τ (WMO-No. 8, vol. I, ch. 1). SI.
 *
 * @example lagCorrected({ indicated: 285.55, rate: -0.03, timeConstant: 12 }) // 285.19 K
 */
export const lagCorrected = (reading: { indicated: number, rate: number, timeConstant: number }): number => reading.indicated + reading.timeConstant * reading.rate
