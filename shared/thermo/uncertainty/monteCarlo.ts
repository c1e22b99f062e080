/**
 * Propagation of distributions by simulation: inputs drawn at random, the quantity computed for each draw, the results sorted.
 *
 * Source: JCGM 101:2008 (Supplement 1 to the GUM), 5.9 and 7; normal numbers by Box and Müller (1958), its C.4. The same seed gives the same
 * numbers on every machine. Where the result is at times no value ("none", or beyond a range), its share is told and the rest summed up.
 */
import { cos, sin } from '../../numerics/angles'
import { log } from '../../numerics/elementary'
import { mean } from '../../numerics/regression'
import { fraction, randomSource, seedFromNumber, type RandomSource } from '../../numerics/random'
import type { Constants, Formulae, Inputs, QuantityDefinition } from '../definition'
import { OutOfRangeError, SeriesError } from '../errors'
import { evaluateQuantity, plainFormulae } from '../evaluate'
import { CorrelationError, type CorrelationOf } from './propagate'
import { layOut, type GivenCorrelation, type GivenUncertainties } from './uncertainInputs'

export interface Interval { low: number, high: number }

export interface Simulated {
  mean: number
  standard: number
  coverage: number
  /** Of all that hold the coverage the one with equal probability to both sides (JCGM 101, 7.7.1). */
  symmetric: Interval
  /** And the shortest (JCGM 101, 5.3.4): the narrower of the two for a skewed result. */
  shortest: Interval
  trials: number
  /** Trials whose result was no value. */
  without: number
}

const twoPi = 6.283185307179586

/** Normal numbers of mean 0 and variance 1, drawn in pairs. */
export function normalNumbers(source: RandomSource): () => number {
  let kept: number | null = null
  return () => {
    if (kept !== null) {
      const one = kept
      kept = null
      return one
    }
    // 1 − fraction is never 0
    const radius = Math.sqrt(-2 * log(1 - fraction(source))), angle = twoPi * fraction(source)
    kept = radius * sin(angle)
    return radius * cos(angle)
  }
}

/** Numbers that lie evenly between −√3 and √3, of variance 1. */
export function rectangularNumbers(source: RandomSource): () => number {
  const half = Math.sqrt(3)
  return () => (2 * fraction(source) - 1) * half
}

/** Standard uncertainty of a rectangular distribution of a half-width (JCGM 100, 4.3.7). */
export const standardOfHalfWidth = (halfWidth: number): number => halfWidth / Math.sqrt(3)

/**
 * Results of a function of random draws, summed up. `draw` gives one result, null where it has none.
 * @throws {RangeError} where fewer than two trials have a value
 */
export function simulate(draw: () => number | null, trials: number, coverage: number): Simulated {
  const results: number[] = []
  for (let n = 0; n < trials; n++) {
    const one = draw()
    if (one !== null) results.push(one)
  }
  if (results.length < 2) throw new RangeError('hardly any trial has a value: there is nothing to sum up')
  const sorted = Float64Array.from(results).sort()
  const middle = mean(results)
  let squares = 0
  for (const one of results) squares += (one - middle) * (one - middle)
  return { mean: middle, standard: Math.sqrt(squares / (results.length - 1)), coverage, ...intervals(sorted, coverage), trials, without: trials - results.length }
}

/** JCGM 101, 7.7: q = pM of the sorted results, from (M − q)/2 on; and of all stretches of q results the shortest. */
function intervals(sorted: Float64Array, coverage: number): { symmetric: Interval, shortest: Interval } {
  const count = sorted.length
  const inside = Math.min(count - 1, Math.floor(coverage * count + 0.5))
  const at = (n: number): number => sorted[Math.min(count - 1, Math.max(0, n))] ?? NaN
  const first = Math.floor((count - inside) / 2)
  let best = 0
  for (let n = 1; n + inside < count; n++) if (at(n + inside) - at(n) < at(best + inside) - at(best)) best = n
  return { symmetric: { low: at(first), high: at(first + inside) }, shortest: { low: at(best), high: at(best + inside) } }
}

