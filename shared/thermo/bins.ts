/** Rows gathered into bins of height: a winch that stops leaves many rows at one height, which then count once. */
import type { InputDefinition, Inputs } from './definition'
import { SeriesError } from './errors'
import { numberOf } from './inputs'
import { heightsOf, layerInputs, temperaturesOf } from './layer'

export const binInputs: readonly InputDefinition[] = [
  ...layerInputs(3),
  { name: 'binDepth', label: 'depth of a bin', symbol: 'd', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [0.5, 5000] },
  { name: 'binStart', label: 'a height at which a bin begins', symbol: 'z₀', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [-500, 100_000] },
]

/** A height this close below a bound, in bins, is a bound that doubles cannot hold (0.3 = 3 · 0.1). */
const boundSlack = 1e-9

/** One for each bin that has a row, from below. */
export interface Bins { height: readonly number[], temperature: readonly number[], counts: readonly number[], centers: readonly number[], emptyBetween: readonly number[] }

/**
 * Means of height and temperature in bins [z₀ + k d, z₀ + (k + 1) d), half-open, so that no row counts twice and none is lost.
 *
 * A bin stands at the mean height of its rows, not at its center; a bin without rows is absent. Source: common practice. SI, any order of rows.
 *
 * @throws {SeriesError} where fewer than two bins have rows
 * @example binnedRows({ height: [0, 1, 9, 10, 25], temperature: [10, 10, 10, 9, 8].map(t => t + 273.15), binDepth: 10, binStart: 0 }).counts // [3, 1, 1]
 */
export function binnedRows(inputs: Inputs): Bins {
  const z = heightsOf(inputs), T = temperaturesOf(inputs), depth = numberOf(inputs, 'binDepth'), start = numberOf(inputs, 'binStart')
  const rowsOf = new Map<number, number[]>()
  z.forEach((height, at) => {
    const bin = Math.floor((height - start) / depth + boundSlack)
    const rows = rowsOf.get(bin)
    if (rows) rows.push(at)
    else rowsOf.set(bin, [at])
  })
  const bins = [...rowsOf].sort(([a], [b]) => a - b)
  if (bins.length < 2) throw new SeriesError('height', 'all rows lie in one bin; a lapse rate needs two')
  const meanOf = (column: readonly number[], rows: readonly number[]): number => rows.reduce((sum, at) => sum + (column[at] ?? 0), 0) / rows.length
  const center = (bin: number): number => start + (bin + 0.5) * depth
  const filled = new Set(rowsOf.keys()), [lowest = 0] = bins[0] ?? [], [highest = 0] = bins[bins.length - 1] ?? []
  const emptyBetween: number[] = []
  // with gaps of many thousand bins no one has put in a row for each
  if (highest - lowest < 10_000) for (let bin = lowest + 1; bin < highest; bin++) if (!filled.has(bin)) emptyBetween.push(center(bin))
  return {
    height: bins.map(([, rows]) => meanOf(z, rows)), temperature: bins.map(([, rows]) => meanOf(T, rows)), counts: bins.map(([, rows]) => rows.length),
    centers: bins.map(([bin]) => center(bin)), emptyBetween,
  }
}
