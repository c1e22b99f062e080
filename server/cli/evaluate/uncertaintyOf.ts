/**
 * The uncertainty of an answer, where a question gives those of its inputs:
 *
 *   "u":{input:{"value","unit","degreesOfFreedom"?}}     standard uncertainties, of a series one for all or one for each value
 *   "correlation":[[input,input,r]]                      of two inputs, or of one series' values with each other
 *   "coverage":0.95                                      of the expanded uncertainty
 *   "monteCarlo":{"trials"?,"seed"?} or true             simulated in place of propagated
 */
import { formulaeOf } from '#shared/marking/alternatives'
import type { Convention } from '#shared/thermo/convention'
import type { Inputs, QuantityDefinition } from '#shared/thermo/definition'
import { fromDouble, toDouble } from '#shared/numerics/rational'
import { uncertaintyBudget } from '#shared/thermo/uncertainty/budget'
import { simulateQuantity, usualTrials } from '#shared/thermo/uncertainty/monteCarlo'
import type { GivenCorrelation, GivenUncertainties, GivenUncertainty } from '#shared/thermo/uncertainty/uncertainInputs'
import { fromSi, type Unit } from '#shared/units/ucum'
import type { AnswerLine } from './json'
import { Refusal } from './refusal'

type Fields = Readonly<Record<string, unknown>>
const isRecord = (value: unknown): value is Fields => typeof value === 'object' && value !== null && !Array.isArray(value)

export interface AskedUncertainty {
  definition: QuantityDefinition
  convention: Convention
  variant: string
  unit: Unit
  inputs: Inputs
  /** A number in the unit that is written beside it, as a difference in SI. */
  asDifference: (raw: unknown, unit: unknown, name: string) => number
}

/** What `"u"` asks for; null where a question has none. */
export function uncertaintyOf(question: Fields, asked: AskedUncertainty): AnswerLine | null {
  if (question.u === undefined || question.u === null) return null
  const { definition, convention, variant, unit, inputs } = asked
  const given = givenOf(question.u, asked)
  const options = { variant, formulae: formulaeOf(convention), correlations: correlationsOf(question.correlation), coverage: numberOr(question.coverage, 0.95, 'coverage') }
  const width = (si: number): number => toDouble(fromSi(fromDouble(si), unit, true))
  const place = (si: number): number => toDouble(fromSi(fromDouble(si), unit, definition.kind !== 'temperature'))
  if (question.monteCarlo !== undefined && question.monteCarlo !== null && question.monteCarlo !== false) {
    const wanted = isRecord(question.monteCarlo) ? question.monteCarlo : {}
    const seed = numberOr(wanted.seed, 1, 'seed')
    const simulated = simulateQuantity(definition, inputs, given, convention.constants, { ...options, trials: numberOr(wanted.trials, usualTrials, 'trials'), seed })
    return {
      method: 'monte-carlo', mean: place(simulated.mean), standard: width(simulated.standard), coverage: simulated.coverage,
      symmetric: [place(simulated.symmetric.low), place(simulated.symmetric.high)], shortest: [place(simulated.shortest.low), place(simulated.shortest.high)],
      unit: unit.code, trials: simulated.trials, without: simulated.without, seed,
    }
  }
  const budget = uncertaintyBudget(definition, inputs, given, convention.constants, options)
  return {
    method: 'propagation', standard: width(budget.standard), expanded: width(budget.expanded), coverage: budget.coverage, coverageFactor: budget.coverageFactor,
    degreesOfFreedom: budget.degreesOfFreedom !== null && Number.isFinite(budget.degreesOfFreedom) ? budget.degreesOfFreedom : null,
    unit: unit.code,
    parts: budget.parts.map(part => ({ input: part.input, standard: width(part.standard), share: part.share })),
  }
}

function givenOf(u: unknown, { definition, asDifference }: AskedUncertainty): GivenUncertainties {
  if (!isRecord(u)) throw new Refusal('bad_question', 'u is an object of {"value","unit"}')
  const given: Record<string, GivenUncertainty> = {}
  for (const [name, one] of Object.entries(u)) {
    if (!isRecord(one)) throw new Refusal('bad_input', 'an uncertainty is {"value","unit"}', name)
    if (!definition.inputs.some(input => input.name === name)) throw new Refusal('unknown_input', `${name} is not an input here`, name)
    const standard = Array.isArray(one.value) ? one.value.map((raw: unknown) => asDifference(raw, one.unit, name)) : asDifference(one.value, one.unit, name)
    given[name] = { standard, ...(one.degreesOfFreedom === undefined ? {} : { degreesOfFreedom: numberOr(one.degreesOfFreedom, Infinity, 'degreesOfFreedom') }) }
  }
  return given
}

function correlationsOf(given: unknown): readonly GivenCorrelation[] {
  if (given === undefined || given === null) return []
  if (!Array.isArray(given)) throw new Refusal('bad_question', 'correlation is a list of [input, input, r]')
  return given.map((one: unknown): GivenCorrelation => {
    const [a, b, r]: unknown[] = Array.isArray(one) ? one : []
    if (typeof a !== 'string' || typeof b !== 'string' || typeof r !== 'number') throw new Refusal('bad_question', 'a correlation is [input, input, r]')
    return { between: [a, b], r }
  })
}

function numberOr(value: unknown, otherwise: number, name: string): number {
  if (value === undefined || value === null) return otherwise
  if (typeof value !== 'number' || !Number.isFinite(value)) throw new Refusal('bad_question', `${name} is a number`)
  return value
}
