/** Standard uncertainties given for a quantity's inputs, laid out one number after another as propagation and simulation need them. */
import type { InputDefinition, Inputs, InputValue, QuantityDefinition } from '../definition'
import { MissingInputError, OutOfRangeError, SeriesError, UnknownInputError } from '../errors'
import type { CorrelationOf, UncertainNumber } from './propagate'

/** One number for all, or for a series one for each of its values; SI, of differences. */
export interface GivenUncertainty { standard: number | readonly number[], degreesOfFreedom?: number }
export type GivenUncertainties = Readonly<Record<string, GivenUncertainty>>

/** Correlation of two inputs, or of the values of one series with each other (the same name twice): 1 for one sensor's calibration. */
export interface GivenCorrelation { between: readonly [string, string], r: number }

/** Propagation evaluates the quantity four times for each number, and looks at every pair of them. */
const mostNumbers = 2000

export interface LaidOut {
  numbers: readonly (UncertainNumber & { input: string, place: number | null })[]
  correlation: CorrelationOf
  /** The quantity's inputs with other numbers in these places. */
  inputsWith: (numbers: readonly number[]) => Inputs
}

/** @throws {UnknownInputError | MissingInputError | OutOfRangeError | SeriesError} naming the input */
export function layOut(definition: QuantityDefinition, inputs: Inputs, given: GivenUncertainties, correlations: readonly GivenCorrelation[] = []): LaidOut {
  const numbers: (UncertainNumber & { input: string, place: number | null })[] = []
  for (const [name, uncertainty] of Object.entries(given)) {
    const input = inputOf(definition, name)
    const value = inputs[name]
    if (value === undefined) throw new MissingInputError(name)
    const values = typeof value === 'number' ? [value] : value
    const standards = typeof uncertainty.standard === 'number' ? values.map(() => uncertainty.standard) : uncertainty.standard
    if (standards.length !== values.length) throw new SeriesError(name, `${standards.length} uncertainties for ${values.length} values`)
    if (numbers.length + values.length > mostNumbers) throw new SeriesError(name, `at most ${mostNumbers} uncertain numbers can be taken together`)
    const { degreesOfFreedom } = uncertainty
    if (degreesOfFreedom !== undefined && !(degreesOfFreedom > 0)) throw new OutOfRangeError(name, degreesOfFreedom, 'the degrees of freedom above 0')
    values.forEach((one, at) => {
      const standard = standards[at]
      if (typeof standard !== 'number' || !(standard >= 0 && Number.isFinite(standard))) throw new OutOfRangeError(name, typeof standard === 'number' ? standard : NaN, 'the standard uncertainties from 0')
      numbers.push({ input: name, place: typeof value === 'number' ? null : at, value: one, standard, range: input.range, ...(degreesOfFreedom === undefined ? {} : { degreesOfFreedom }) })
    })
  }
  return { numbers, correlation: correlationOf(numbers, correlations, given), inputsWith: moved => withNumbers(inputs, numbers, moved) }
}

function inputOf(definition: QuantityDefinition, name: string): InputDefinition {
  const input = definition.inputs.find(one => one.name === name)
  if (!input) throw new UnknownInputError(name, definition.inputs.map(one => one.name))
  return input
}

/** Two series correlate value by value (the pressure and the temperature of one row); a series with a number in all its values. */
function correlationOf(numbers: LaidOut['numbers'], correlations: readonly GivenCorrelation[], given: GivenUncertainties): CorrelationOf {
  const byPair = new Map<string, number>()
  for (const { between: [a, b], r } of correlations) {
    for (const name of [a, b]) if (!Object.hasOwn(given, name)) throw new UnknownInputError(name, Object.keys(given))
    if (!(r >= -1 && r <= 1)) throw new OutOfRangeError(a, r, 'the correlations from −1 to 1')
    byPair.set(`${a}|${b}`, r)
    byPair.set(`${b}|${a}`, r)
  }
  return (i, j) => {
    const a = numbers[i], b = numbers[j]
    if (!a || !b) return 0
    const r = byPair.get(`${a.input}|${b.input}`) ?? 0
    const ofOneRow = a.input === b.input || a.place === null || b.place === null || a.place === b.place
    return ofOneRow ? r : 0
  }
}

function withNumbers(inputs: Inputs, numbers: LaidOut['numbers'], moved: readonly number[]): Inputs {
  const changed: Record<string, InputValue> = { ...inputs }
  const series = new Map<string, number[]>()
  numbers.forEach(({ input, place }, at) => {
    const value = moved[at] ?? NaN
    if (place === null) {
      changed[input] = value
      return
    }
    const own = inputs[input]
    const copy = series.get(input) ?? (Array.isArray(own) ? [...own] : [])
    copy[place] = value
    series.set(input, copy)
  })
  for (const [name, values] of series) changed[name] = values
  return changed
}
