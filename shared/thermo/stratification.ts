/** How strongly a layer holds air in its place. */
import { constant, dryRateOf } from './constants'
import type { Constants, InputDefinition } from './definition'
import type { Kelvin, KelvinPerMeter, Meter } from '../units/brands'

const theta = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 'K', shownUnit: 'K', kind: 'temperature', shape: 'number', range: [150, 800] })

export const thetaLayerInputs: readonly InputDefinition[] = [
  theta('potentialTemperatureBottom', 'potential temperature at the bottom (virtual, where the air is moist)', 'θ₁'),
  theta('potentialTemperatureTop', 'potential temperature at the top (virtual, where the air is moist)', 'θ₂'),
  { name: 'depth', label: 'depth of the layer', symbol: 'Δz', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [0.1, 50_000], trivialWithin: 0 },
]

/** Of moist air: what stands in the place of T and of Γ where the gradient of the vapor is to count. */
export const virtualTemperatureInput = (label: string): InputDefinition => ({ name: 'virtualTemperature', label, symbol: 'T_v', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [150, 400] })
export const virtualRateInput: InputDefinition = { name: 'virtualLapseRate', label: 'lapse rate of the virtual temperature', symbol: 'Γ_v', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [-1, 1] }

/**
 * Brunt–Väisälä frequency squared of a layer, with its sign.
 *
 *   N² = (g/θ̄)(θ₂ − θ₁)/Δz,   θ̄ = (θ₁ + θ₂)/2     negative where θ falls with height: no root is taken
 *
 * Source: AMS Glossary of Meteorology, "Brunt–Väisälä frequency". SI. Limits: θ̄ stands for θ of the layer, right to the square of Δθ/θ.
 *
 * @example bruntVaisalaSquared(kelvin(300), kelvin(303), meter(1000), { g: 9.81 }) // 9.761e-5 s⁻²
 */
export function bruntVaisalaSquared(bottom: Kelvin, top: Kelvin, depth: Meter, constants: Constants): number {
  return constant(constants, 'g') / ((bottom + top) / 2) * (top - bottom) / depth
}

/**
 * The same from a lapse rate.
 *
 *   N² = (g/T)(Γd − Γ)
 *
 * Source: AMS Glossary of Meteorology, "Brunt–Väisälä frequency", with dθ/dz = (θ/T)(Γd − Γ). SI. Dry air.
 *
 * @example bruntVaisalaSquaredFromLapseRate(kelvin(288.15), kelvinPerMeter(0.0065), { g: 9.81, cp: 1004 }) // 1.1136e-4 s⁻²
 */
export function bruntVaisalaSquaredFromLapseRate(temperature: Kelvin, lapseRate: KelvinPerMeter, constants: Constants): number {
  return constant(constants, 'g') / temperature * (dryRateOf(constants) - lapseRate)
}

/**
 * Gradient of potential temperature from a lapse rate.
 *
 *   dθ/dz = (θ/T)(Γd − Γ)
 *
 * Source: θ = T(p₀/p)^κ differentiated with the hydrostatic equation (closed form). SI. Dry air.
 *
 * @example potentialTemperatureGradient(kelvin(290), kelvin(293), kelvinPerMeter(0.0065), { g: 9.81, cp: 1004 }) // 0.003305 K m⁻¹
 */
export function potentialTemperatureGradient(temperature: Kelvin, theta: Kelvin, lapseRate: KelvinPerMeter, constants: Constants): number {
  return theta / temperature * (dryRateOf(constants) - lapseRate)
}
