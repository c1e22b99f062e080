/** Stability of a layer against both adiabats, and of a layer that is lifted as a whole. */
import { constant, dryRateOf } from './constants'
import type { Constants, Formulae, Inputs } from './definition'
import { equivalentPotentialTemperature } from './equivalentPotential'
import { numberOf } from './inputs'
import { moistAir } from './moistAir'
import { equivalentKey } from './parcelContext'
import { saturatedRate } from './saturatedRate'

export type LayerStability = 'absolutely-stable' | 'saturated-neutral' | 'conditionally-unstable' | 'dry-neutral' | 'absolutely-unstable'

/**
 * Stability of a layer by its lapse rate against the saturated rate Γm at its mean pressure and temperature and the dry rate Γd.
 *
 *   unsaturated:  Γ < Γm − δ absolutely stable · |Γ − Γm| ≤ δ saturated-neutral · Γm + δ < Γ < Γd − δ conditionally unstable ·
 *                 |Γ − Γd| ≤ δ dry-neutral · Γ > Γd + δ absolutely unstable, which is superadiabatic
 *   saturated:    against Γm alone: absolutely stable, saturated-neutral, or (absolutely) unstable above it
 *
 * Source: AMS Glossary of Meteorology, "absolute instability", "conditional instability", "saturated-adiabatic lapse rate". δ is printed in the ask.
 *
 * @example layerStability({ lapseRate: 0.005, saturated: 0.00384, isSaturated: false }, constants) // 'conditionally-unstable'
 */
export function layerStability(layer: { lapseRate: number, saturated: number, isSaturated: boolean }, constants: Constants): LayerStability {
  const tolerance = constant(constants, 'neutralTolerance'), { lapseRate, saturated } = layer
  if (lapseRate < saturated - tolerance) return 'absolutely-stable'
  if (lapseRate <= saturated + tolerance) return 'saturated-neutral'
  if (layer.isSaturated) return 'absolutely-unstable'
  const dry = dryRateOf(constants)
  if (lapseRate > dry + tolerance) return 'absolutely-unstable'
  return lapseRate < dry - tolerance ? 'conditionally-unstable' : 'dry-neutral'
}

/** Γm at the layer's mean temperature and pressure, K/m. */
export const layerSaturatedRate = (inputs: Inputs, constants: Constants, formulae: Formulae): number => saturatedRate(numberOf(inputs, 'meanTemperature'), numberOf(inputs, 'meanPressure'), moistAir(constants, formulae))

export interface EquivalentAtEnds { bottom: number, top: number, depth: number }

/** θe at the bottom and the top of a layer, K. */
export function equivalentAtEnds(inputs: Inputs, constants: Constants, formulae: Formulae): EquivalentAtEnds {
  const air = moistAir(constants, formulae), variant = formulae.variants[equivalentKey]
  const at = (end: 'Bottom' | 'Top') => equivalentPotentialTemperature(numberOf(inputs, `temperature${end}`), numberOf(inputs, `dewpoint${end}`), numberOf(inputs, `pressure${end}`), air, variant)
  return { bottom: at('Bottom'), top: at('Top'), depth: numberOf(inputs, 'depth') }
}

/**
 * Gradient of the equivalent potential temperature of a layer.
 *
 *   ∂θe/∂z = (θe₂ − θe₁)/Δz     below 0 where the layer is potentially (convectively) unstable: lifted as a whole until saturated, it overturns
 *
 * Source: AMS Glossary of Meteorology, "potential instability". Another notion than conditional instability.
 *
 * @example equivalentGradient({ bottom: 350, top: 340, depth: 1000 }) // −0.01 K m⁻¹
 */
export const equivalentGradient = ({ bottom, top, depth }: EquivalentAtEnds): number => (top - bottom) / depth
