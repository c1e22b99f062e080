/**
 * The uncertainty budget of a quantity: what each input's uncertainty does to the result, the largest first, and the expanded uncertainty.
 *
 *   U = k u(y)     k = t_p(ν_eff) of Student's t (GUM, G.3 and G.4)
 *
 * Source: JCGM 100:2008 (GUM), 5 and Annex G. The value is the reference's own; u is that of the inputs as given, and of nothing else.
 */
import { coverageFactor } from '../../numerics/studentT'
import type { Constants, Formulae, Inputs, QuantityDefinition } from '../definition'
import { OutOfRangeError } from '../errors'
import { evaluateQuantity, plainFormulae } from '../evaluate'
import { propagate } from './propagate'
import { layOut, type GivenCorrelation, type GivenUncertainties } from './uncertainInputs'

export interface BudgetPart {
  input: string
  /** What this input does alone to the result, standard, in the result's SI unit; of a series its values together, as they correlate. */
  standard: number
  /** ∂y/∂x of a number; null for a series. */
  sensitivity: number | null
  /** Its part of u², before what correlation between different inputs adds or takes. */
  share: number
}

export interface Budget {
  value: number
  standard: number
  expanded: number
  coverage: number
  coverageFactor: number
  /** Effective degrees of freedom, Infinity where none were given; null where correlated inputs leave them undefined (GUM, G.4.1): then k is the normal distribution's. */
  degreesOfFreedom: number | null
  /** The largest first. */
  parts: readonly BudgetPart[]
  /** What correlation between different inputs adds to u², negative where it takes off. */
  covariance: number
}

/** Where nothing else is asked. */
export const usualCoverage = 0.95

/** Thrown where the result is no number near the inputs, so that it has no derivative. */
export class NoDerivativeError extends Error {
  override readonly name = 'NoDerivativeError'
  constructor(readonly outcome: string) {
    super(`close to these inputs the result is “${outcome}” and no number: simulate instead of propagating`)
  }
}

export interface BudgetOptions { variant?: string, formulae?: Formulae, correlations?: readonly GivenCorrelation[], coverage?: number }

/**
 * @throws {UnknownInputError | MissingInputError | OutOfRangeError | SeriesError | CorrelationError | NoDerivativeError}
 * @example uncertaintyBudget(density, { pressure: 101325, temperature: 298.15 }, { pressure: { standard: 50 }, temperature: { standard: 0.2 } }, constants).standard // 0.00099 kg m⁻³
 */
export function uncertaintyBudget(definition: QuantityDefinition, inputs: Inputs, given: GivenUncertainties, constants: Constants, options: BudgetOptions = {}): Budget {
  const { variant, formulae = plainFormulae, correlations = [], coverage = usualCoverage } = options
  if (!(coverage > 0 && coverage < 1)) throw new OutOfRangeError('coverage', coverage, 'the probabilities between 0 and 1')
  const { numbers, correlation, inputsWith } = layOut(definition, inputs, given, correlations)
  const evaluated = (x: readonly number[]): number => {
    const outcome = evaluateQuantity(definition, inputsWith(x), constants, variant, formulae)
    if (outcome.is !== 'value') throw new NoDerivativeError(outcome.is === 'class' ? outcome.key : outcome.is.replace('_', ' '))
    return outcome.value
  }
  const { value, standard, sensitivities, parts, degreesOfFreedom } = propagate(evaluated, numbers, correlation)
  const names = [...new Set(numbers.map(one => one.input))]
  const variances = new Map(names.map(name => [name, varianceOf(name)]))

  function varianceOf(name: string): number {
    const places = numbers.flatMap((one, at) => (one.input === name ? [at] : []))
    const signed = places.map(at => (sensitivities[at] ?? 0) * (numbers[at]?.standard ?? 0))
    let sum = 0
    for (let i = 0; i < places.length; i++) {
      sum += (signed[i] ?? 0) * (signed[i] ?? 0)
      const r = i + 1 < places.length ? correlation(places[i] ?? 0, places[i + 1] ?? 0) : 0
      if (r === 0) continue
      for (let j = i + 1; j < places.length; j++) sum += 2 * r * (signed[i] ?? 0) * (signed[j] ?? 0)
    }
    return Math.max(0, sum)
  }

  const total = [...variances.values()].reduce((sum, one) => sum + one, 0)
  const listed = names.map((name): BudgetPart => {
    const at = numbers.findIndex(one => one.input === name), variance = variances.get(name) ?? 0
    const isNumber = numbers[at]?.place === null
    return { input: name, standard: isNumber ? parts[at] ?? 0 : Math.sqrt(variance), sensitivity: isNumber ? sensitivities[at] ?? 0 : null, share: total > 0 ? variance / total : 0 }
  })
  // GUM, G.4.1: to the next lower whole number; and a normal distribution where there is nothing to go by
  const whole = degreesOfFreedom === null || !Number.isFinite(degreesOfFreedom) ? Infinity : Math.max(1, Math.floor(degreesOfFreedom + 1e-9))
  const factor = coverageFactor(coverage, whole)
  return {
    value, standard, expanded: factor * standard, coverage, coverageFactor: factor, degreesOfFreedom,
    parts: listed.sort((a, b) => b.standard - a.standard || (a.input < b.input ? -1 : 1)),
    covariance: standard * standard - total,
  }
}
