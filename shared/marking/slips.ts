/** Which known way to go wrong a value can come from. */
import { absolute, compare, fromDecimal, minus, plus, rational, times, toDouble, type Rational } from '../numerics/rational'
import type { Inputs, QuantityDefinition, Slip } from '../thermo/definition'
import type { Unit } from '../units/ucum'
import { valuesOfWays } from './alternatives'
import { exactInUnit } from './decimalEdges'
import { halfUnitAsked } from './rounding'
import type { ReadAnswer, StepQuestion } from './types'

/** A slip's values over every accepted way: as wide as honest constants make it. */
export interface SlipRange { slip: Slip, value: number, low: number, high: number }

/** Of the value itself: what a typed value may be off a slip's and still be named after it. Two typed digits name nothing closer. */
const widest = 0.025

/** Every slip that can be made with these inputs and makes a difference. A slip that fails in some way is left out, never the mark. */
export function slipRanges(definition: QuantityDefinition, question: StepQuestion, inputs: Inputs, right: number): readonly SlipRange[] {
  const ways = valuesOfWays(definition, question.convention, question.variant, inputs)
  const ranges: SlipRange[] = []
  for (const slip of definition.slips) {
    const values: number[] = []
    for (const { way, value: rightByWay } of ways) {
      const value = tried(() => slip.apply(inputs, way.constants, rightByWay, way.formulae))
      if (value !== null && Number.isFinite(value)) values.push(value)
    }
    const [own] = values
    if (own === undefined || Math.abs(own - right) <= 1e-12 * Math.abs(right)) continue
    ranges.push({ slip, value: own, low: Math.min(...values), high: Math.max(...values) })
  }
  return ranges
}

function tried(work: () => number | null): number | null {
  try {
    return work()
  }
  catch {
    return null
  }
}

/** The one slip that alone explains a typed value, within the rounding of its digits; null where none does, or two do. */
export function explainingSlip(definition: QuantityDefinition, question: StepQuestion, answer: ReadAnswer, ranges: readonly SlipRange[], unit: Unit): SlipRange | null {
  const typed = answer.decimal === null ? null : fromDecimal(answer.decimal)
  if (!typed) return null
  const fitting = ranges.filter(range => fits(definition, question, answer, typed, range, unit))
  const [only, ...others] = fitting
  return only && others.length === 0 ? only : null
}

function fits(definition: QuantityDefinition, question: StepQuestion, answer: ReadAnswer, typed: Rational, range: SlipRange, unit: Unit): boolean {
  const isDifference = definition.kind !== 'temperature'
  const asked = halfUnitAsked(definition, range.value, unit, question.digits)
  const most = Math.max(asked, widest * Math.abs(isDifference ? range.value : range.value - toDouble(unit.offset)))
  const room = Math.min(Math.max(answer.halfUnitSi ?? 0, asked), most)
  // most slips are far away: doubles are enough to see that
  if (answer.valueSi !== null) {
    const far = 1.01 * room + 1e-6 * Math.abs(range.value)
    if (answer.valueSi < range.low - far || answer.valueSi > range.high + far) return false
  }
  // and 1e-9 outwards, as with a band's edges
  const around = plus(exactInUnit(room, unit, true), times(absolute(exactInUnit(range.value, unit, true)), rational(1n, 1_000_000_000n)))
  const low = minus(exactInUnit(range.low, unit, isDifference), around)
  const high = plus(exactInUnit(range.high, unit, isDifference), around)
  return compare(low, typed) <= 0 && compare(typed, high) <= 0
}

/** The slip's sentence with its value put in. */
export const sentenceOf = (range: SlipRange, shown: { value: string, unit: string }): string => range.slip.sentence.replace('{value}', shown.value).replace('{unit}', shown.unit)
