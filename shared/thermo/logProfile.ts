/** The neutral logarithmic wind profile over even ground. Heights are above the displacement height; a roof is no fetch. */
import { exp, log } from '../numerics/elementary'
import { constant } from './constants'
import type { Constants, InputDefinition, Inputs } from './definition'
import { OutOfRangeError } from './errors'
import { numberOf } from './inputs'

const heightInput = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 'm', shownUnit: 'm', kind: 'ratio', shape: 'number', range: [0.01, 1000] })
const windInput = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 'm/s', shownUnit: 'm/s', kind: 'ratio', shape: 'number', range: [0.01, 200] })

export const displacementInput: InputDefinition = { name: 'displacementHeight', label: 'displacement height', symbol: 'd', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [0, 100], isOptional: true }
export const measurementHeightInput = heightInput('measurementHeight', 'height above the ground', 'z')
export const roughnessInput: InputDefinition = { name: 'roughnessLength', label: 'roughness length', symbol: 'z_0', unit: 'm', shownUnit: 'm', kind: 'ratio', shape: 'number', range: [1e-6, 10], trivialWithin: 0 }
export const frictionVelocityInput: InputDefinition = { name: 'frictionVelocity', label: 'friction velocity', symbol: 'u_*', unit: 'm/s', shownUnit: 'm/s', kind: 'ratio', shape: 'number', range: [0, 10], trivialWithin: 0 }
export const twoHeightInputs: readonly InputDefinition[] = [
  heightInput('lowHeight', 'lower height above the ground', 'z_1'), windInput('lowSpeed', 'wind speed at the lower height', 'u_1'),
  heightInput('highHeight', 'upper height above the ground', 'z_2'), windInput('highSpeed', 'wind speed at the upper height', 'u_2'),
  displacementInput,
]

/** The displacement height; 0 where none is given. */
export const displacementOf = (inputs: Inputs): number => ('displacementHeight' in inputs ? numberOf(inputs, 'displacementHeight') : 0)

export interface TwoHeights { low: number, high: number, lowSpeed: number, highSpeed: number }

/** Two heights above the displacement, the upper one higher. @throws {OutOfRangeError} */
export function twoHeightsOf(inputs: Inputs): TwoHeights {
  const d = displacementOf(inputs), low = numberOf(inputs, 'lowHeight') - d, high = numberOf(inputs, 'highHeight') - d
  if (!(low > 0)) throw new OutOfRangeError('lowHeight', numberOf(inputs, 'lowHeight'), `heights above the displacement height of ${d} m`)
  if (!(high > low)) throw new OutOfRangeError('highHeight', numberOf(inputs, 'highHeight'), 'heights above the lower one')
  return { low, high, lowSpeed: numberOf(inputs, 'lowSpeed'), highSpeed: numberOf(inputs, 'highSpeed') }
}

/**
 * Wind speed of the neutral logarithmic profile.
 *
 *   u(z) = (u_* / k) ln(z / z₀)     z above the displacement height
 *
 * Source: AMS Glossary of Meteorology, "logarithmic velocity profile". SI. Valid in neutral air, z ≫ z₀, in the lowest tenth of the boundary layer.
 *
 * @example logWind(0.35, 10, 0.03, { vonKarman: 0.4 }) // 5.083 m/s
 */
export const logWind = (frictionVelocity: number, height: number, roughness: number, constants: Constants): number => frictionVelocity / constant(constants, 'vonKarman') * log(height / roughness)

/**
 * Friction velocity from two heights.
 *
 *   u_* = k (u₂ − u₁) / ln(z₂ / z₁)
 *
 * Source: the logarithmic profile at two heights. SI.
 *
 * @example frictionVelocity({ low: 2, high: 10, lowSpeed: 3.2, highSpeed: 4.6 }, { vonKarman: 0.4 }) // 0.3479 m/s
 */
export const frictionVelocity = ({ low, high, lowSpeed, highSpeed }: TwoHeights, constants: Constants): number => constant(constants, 'vonKarman') * (highSpeed - lowSpeed) / log(high / low)

/**
 * Roughness length from two heights; null where the wind does not grow with height.
 *
 *   z₀ = exp[(u₂ ln z₁ − u₁ ln z₂) / (u₂ − u₁)]
 *
 * Source: the logarithmic profile at two heights. SI.
 *
 * @example roughnessLength({ low: 2, high: 10, lowSpeed: 3.2, highSpeed: 4.6 }) // 0.0505 m
 */
export function roughnessLength({ low, high, lowSpeed, highSpeed }: TwoHeights): number | null {
  return highSpeed > lowSpeed ? exp((highSpeed * log(low) - lowSpeed * log(high)) / (highSpeed - lowSpeed)) : null
}
