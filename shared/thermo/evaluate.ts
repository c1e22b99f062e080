import type { Constants, Inputs, Outcome, QuantityDefinition, Variant } from './definition'
import { OutOfRangeError } from './errors'
import { checkInputs } from './inputs'

/** The variant by its key; the definition's first where none is named. @throws {OutOfRangeError} for a key that the definition has not */
export function variantOf(definition: QuantityDefinition, key?: string): Variant {
  const variant = key === undefined ? definition.variants[0] : definition.variants.find(one => one.key === key)
  if (!variant) throw new OutOfRangeError('variant', NaN, definition.variants.map(one => one.key).join(', '))
  return variant
}

/**
 * The value of a quantity: inputs checked, evaluated, and never NaN.
 * @throws {MissingInputError | OutOfRangeError | SeriesError}
 */
export function evaluateQuantity(definition: QuantityDefinition, inputs: Inputs, constants: Constants, variant?: string): Outcome {
  checkInputs(definition.inputs, inputs)
  const outcome = variantOf(definition, variant).evaluate(inputs, constants)
  if (outcome.is !== 'value') return outcome
  if (!Number.isFinite(outcome.value)) throw new OutOfRangeError(definition.key, outcome.value, 'the numbers')
  // −0 is 0
  return outcome.value === 0 ? { ...outcome, value: 0 } : outcome
}
