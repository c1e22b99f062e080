import type { InputDefinition, Inputs } from './definition'
import { MissingInputError, OutOfRangeError, SeriesError, UnknownInputError } from './errors'

/** A number that the definition asks for. @throws {MissingInputError} */
export function numberOf(inputs: Inputs, name: string): number {
  const value = inputs[name]
  if (typeof value !== 'number') throw new MissingInputError(name)
  return value
}

/** A series that the definition asks for. @throws {MissingInputError} */
export function seriesOf(inputs: Inputs, name: string): readonly number[] {
  const value = inputs[name]
  if (!Array.isArray(value)) throw new MissingInputError(name)
  return value
}

/**
 * Every input there, of its shape, a number, in its range; series long enough, in order where that is needed, and of one length.
 * @throws {MissingInputError | OutOfRangeError | SeriesError | UnknownInputError}
 */
export function checkInputs(definitions: readonly InputDefinition[], inputs: Inputs): void {
  let length: number | null = null
  for (const definition of definitions) {
    const value = inputs[definition.name]
    if (value === undefined || value === null) {
      if (definition.isOptional) continue
      throw new MissingInputError(definition.name)
    }
    if (definition.shape === 'number') {
      if (typeof value !== 'number') throw new SeriesError(definition.name, 'one number is needed, not a series')
      checkRange(definition, value)
      continue
    }
    if (!Array.isArray(value)) throw new SeriesError(definition.name, 'a series is needed, not one number')
    checkSeries(definition, value)
    if (length !== null && value.length !== length) throw new SeriesError(definition.name, `${value.length} values where the series before it has ${length}`)
    length = value.length
  }
  for (const name of Object.keys(inputs)) {
    if (!definitions.some(definition => definition.name === name)) throw new UnknownInputError(name, definitions.map(definition => definition.name))
  }
}

function checkRange({ name, range, unit }: InputDefinition, value: unknown): void {
  if (typeof value !== 'number' || !(value >= range[0] && value <= range[1])) {
    throw new OutOfRangeError(name, typeof value === 'number' ? value : NaN, `${range[0]} to ${range[1]} ${unit}`)
  }
}

function checkSeries(definition: InputDefinition, values: readonly unknown[]): void {
  const { least = 1, order = 'none' } = definition.needs ?? {}
  if (values.length < least) throw new SeriesError(definition.name, `${values.length} values; at least ${least} are needed`)
  let before: number | null = null
  for (const value of values) {
    checkRange(definition, value)
    if (typeof value !== 'number') continue
    if (before !== null && order === 'ascending' && !(value > before)) throw new SeriesError(definition.name, `the values have to rise; ${value} follows ${before}`)
    if (before !== null && order === 'descending' && !(value < before)) throw new SeriesError(definition.name, `the values have to fall; ${value} follows ${before}`)
    before = value
  }
}
