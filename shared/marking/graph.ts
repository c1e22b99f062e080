/** Carried values: a student's own earlier result, put in place of the true one in a later step. */
import type { InputDefinition, Inputs, QuantityDefinition } from '../thermo/definition'
import type { ReadAnswer, StepQuestion } from './types'

export type Carried = NonNullable<StepQuestion['carried']>[string]

/**
 * What an earlier reading carries into an input. Null where it carries nothing and the true value stands without a word: blank or unread.
 * A value that is unphysical there, or makes the rest trivial, is named and not carried.
 */
export function carriedFrom(input: InputDefinition, earlier: ReadAnswer | undefined): Carried | null {
  if (!earlier || earlier.reading !== 'ok' || earlier.valueSi === null) return null
  const fault = carriedFault(input, earlier.valueSi)
  return fault === null ? { valueSi: earlier.valueSi, halfUnitSi: earlier.halfUnitSi ?? 0 } : { notCarried: fault }
}

function carriedFault(input: InputDefinition, value: number): string | null {
  if (!(value >= input.range[0] && value <= input.range[1])) return `your earlier value of the ${input.label} lies outside what is physical here`
  if (input.trivialWithin !== undefined && Math.abs(value) <= input.trivialWithin) return `your earlier value of the ${input.label} would leave nothing to compute`
  return null
}

export interface CarriedInputs { inputs: Inputs | null, halfUnits: Record<string, number>, notes: string[] }

/** The inputs with carried values in place; null where none is carried. The judge looks at each value again: it does not rest on its caller. */
export function withCarried(definition: QuantityDefinition, question: StepQuestion): CarriedInputs {
  const halfUnits: Record<string, number> = {}
  const notes: string[] = []
  const inputs: Record<string, Inputs[string]> = { ...question.inputs }
  let isCarried = false
  for (const [name, carried] of Object.entries(question.carried ?? {})) {
    const input = definition.inputs.find(one => one.name === name && one.shape === 'number')
    if (!input) continue
    if ('notCarried' in carried) {
      notes.push(`Not carried: ${carried.notCarried}.`)
      continue
    }
    const fault = carriedFault(input, carried.valueSi)
    if (fault !== null) {
      notes.push(`Not carried: ${fault}.`)
      continue
    }
    inputs[name] = carried.valueSi
    halfUnits[name] = carried.halfUnitSi >= 0 && Number.isFinite(carried.halfUnitSi) ? carried.halfUnitSi : 0
    isCarried = true
  }
  return { inputs: isCarried ? inputs : null, halfUnits, notes }
}
