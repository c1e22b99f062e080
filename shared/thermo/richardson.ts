/** Shear against stratification. */
import { cos, sin } from '../numerics/angles'
import { constant } from './constants'
import type { Constants, InputDefinition, Inputs } from './definition'
import { numberOf } from './inputs'

/** Air that moves with less than this from level to level has no shear, m/s. */
const noShear = 1e-9

/**
 * Bulk Richardson number of a layer.
 *
 *   Ri_B = (g/θ̄v) Δθv Δz / (Δu² + Δv²),   θ̄v the mean of bottom and top; Δu, Δv differences of the wind's components
 *
 * Source: AMS Glossary of Meteorology, "bulk Richardson number". SI. Null where the wind vector is the same at both heights.
 *
 * @example bulkRichardson({ bottom: 298, top: 299.2, depth: 100, du: 4, dv: 1 }, { g: 9.81 }) // 0.2319
 */
export function bulkRichardson(layer: { bottom: number, top: number, depth: number, du: number, dv: number }, constants: Constants): number | null {
  const shear = layer.du * layer.du + layer.dv * layer.dv
  if (!(shear > noShear * noShear)) return null
  return constant(constants, 'g') / ((layer.bottom + layer.top) / 2) * (layer.top - layer.bottom) * layer.depth / shear
}

/**
 * Gradient Richardson number at a height.
 *
 *   Ri = (g/θv) (dθv/dz) / [(du/dz)² + (dv/dz)²]
 *
 * Source: AMS Glossary of Meteorology, "gradient Richardson number". SI. Null without shear.
 *
 * @example gradientRichardson({ theta: 300, gradient: 0.005, du: 0.02, dv: 0.01 }, { g: 9.81 }) // 0.327
 */
export function gradientRichardson(at: { theta: number, gradient: number, du: number, dv: number }, constants: Constants): number | null {
  const shear = at.du * at.du + at.dv * at.dv
  if (!(shear > 1e-18)) return null
  return constant(constants, 'g') / at.theta * at.gradient / shear
}

/**
 * Eastward and northward components of a wind that comes from a direction.
 *
 *   u = −s sin d,  v = −s cos d
 *
 * Source: AMS Glossary of Meteorology, "wind direction". Speed in any unit, direction in radians clockwise from north.
 *
 * @example windComponents(10, 270°) // u 10, v 0
 */
export const windComponents = (speed: number, direction: number): { u: number, v: number } => ({ u: -speed * sin(direction), v: -speed * cos(direction) })

export const speedInput = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 'm/s', shownUnit: 'm/s', kind: 'difference', shape: 'number', range: [0, 200] })
export const directionInput = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 'rad', shownUnit: 'deg', kind: 'difference', shape: 'number', range: [0, 6.283185307179587] })

const theta = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 'K', shownUnit: 'K', kind: 'temperature', shape: 'number', range: [150, 800] })
export const virtualThetaLayer: readonly InputDefinition[] = [
  theta('virtualPotentialTemperatureBottom', 'virtual potential temperature at the bottom', 'θv₁'),
  theta('virtualPotentialTemperatureTop', 'virtual potential temperature at the top', 'θv₂'),
  { name: 'depth', label: 'depth of the layer', symbol: 'Δz', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [0.1, 50_000], trivialWithin: 0 },
]

/** Components of the wind at the top less those at the bottom, from windSpeedBottom, windDirectionBottom, windSpeedTop, windDirectionTop. */
export function windDifference(inputs: Inputs): { du: number, dv: number } {
  const low = windComponents(numberOf(inputs, 'windSpeedBottom'), numberOf(inputs, 'windDirectionBottom'))
  const high = windComponents(numberOf(inputs, 'windSpeedTop'), numberOf(inputs, 'windDirectionTop'))
  return { du: high.u - low.u, dv: high.v - low.v }
}
