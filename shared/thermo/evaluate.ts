import type { Constants, Formulae, Inputs, Outcome, QuantityDefinition, Variant } from './definition'
import { OutOfRangeError } from './errors'
import { checkInputs } from './inputs'

/** The first variant of everything, computed beyond its range with a note. */
export const plainFormulae: Formulae = { variants: {}, beyond: 'compute' }

/** The variant by its key; the definition's first where none is named. @throws {OutOfRangeError} for a key that the definition has not */
export function variantOf(definition: QuantityDefinition, key?: string): Variant {
  const variant = key === undefined ? definition.variants[0] : definition.variants.find(one => one.key === key)
  if (!variant) throw new OutOfRangeError('variant', NaN, definition.variants.map(one => one.key).join(', '))
  return variant
}

export interface ChosenVariant { variant: Variant, note: string | null }

/**
 * The variant that a convention computes with for these inputs: the named one, or beyond its stated range what the convention says.
 * @throws {OutOfRangeError} where the convention refuses
 */
export function chooseVariant(definition: QuantityDefinition, inputs: Inputs, formulae: Formulae, key?: string): ChosenVariant {
  const named = variantOf(definition, key ?? formulae.variants[definition.key])
  const beyond = firstBeyond(named, inputs)
  if (beyond === null) return { variant: named, note: null }
  const [input, value, range] = beyond
  const unit = definition.inputs.find(one => one.name === input)?.unit ?? ''
  if (formulae.beyond === 'refuse') throw new OutOfRangeError(input, value, `${range[0]} to ${range[1]} ${unit}, where “${named.label}” holds`)
  if (formulae.beyond === 'next') {
    const next = definition.variants.slice(definition.variants.indexOf(named) + 1).find(one => firstBeyond(one, inputs) === null)
    if (next) return { variant: next, note: `Computed by “${next.label}”: “${named.label}” holds for ${named.validity}.` }
  }
  return { variant: named, note: `Beyond the stated range of “${named.label}” (${named.validity}); known error: ${named.knownError}.` }
}

function firstBeyond(variant: Variant, inputs: Inputs): [string, number, readonly [number, number]] | null {
  for (const [name, range] of Object.entries(variant.holds ?? {})) {
    const given = inputs[name]
    for (const value of typeof given === 'number' ? [given] : given ?? []) {
      if (value < range[0] || value > range[1]) return [name, value, range]
    }
  }
  return null
}

/**
 * The value of a quantity: inputs checked, evaluated, and never NaN.
 * @throws {MissingInputError | OutOfRangeError | SeriesError}
 */
export function evaluateQuantity(definition: QuantityDefinition, inputs: Inputs, constants: Constants, variant?: string, formulae: Formulae = plainFormulae): Outcome {
  checkInputs(definition.inputs, inputs)
  const { variant: chosen, note } = chooseVariant(definition, inputs, formulae, variant)
  const outcome = chosen.evaluate(inputs, constants, formulae)
  if (outcome.is === 'value' && !Number.isFinite(outcome.value)) throw new OutOfRangeError(definition.key, outcome.value, 'the numbers')
  if (outcome.is !== 'value' && outcome.is !== 'class') return outcome
  const notes = [...outcome.notes ?? [], ...note === null ? [] : [note], ...definition.notes?.(inputs, constants, formulae) ?? []]
  const noted = notes.length === 0 ? outcome : { ...outcome, notes }
  // −0 is 0
  return noted.is === 'value' && noted.value === 0 ? { ...noted, value: 0 } : noted
}
