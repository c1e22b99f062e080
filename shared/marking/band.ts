/**
 * The interval of values that earn the marks: the hull of what accepted formulae and constants give, then what the author grants, rounding at
 * the digits asked, half divisions of a plot that is read off, and half units of carried values. Sensors' accuracy is no part of it where both
 * sides use the same rows; where students read an instrument of their own, both accuracies are.
 * The parts add up to the edges exactly: low = center − (Σ below), high = center + (Σ above), summed in their order.
 */
import type { Inputs, QuantityDefinition } from '../thermo/definition'
import { evaluateQuantity } from '../thermo/evaluate'
import type { Unit } from '../units/ucum'
import { acceptedWays, valuesOfWays } from './alternatives'
import { outwardDecimals } from './decimalEdges'
import { halfUnitAsked } from './rounding'
import type { Band, BandPart, Granted, StepQuestion } from './types'

/** A question that cannot be judged as it is set: the author's to mend, found by the proof run. */
export class QuestionFault extends Error {
  override readonly name = 'QuestionFault'
  constructor(readonly code: 'grant_invalid' | 'digits_invalid' | 'unit_invalid', message: string) {
    super(message)
  }
}

/** The reference's value for some inputs, or what it is in place of a value. @throws what `evaluateQuantity` throws */
export function referenceOf(definition: QuantityDefinition, question: StepQuestion, inputs: Inputs) {
  const [own] = acceptedWays(definition, question.convention, question.variant)
  if (!own) throw new Error('a question has its own way')
  return { outcome: evaluateQuantity(definition, inputs, own.constants, own.variant, own.formulae), way: own }
}

/** Half-unit ranges of carried inputs, by name. */
export type CarriedHalfUnits = Readonly<Record<string, number>>

export function makeBand(definition: QuantityDefinition, question: StepQuestion, inputs: Inputs, center: number, unit: Unit, carried: CarriedHalfUnits = {}): Band {
  const values = valuesOfWays(definition, question.convention, question.variant, inputs).map(one => one.value)
  const part = (key: BandPart['key'], label: string, below: number, above: number): BandPart => ({ key, label, below, above })
  const parts: BandPart[] = []
  const lowest = Math.min(center, ...values), highest = Math.max(center, ...values)
  if (lowest < center || highest > center) parts.push(part('formulae', 'accepted formulae and constants', center - lowest, highest - center))
  const granted = grantedWidth(definition, question.granted, center)
  if (granted > 0) parts.push(part('granted', 'granted by the author', granted, granted))
  for (const [name, half] of Object.entries(question.readOff ?? {})) {
    const spread = name === 'result' ? { below: half, above: half } : carriedSpread(definition, question, inputs, center, name, half)
    if (spread.below > 0 || spread.above > 0) parts.push(part('reading', name === 'result' ? 'half a division of the axis' : `half a division of the axis (${labelOf(definition, name)})`, spread.below, spread.above))
  }
  for (const [name, half] of Object.entries(question.ownRead ?? {})) {
    const spread = carriedSpread(definition, question, inputs, center, name, half)
    if (spread.below > 0 || spread.above > 0) parts.push(part('carried', `digits of your own reading (${labelOf(definition, name)})`, spread.below, spread.above))
  }
  if (question.accuracy) {
    parts.push(part('reading', 'accuracy of the station’s sensor', question.accuracy.stationSi, question.accuracy.stationSi))
    parts.push(part('reading', 'accuracy of your own instrument', question.accuracy.ownSi, question.accuracy.ownSi))
  }
  for (const [name, half] of Object.entries(carried)) {
    const spread = carriedSpread(definition, question, inputs, center, name, half)
    if (spread.below > 0 || spread.above > 0) parts.push(part('carried', `digits of your earlier value (${labelOf(definition, name)})`, spread.below, spread.above))
  }
  const half = halfUnitAsked(definition, center, unit, question.digits)
  parts.push(part('rounding', 'rounding at the digits asked', half, half))
  let below = 0, above = 0
  for (const one of parts) {
    below += one.below
    above += one.above
  }
  const low = center - below, high = center + above
  return { center, low, high, ...outwardDecimals(low, high, unit, definition.kind !== 'temperature'), unit: question.unit, parts }
}

const labelOf = (definition: QuantityDefinition, name: string): string => definition.inputs.find(input => input.name === name)?.label ?? name

/** @throws {QuestionFault} for a grant that says nothing: negative, not a number, or a share of a temperature */
export function grantedWidth(definition: QuantityDefinition, granted: Granted, center: number): number {
  const { absoluteSi = 0, relative = 0 } = granted
  if (!(absoluteSi >= 0 && Number.isFinite(absoluteSi))) throw new QuestionFault('grant_invalid', `A width of ${absoluteSi} cannot be granted.`)
  if (!(relative >= 0 && relative <= 1)) throw new QuestionFault('grant_invalid', `A share of ${relative} cannot be granted.`)
  if (relative > 0 && definition.kind === 'temperature') throw new QuestionFault('grant_invalid', 'A temperature takes an absolute width: a share of it depends on where zero is.')
  return Math.max(absoluteSi, relative * Math.abs(center))
}

/** What half a unit of a carried value does to the result, to both sides. */
function carriedSpread(definition: QuantityDefinition, question: StepQuestion, inputs: Inputs, center: number, name: string, half: number): { below: number, above: number } {
  const value = inputs[name]
  if (typeof value !== 'number' || !(half > 0)) return { below: 0, above: 0 }
  const at = [value - half, value + half].map((moved) => {
    try {
      const { outcome } = referenceOf(definition, question, { ...inputs, [name]: moved })
      return outcome.is === 'value' ? outcome.value : center
    }
    catch {
      // half a unit beyond the range of the input: nothing to be carried on that side
      return center
    }
  })
  return { below: Math.max(0, center - Math.min(...at)), above: Math.max(0, Math.max(...at) - center) }
}
