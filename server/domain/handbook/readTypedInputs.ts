import type { InputDefinition, Inputs, InputValue, QuantityDefinition } from '#shared/thermo/definition'
import { formatUnit } from '#shared/units/formatQuantity'
import { readQuantity } from '#shared/units/readQuantity'

export interface TypedInputs { inputs: Inputs, read: Record<string, { ok: boolean, message: string }>, isWhole: boolean }

/** What was typed for each input, read as people type: a number with its unit, or a series of numbers in the shown unit. Empty optional ones are left out. */
export function readTypedInputs(definition: QuantityDefinition, typed: Readonly<Record<string, string>>): TypedInputs {
  const inputs: Record<string, InputValue> = {}
  const read: TypedInputs['read'] = {}
  for (const input of definition.inputs) {
    const text = (typed[input.name] ?? '').trim()
    if (text === '' && input.isOptional) continue
    const outcome = input.shape === 'series' ? readSeries(input, text) : readNumber(input, text)
    read[input.name] = { ok: outcome.value !== null, message: outcome.message }
    if (outcome.value !== null) inputs[input.name] = outcome.value
  }
  return { inputs, read, isWhole: Object.values(read).every(one => one.ok) }
}

/** A sounding as it is worked by hand has tens of levels; a robust slope costs the square of their number. A record belongs in a lab, not in the calculator. */
export const mostValues = 300

interface Outcome { value: InputValue | null, message: string }

function readNumber(input: InputDefinition, text: string): Outcome {
  const answer = readQuantity(text, { unit: input.shownUnit, kind: input.kind, quantityName: input.label })
  return { value: answer.reading === 'ok' ? answer.valueSi : null, message: answer.reading === 'empty' ? 'Type a value with its unit.' : answer.message }
}

function readSeries(input: InputDefinition, text: string): Outcome {
  const tokens = text.split(/[\s;]+/).filter(token => token !== '')
  if (tokens.length === 0) return { value: null, message: `Type or paste the series in ${formatUnit(input.shownUnit) || 'plain numbers'}, a space or a new line between two values.` }
  if (tokens.length > mostValues) return { value: null, message: `These are ${tokens.length} values; the calculator takes at most ${mostValues}.` }
  const values: number[] = []
  for (const [at, token] of tokens.entries()) {
    const answer = readQuantity(input.shownUnit === '1' ? token : `${token} ${formatUnit(input.shownUnit)}`, { unit: input.shownUnit, kind: input.kind, quantityName: input.label })
    if (answer.reading !== 'ok' || answer.valueSi === null) return { value: null, message: `Value ${at + 1}, “${token.slice(0, 30)}”: ${answer.message}` }
    values.push(answer.valueSi)
  }
  return { value: values, message: `read ${values.length} values in ${formatUnit(input.shownUnit) || 'plain numbers'}` }
}
