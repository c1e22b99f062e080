import type { ReadAnswer } from '#shared/marking/types'
import type { NumberStep } from '#shared/schemas/lab'
import { findQuantity } from '#shared/thermo/registry'
import { readClass } from '#shared/units/readClass'
import { readQuantity } from '#shared/units/readQuantity'

/** A typed answer as its step reads it: a number with its unit, a class, or a word that is an answer. */
export function readTyped(step: Pick<NumberStep, 'quantity' | 'unit'>, typed: string): ReadAnswer {
  const definition = findQuantity(step.quantity)
  if (!definition) throw new Error(`The reference has no quantity "${step.quantity}".`)
  return definition.kind === 'class' ? readClass(typed, definition.classes ?? []) : readQuantity(typed, { unit: step.unit, kind: definition.kind, quantityName: definition.name })
}
