/** Layers in which temperature rises with height. */
import type { InputDefinition, Inputs } from './definition'
import { numberOf, seriesOf } from './inputs'

export const profileInputs = (least: number): readonly InputDefinition[] => [
  { name: 'height', label: 'heights of the rows, rising', symbol: 'z', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'series', range: [-500, 100_000], needs: { least, order: 'ascending' } },
  { name: 'temperature', label: 'air temperatures of the rows', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'series', range: [100, 400], needs: { least, order: 'none' } },
]

export const inversionInputs: readonly InputDefinition[] = [
  ...profileInputs(2),
  { name: 'minimumDepth', label: 'depth from which a layer counts', symbol: 'd_min', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [0, 5000] },
]

export interface Inversion { base: number, top: number, baseTemperature: number, topTemperature: number }

/**
 * The lowest inversion of a profile at least as deep as `minimumDepth`: from the row below the first rise of T to the last row before T falls.
 * Isothermal steps inside count as part of it; at its base and its top they do not.
 *
 * Source: AMS Glossary of Meteorology, "inversion"; the rules of depth and of isothermal steps are common practice and stated in the ask.
 * Null where there is none.
 *
 * @example z 0, 100, 200, 300, 400 m; T 10, 9, 11, 12, 11 °C: base 100 m, top 300 m, 3 K
 */
export function lowestInversion(inputs: Inputs): Inversion | null {
  const z = seriesOf(inputs, 'height'), T = seriesOf(inputs, 'temperature'), least = numberOf(inputs, 'minimumDepth')
  let base = -1, top = -1
  const found = (): Inversion | null => {
    if (base < 0) return null
    const low = z[base] ?? 0, high = z[top] ?? 0
    return high - low >= least ? { base: low, top: high, baseTemperature: T[base] ?? 0, topTemperature: T[top] ?? 0 } : null
  }
  for (let at = 1; at < z.length; at++) {
    const change = (T[at] ?? 0) - (T[at - 1] ?? 0)
    if (change > 0) {
      if (base < 0) base = at - 1
      top = at
    }
    else if (change < 0) {
      const inversion = found()
      if (inversion) return inversion
      base = -1
    }
  }
  return found()
}

export const inversionRule = 'the lowest layer in which temperature rises with height from row to row, from the row below the first rise to the last row before temperature falls; isothermal steps count inside it and not at its ends; layers that are less deep than the given depth do not count; "none" where there is no such layer'
