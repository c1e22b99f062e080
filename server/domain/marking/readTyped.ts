import type { ReadAnswer } from '#shared/marking/types'
import { readChoice } from '#shared/marking/choice'
import type { AskedChoice, AskedNumber } from '#shared/schemas/askedSteps'
import { findQuantity } from '#shared/thermo/registry'
import { readClass } from '#shared/units/readClass'
import { readQuantity } from '#shared/units/readQuantity'

/** A typed answer as its step reads it: a number with its unit, a class, a word that is an answer, or the options that were chosen. */
export function readTyped(step: Pick<AskedNumber, 'quantity' | 'unit'> | Pick<AskedChoice, 'options' | 'isSeveral'>, typed: string): ReadAnswer {
  if ('options' in step) return readChoice(typed, step.options.map(option => ({ key: option.key, label: option.text })), step.isSeveral)
  const definition = findQuantity(step.quantity)
  if (!definition) throw new Error(`The reference has no quantity "${step.quantity}".`)
  return definition.kind === 'class' ? readClass(typed, definition.classes ?? []) : readQuantity(typed, { unit: step.unit, kind: definition.kind, quantityName: definition.name })
}
