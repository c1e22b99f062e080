/**
 * The law of propagation of uncertainty for any function, by its partial derivatives.
 *
 *   u²(y) = Σᵢ Σⱼ cᵢ cⱼ uᵢ uⱼ rᵢⱼ     cᵢ = ∂f/∂xᵢ
 *
 * Source: JCGM 100:2008 (GUM), Eqs. 10, 13 and 16. Limits: first order; where f bends within u, the Monte Carlo method holds and this does not.
 */

export type ScalarFunction = (x: readonly number[]) => number

/** One input: its standard uncertainty, and on how many degrees of freedom that rests (Infinity where nothing is said). */
export interface UncertainNumber { value: number, standard: number, degreesOfFreedom?: number, range?: readonly [number, number] }

/** rᵢⱼ of two different inputs, by their places. */
export type CorrelationOf = (i: number, j: number) => number

export interface Propagated {
  value: number
  /** Combined standard uncertainty. */
  standard: number
  sensitivities: readonly number[]
  /** |cᵢ| uᵢ of each input, by its place. */
  parts: readonly number[]
  /**
   * Effective degrees of freedom by Welch and Satterthwaite (GUM, Eq. G.2b). It holds for inputs that do not depend on each other:
   * null where some are correlated and their own degrees are not all infinite.
   */
  degreesOfFreedom: number | null
}

/**
 * A share of the input's size: the truncation of the five-point formula falls with its fourth power, rounding rises with its inverse;
 * both are below 1e-11 of the derivative here.
 */
const relativeStep = 1 / 4096

/**
 * ∂f/∂xᵢ by differences over a step of x/4096 (of u/4096 where x is near zero): five points inside the input's range, three to one side at its ends.
 * @example derivative(([x = 0]) => x * x, [{ value: 3, standard: 0.1 }], 0) // 6
 */
export function derivative(f: ScalarFunction, inputs: readonly UncertainNumber[], at: number): number {
  const input = inputs[at]
  if (!input) throw new Error(`there is no input ${at}`)
  const x = inputs.map(one => one.value)
  const shifted = (by: number): number => f(x.map((one, n) => (n === at ? one + by : one)))
  const step = relativeStep * Math.max(Math.abs(input.value), input.standard)
  // the step as the doubles have it
  const h = (input.value + step) - input.value
  if (!(h > 0)) return 0
  const [low, high] = input.range ?? [-Infinity, Infinity]
  if (input.value - 2 * h >= low && input.value + 2 * h <= high) return (8 * (shifted(h) - shifted(-h)) - (shifted(2 * h) - shifted(-2 * h))) / (12 * h)
  const side = input.value + 2 * h <= high ? h : -h
  return (4 * shifted(side) - shifted(2 * side) - 3 * shifted(0)) / (2 * side)
}

const independent: CorrelationOf = () => 0

/** Thrown where correlations contradict each other: u² would be negative. */
export class CorrelationError extends Error {
  override readonly name = 'CorrelationError'
}

/**
 * @throws {CorrelationError} where the correlations cannot hold together
 * @example propagate(([a = 0, b = 0]) => a - b, [{ value: 20, standard: 0.1 }, { value: 15, standard: 0.1 }], () => 1).standard // 0
 */
export function propagate(f: ScalarFunction, inputs: readonly UncertainNumber[], correlation: CorrelationOf = independent): Propagated {
  for (const input of inputs) if (!(input.standard >= 0 && Number.isFinite(input.standard))) throw new RangeError(`${input.standard} is no standard uncertainty`)
  const sensitivities = inputs.map((input, at) => (input.standard === 0 ? 0 : derivative(f, inputs, at)))
  const signed = inputs.map((input, at) => (sensitivities[at] ?? 0) * input.standard)
  let variance = 0, isCorrelated = false, largest = 0
  for (let i = 0; i < signed.length; i++) {
    const own = signed[i] ?? 0
    variance += own * own
    largest += own * own
    for (let j = i + 1; j < signed.length; j++) {
      const r = correlation(i, j)
      if (r === 0) continue
      if (!(r >= -1 && r <= 1)) throw new CorrelationError(`a correlation of ${r} is none: it lies within −1 to 1`)
      isCorrelated = true
      variance += 2 * r * own * (signed[j] ?? 0)
    }
  }
  // what cancels leaves the rounding of its terms
  const slack = 1e-13 * largest * Math.max(1, signed.length)
  if (variance < -Math.max(slack, 1e-9 * largest)) throw new CorrelationError('these correlations cannot hold together: the variance would be negative')
  const standard = variance <= slack ? 0 : Math.sqrt(variance)
  return { value: f(inputs.map(one => one.value)), standard, sensitivities, parts: signed.map(Math.abs), degreesOfFreedom: effectiveDegrees(standard, signed, inputs, isCorrelated) }
}

function effectiveDegrees(standard: number, parts: readonly number[], inputs: readonly UncertainNumber[], isCorrelated: boolean): number | null {
  let sum = 0
  inputs.forEach((input, at) => {
    const degrees = input.degreesOfFreedom ?? Infinity
    if (!(degrees > 0)) throw new RangeError(`${degrees} degrees of freedom are none`)
    const part = parts[at] ?? 0
    sum += part * part * part * part / degrees
  })
  if (sum === 0) return Infinity
  return isCorrelated ? null : standard * standard * standard * standard / sum
}