/** Most numbers for which correlations between different inputs are worked out in full. */
const mostCorrelated = 400

/**
 * The lower triangle L with L Lᵀ = the matrix of correlations (Cholesky), so that L z has them where z are independent. Null where all are independent.
 * @throws {CorrelationError} where the correlations cannot hold together
 */
export function correlationRoot(count: number, correlation: CorrelationOf): number[][] | null {
  let isCorrelated = false
  for (let i = 0; i < count && !isCorrelated; i++) for (let j = 0; j < i && !isCorrelated; j++) isCorrelated = correlation(i, j) !== 0
  if (!isCorrelated) return null
  if (count > mostCorrelated) throw new CorrelationError(`at most ${mostCorrelated} correlated numbers can be simulated; these are ${count}`)
  const root: number[][] = []
  for (let i = 0; i < count; i++) {
    const row: number[] = []
    for (let j = 0; j <= i; j++) {
      let rest = i === j ? 1 : correlation(i, j)
      for (let k = 0; k < j; k++) rest -= (row[k] ?? 0) * (i === j ? row[k] ?? 0 : root[j]?.[k] ?? 0)
      if (i === j) {
        if (rest < -1e-9) throw new CorrelationError('these correlations cannot hold together')
        row.push(Math.sqrt(Math.max(0, rest)))
      }
      else {
        const pivot = root[j]?.[j] ?? 0
        if (pivot < 1e-6 && Math.abs(rest) > 1e-6) throw new CorrelationError('these correlations cannot hold together')
        row.push(pivot < 1e-6 ? 0 : rest / pivot)
      }
    }
    root.push(row)
  }
  return root
}

export interface SimulationOptions { variant?: string, formulae?: Formulae, correlations?: readonly GivenCorrelation[], coverage?: number, trials?: number, seed?: number }

export const usualTrials = 10_000
export const mostTrials = 1_000_000

/**
 * A quantity with normally distributed inputs, simulated. A draw outside an input's range, or rows out of order, count as without a value.
 * @throws {UnknownInputError | MissingInputError | OutOfRangeError | SeriesError | CorrelationError | RangeError}
 */
export function simulateQuantity(definition: QuantityDefinition, inputs: Inputs, given: GivenUncertainties, constants: Constants, options: SimulationOptions = {}): Simulated {
  const { variant, formulae = plainFormulae, correlations = [], coverage = 0.95, trials = usualTrials, seed = 1 } = options
  if (!(coverage > 0 && coverage < 1)) throw new OutOfRangeError('coverage', coverage, 'the probabilities between 0 and 1')
  if (!(Number.isInteger(trials) && trials >= 100 && trials <= mostTrials)) throw new OutOfRangeError('trials', trials, `the whole numbers from 100 to ${mostTrials}`)
  if (!(Number.isInteger(seed) && seed >= 0 && seed <= 0xFFFFFFFF)) throw new OutOfRangeError('seed', seed, 'the whole numbers from 0 to 4294967295')
  // what is wrong with the inputs themselves is told, and not counted
  evaluateQuantity(definition, inputs, constants, variant, formulae)
  const { numbers, correlation, inputsWith } = layOut(definition, inputs, given, correlations)
  const root = correlationRoot(numbers.length, correlation)
  const next = normalNumbers(randomSource(seedFromNumber(seed)))
  return simulate(() => {
    const z = numbers.map(() => next())
    const moved = numbers.map((one, at) => {
      const deviation = root ? (root[at] ?? []).reduce((sum, factor, k) => sum + factor * (z[k] ?? 0), 0) : z[at] ?? 0
      return one.value + one.standard * deviation
    })
    try {
      const outcome = evaluateQuantity(definition, inputsWith(moved), constants, variant, formulae)
      return outcome.is === 'value' ? outcome.value : null
    }
    catch (error) {
      if (error instanceof OutOfRangeError || error instanceof SeriesError || error instanceof RangeError) return null
      throw error
    }
  }, trials, coverage)
}
