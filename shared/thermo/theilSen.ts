/** The robust fit: the median of the slopes between all pairs of rows, and how sure it is. */
import { atRank } from '../numerics/selection'
import type { Inputs } from './definition'
import { SeriesError } from './errors'
import { heightsOf, temperaturesOf } from './layer'

/** Pairs grow with the square of the rows. */
export const mostRows = 3000

interface Slopes { values: Float64Array, count: number, rows: number, ties: number }

/** −ΔT/Δz of every pair of rows at different heights. @throws {SeriesError} */
function slopesOf(inputs: Inputs): Slopes {
  const z = heightsOf(inputs), T = temperaturesOf(inputs)
  const rows = z.length
  if (rows > mostRows) throw new SeriesError('height', `${rows} rows; at most ${mostRows} can be paired`)
  const values = new Float64Array(rows * (rows - 1) / 2)
  let count = 0
  for (let i = 0; i < rows; i++) {
    const zi = z[i] ?? 0, Ti = T[i] ?? 0
    for (let j = i + 1; j < rows; j++) {
      const depth = (z[j] ?? 0) - zi
      if (depth !== 0) values[count++] = (Ti - (T[j] ?? 0)) / depth
    }
  }
  if (count === 0) throw new SeriesError('height', 'all rows have the same height; a lapse rate needs a layer')
  return { values, count, rows, ties: values.length - count }
}

export interface RobustRate { rate: number, pairs: number, tiedPairs: number }

/**
 * Lapse rate by the Theil–Sen estimator.
 *
 *   Γ = median over all pairs i < j of −(Tⱼ − Tᵢ)/(zⱼ − zᵢ)     pairs at one height left out; of an even number the mean of the middle two
 *
 * Source: Theil (1950), Proc. Kon. Ned. Akad. Wetensch. A 53; Sen (1968), J. Amer. Statist. Assoc. 63, 1379–1389, section 4.
 * Units: m and K in, K/m out. Valid: 2 to 3000 rows in any order; bears up to 29 % of wild rows.
 *
 * @throws {SeriesError} where all heights are alike, or there are too many rows
 * @example theilSenRate({ height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }).rate // 0.0095 K/m
 */
export function theilSenRate(inputs: Inputs): RobustRate {
  const { values, count, ties } = slopesOf(inputs)
  return { rate: atRank(values, count, (count - 1) / 2), pairs: count, tiedPairs: ties }
}

/** The 97.5 % point of the standard normal distribution. */
export const normalPoint = 1.959963984540054

export interface RobustInterval { low: number, high: number, halfRanks: number, pairs: number }

/**
 * The interval of the Theil–Sen lapse rate at 95 %, from the ranks of the slopes; null where the rows are too few for it.
 *
 *   C = 1.96 √[n(n − 1)(2n + 5)/18],  bounds at the ranks (N − C)/2 and (N + C)/2 + 1 of the N ordered slopes, interpolated between ranks
 *
 * Source: Sen (1968), section 5; Gilbert (1987), Statistical Methods for Environmental Pollution Monitoring, section 16.5 (rank formulas from memory).
 * Limits: rows taken as independent, and no two at one height.
 */
export function theilSenInterval(inputs: Inputs): RobustInterval | null {
  const { values, count, rows } = slopesOf(inputs)
  const halfRanks = normalPoint * Math.sqrt(rows * (rows - 1) * (2 * rows + 5) / 18)
  const first = (count - halfRanks) / 2, last = (count + halfRanks) / 2 + 1
  if (!(first >= 1 && last <= count)) return null
  return { low: atRank(values, count, first - 1), high: atRank(values, count, last - 1), halfRanks, pairs: count }
}

/** The mean of all the slopes: what one gets who takes it for the median. */
export function meanOfPairs(inputs: Inputs): number {
  const { values, count } = slopesOf(inputs)
  let sum = 0
  for (let at = 0; at < count; at++) sum += values[at] ?? 0
  return sum / count
}
