/** How deep the air is mixed from the ground, by three published methods. Heights are above ground and rise. */
import { constant } from './constants'
import type { Constants, InputDefinition, Inputs } from './definition'
import { numberOf, seriesOf } from './inputs'

export const mixedLayerInputs: readonly InputDefinition[] = [
  { name: 'height', label: 'heights of the rows above the ground, rising', symbol: 'z', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'series', range: [0, 100_000], needs: { least: 3, order: 'ascending' } },
  { name: 'potentialTemperature', label: 'potential temperatures of the rows (virtual, where the text says so)', symbol: 'θ', unit: 'K', shownUnit: 'K', kind: 'temperature', shape: 'series', range: [150, 800], needs: { least: 3, order: 'none' } },
]

const heights = (inputs: Inputs): readonly number[] => seriesOf(inputs, 'height')
const thetas = (inputs: Inputs): readonly number[] => seriesOf(inputs, 'potentialTemperature')

/** Where a value that starts below a limit first exceeds it, linear between rows; null where it never does. */
function firstAbove(z: readonly number[], values: readonly number[], limit: number): number | null {
  for (let at = 1; at < z.length; at++) {
    const above = values[at] ?? 0
    if (!(above > limit)) continue
    const below = values[at - 1] ?? 0, low = z[at - 1] ?? 0
    return above === Infinity ? z[at] ?? 0 : low + Math.max(0, limit - below) / (above - below) * ((z[at] ?? 0) - low)
  }
  return null
}

/**
 * Mixed-layer depth by the parcel method.
 *
 *   θ(z) = θ(lowest row) + excess     the lowest such height, linear between rows
 *
 * Source: Holzworth (1964), Mon. Wea. Rev. 92, 235–242; Seidel et al. (2010), J. Geophys. Res. 115, D16113, section 2 (excess: common practice).
 * Null where θ stays below: not reached.
 *
 * @example z 2, 100, 500, 800, 1000 m; θ 300, 299.8, 299.8, 300.2, 303 K; excess 0.5 K: 821.4 m
 */
export const parcelMixedLayerDepth = (inputs: Inputs, excess = numberOf(inputs, 'excess')): number | null => firstAbove(heights(inputs), thetas(inputs), (thetas(inputs)[0] ?? 0) + excess)

/**
 * Bulk Richardson numbers between the lowest row and each row, with the wind at the ground taken as calm.
 *
 *   Ri(z) = (g/θ_s)(θ(z) − θ_s)(z − z_s) / V(z)²     Infinity in calm air that is warmer in θ than the lowest row
 *
 * Source: Seidel et al. (2012), J. Geophys. Res. 117, D17106, Eq. 1, without its friction term.
 */
export function bulkRichardsonProfile(inputs: Inputs, constants: Constants): number[] {
  const z = heights(inputs), theta = thetas(inputs), speed = seriesOf(inputs, 'windSpeed')
  const ground = theta[0] ?? 0, start = z[0] ?? 0
  return z.map((height, at) => {
    const buoyancy = constant(constants, 'g') / ground * ((theta[at] ?? 0) - ground) * (height - start), square = (speed[at] ?? 0) * (speed[at] ?? 0)
    return buoyancy === 0 ? 0 : square > 0 ? buoyancy / square : buoyancy > 0 ? Infinity : -1e12
  })
}

/**
 * Mixed-layer depth by the bulk Richardson number: the lowest height at which it exceeds the critical value, linear between rows.
 *
 * Source: Seidel et al. (2012), J. Geophys. Res. 117, D17106. Null where it never does: not reached.
 *
 * @example z 2, 100, 500, 800, 1000 m; θv 300, 299.8, 299.8, 300.2, 303 K; 2, 5, 6, 7, 8 m/s; 0.25: 820.2 m
 */
export const richardsonMixedLayerDepth = (inputs: Inputs, constants: Constants): number | null => firstAbove(heights(inputs), bulkRichardsonProfile(inputs, constants), numberOf(inputs, 'criticalRichardsonNumber'))

export interface SteepestStep { height: number, gradient: number }

/**
 * The greatest gradient of θ between neighboring rows, at their mean height; the lower one of two alike.
 *
 * Source: Seidel et al. (2010), J. Geophys. Res. 115, D16113, section 2 ("location of the maximum vertical gradient of potential temperature").
 *
 * @example z 2, 100, 500, 800, 1000 m; θ 300, 299.8, 299.8, 300.2, 303 K: 900 m, 0.014 K m⁻¹
 */
export function steepestStep(inputs: Inputs): SteepestStep {
  const z = heights(inputs), theta = thetas(inputs)
  let best: SteepestStep = { height: 0, gradient: -Infinity }
  for (let at = 1; at < z.length; at++) {
    const low = z[at - 1] ?? 0, high = z[at] ?? 0
    const gradient = ((theta[at] ?? 0) - (theta[at - 1] ?? 0)) / (high - low)
    if (gradient > best.gradient) best = { height: (low + high) / 2, gradient }
  }
  return best
}

export const lastHeight = (inputs: Inputs): number => heights(inputs)[heights(inputs).length - 1] ?? 0
export const groundTheta = (inputs: Inputs): number => thetas(inputs)[0] ?? 0
/** The first row whose value exceeds the limit, without interpolation: a slip. */
export function firstRowAbove(inputs: Inputs, values: readonly number[], limit: number): number | null {
  const at = values.findIndex((value, row) => row > 0 && value > limit)
  return at < 0 ? null : heights(inputs)[at] ?? null
}
