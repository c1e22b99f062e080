/** The only entry of marking: one step, one answer, one judgement. Total: what cannot be judged is said, not thrown. */
import { fromDecimal, plus, rational, toDecimal } from '../numerics/rational'
import type { Inputs, QuantityDefinition } from '../thermo/definition'
import { MissingInputError, OutOfRangeError, SeriesError, UnknownInputError } from '../thermo/errors'
import { evaluateQuantity } from '../thermo/evaluate'
import { findQuantity } from '../thermo/registry'
import { fullTurn } from '../thermo/wind'
import { formatQuantity } from '../units/formatQuantity'
import { findUnit, getUnit, isCommensurable, type Unit } from '../units/ucum'
import { acceptedWays } from './alternatives'
import { makeBand, QuestionFault, referenceOf, type CarriedHalfUnits } from './band'
import { liesWithin, outwardDecimals } from './decimalEdges'
import { withCarried, type CarriedInputs } from './graph'
import { judgedChoice } from './choice'
import { earnedMilli, showMilli, withinStep } from './points'
import { halfUnitAsked } from './rounding'
import { explainingSlip, sentenceOf, slipRanges, type SlipRange } from './slips'
import type { Accepted, Band, Judgement, ReadAnswer, StepQuestion } from './types'

export { judgeInterface, referenceVersion } from './version'

const carriedWords = 'Right by the value that follows from your own earlier one.'

export function judgeStep(question: StepQuestion, answer: ReadAnswer): Judgement {
  try {
    return judged(question, answer)
  }
  catch (error) {
    return refused(faultCode(error), error instanceof Error ? error.message : 'not judged')
  }
}

/** The code of what made a question impossible to judge. */
function faultCode(error: unknown): string {
  if (error instanceof OutOfRangeError) return 'out_of_range'
  if (error instanceof MissingInputError) return 'missing_input'
  if (error instanceof UnknownInputError) return 'unknown_input'
  if (error instanceof SeriesError) return 'series_unusable'
  if (error instanceof QuestionFault) return error.code
  return 'not_judged'
}

const blank: Omit<Judgement, 'outcome'> = {
  refusalCode: null, reason: null, classes: [], band: null, carriedBand: null, carriedNote: null, isAccepted: false, acceptedBy: null, slip: null, slipValues: [], pointsMilli: 0, trace: [], notes: [],
}

const refused = (refusalCode: string, reason: string): Judgement => ({ ...blank, outcome: 'refused', refusalCode, reason })

function judged(question: StepQuestion, answer: ReadAnswer): Judgement {
  if (question.choice) return judgedChoice(question.choice, question.maxMilli, answer, blank)
  const definition = findQuantity(question.quantity)
  if (!definition) return refused('unknown_quantity', `There is no quantity ${question.quantity}.`)
  const unit = checkedUnit(definition, question)
  const { outcome, way } = referenceOf(definition, question, question.inputs)
  const carried = withCarried(definition, question)
  const carriedNote = carried.notes.length > 0 ? carried.notes.join(' ') : null
  const trace = definition.trace(question.inputs, way.constants, way.variant, way.formulae)
  const notes = 'notes' in outcome ? outcome.notes ?? [] : []

  if (outcome.is === 'class') return judgedClass(definition, question, answer, carried, { ...blank, outcome: 'class', carriedNote, trace, notes })
  if (outcome.is !== 'value') return judgedWord(definition, question, answer, unit, carried, { ...blank, outcome: outcome.is, reason: outcome.why, carriedNote, trace, notes })
  return judgedValue(definition, question, answer, unit, outcome.value, carried, { ...blank, outcome: 'value', carriedNote, trace, notes })
}

/** @throws {QuestionFault} */
function checkedUnit(definition: QuantityDefinition, question: StepQuestion): Unit {
  const unit = findUnit(question.unit)
  if (!unit || !isCommensurable(unit, getUnit(definition.unit))) throw new QuestionFault('unit_invalid', `The ${definition.name} cannot be asked in ${question.unit}.`)
  if (!(Number.isInteger(question.digits) && question.digits >= 1 && question.digits <= 15)) throw new QuestionFault('digits_invalid', `Cannot ask for ${question.digits} digits.`)
  return unit
}

function judgedValue(definition: QuantityDefinition, question: StepQuestion, answer: ReadAnswer, unit: Unit, center: number, carried: CarriedInputs, base: Judgement): Judgement {
  const band = makeBand(definition, question, question.inputs, center, unit)
  const carriedBand = carried.inputs && bandOf(definition, question, carried.inputs, unit, carried.halfUnits)
  const ranges = slipRanges(definition, question, question.inputs, center)
  const near = definition.isDirection ? onNearestTurn(answer, center, unit) : answer
  const typed = near.reading === 'ok' ? near.decimal : null
  const isExplained = typed === null || isNear(band, near) || (carriedBand && isNear(carriedBand, near))
  const slip = isExplained ? null : explainingSlip(definition, question, answer, ranges, unit)
  const acceptedBy = typed === null ? null : isIn(band, typed) ? 'band' : carriedBand && isIn(carriedBand, typed) ? 'carried' : isRuledIn(definition, question, typed, unit, ranges, answer) ? 'ruling' : null
  const isAccepted = acceptedBy !== null
  const notes = [...base.notes]
  if (acceptedBy === 'carried') notes.push(carriedWords)
  const digits = hasDigits(definition, question, answer, center, unit)
  if (isAccepted && !digits && (question.digitsMilli ?? 0) > 0) notes.push(`Right, with fewer digits than asked: ${showMilli(question.digitsMilli ?? 0, 2)} of the marks are for them.`)
  const nearMiss = !isAccepted && slip === null && question.near !== undefined && answer.reading === 'ok' && [band, ...(carriedBand ? [carriedBand] : [])].some(one => isWithinWidths(one, near, question.near?.widths ?? 1))
  if (nearMiss && (question.near?.milli ?? 0) > 0) notes.push(`A near miss: within ${question.near?.widths} half-widths of the reference.`)
  return {
    ...base,
    band, carriedBand, acceptedBy, isAccepted, notes,
    slip: slip && acceptedBy === null ? named(slip, unit, question, definition) : null,
    slipValues: ranges.map(({ slip: { key, label }, value }) => ({ key, label, value })),
    pointsMilli: earnedMilli(question, { isAccepted, hasDigits: digits, isSlip: slip !== null, isNear: nearMiss }),
  }
}

/** "None", "not reached" and "not defined" as the true answer; where the student's own earlier value leads to a number, that number counts as well. */
function judgedWord(definition: QuantityDefinition, question: StepQuestion, answer: ReadAnswer, unit: Unit, carried: CarriedInputs, base: Judgement): Judgement {
  const carriedBand = carried.inputs && bandOf(definition, question, carried.inputs, unit, carried.halfUnits)
  const near = carriedBand && definition.isDirection ? onNearestTurn(answer, carriedBand.center, unit) : answer
  const isRight = answer.reading === base.outcome
  const isCarried = !isRight && carriedBand !== null && near.reading === 'ok' && near.decimal !== null && isIn(carriedBand, near.decimal)
  return {
    ...base, carriedBand, isAccepted: isRight || isCarried, acceptedBy: isRight ? 'word' : isCarried ? 'carried' : null,
    notes: isCarried ? [...base.notes, carriedWords] : base.notes,
    pointsMilli: isRight || isCarried ? withinStep(question.maxMilli, question.maxMilli) : 0,
  }
}

/** A direction as typed, or a full turn on where that is nearer to the reference: 0° beside 359.5°, 360° beside 2°. */
function onNearestTurn(answer: ReadAnswer, center: number, unit: Unit): ReadAnswer {
  const typed = answer.decimal === null || unit.code !== 'deg' ? null : fromDecimal(answer.decimal)
  if (!typed || answer.valueSi === null) return answer
  const turn = center - answer.valueSi > fullTurn / 2 ? 1 : center - answer.valueSi < -fullTurn / 2 ? -1 : 0
  return turn === 0 ? answer : { ...answer, decimal: toDecimal(plus(typed, rational(BigInt(360 * turn))), 60), valueSi: answer.valueSi + turn * fullTurn }
}

/** Whether the band explains a typed value within the rounding of its own digits: "307" for 307.1 is short of digits, and no slip. */
function isNear(band: Band, answer: ReadAnswer): boolean {
  const half = answer.halfUnitSi ?? 0
  return answer.decimal !== null && (isIn(band, answer.decimal) || (answer.valueSi !== null && answer.valueSi >= band.low - half && answer.valueSi <= band.high + half))
}

/** Whether the digits asked are there: by their place for a temperature, whose zero is arbitrary, else by their number, counted in the student's favor. */
function hasDigits(definition: QuantityDefinition, question: StepQuestion, answer: ReadAnswer, center: number, unit: Unit): boolean {
  if (definition.kind === 'temperature') return (answer.halfUnitSi ?? 0) <= halfUnitAsked(definition, center, unit, question.digits) * (1 + 1e-9)
  return (answer.digits ?? 0) >= question.digits || (answer.halfUnitSi ?? Infinity) <= halfUnitAsked(definition, center, unit, question.digits) * (1 + 1e-9)
}

function isWithinWidths(band: Band, answer: ReadAnswer, widths: number): boolean {
  if (answer.valueSi === null) return false
  const away = answer.valueSi - band.center
  return Math.abs(away) <= widths * (away < 0 ? band.center - band.low : band.high - band.center) * (1 + 1e-9)
}

const isIn = (band: Band, decimal: string): boolean => liesWithin(decimal, band.lowDecimal, band.highDecimal)

function named(range: SlipRange, unit: Unit, question: StepQuestion, definition: QuantityDefinition): Judgement['slip'] {
  const inUnit = (range.value - (definition.kind === 'temperature' ? Number(unit.offset.numerator) / Number(unit.offset.denominator) : 0)) / (Number(unit.factor.numerator) / Number(unit.factor.denominator))
  const shown = formatQuantity(inUnit, question.unit, Math.max(question.digits, 3))
  return { key: range.slip.key, label: range.slip.label, sentence: sentenceOf(range, { value: shown.number, unit: shown.text.slice(shown.number.length).trim() }), value: range.value }
}

/** The band for some inputs (those that follow from the student's own earlier value, or a variant that a ruling accepted); null where they lead to no value or out of the range. */
function bandOf(definition: QuantityDefinition, question: StepQuestion, inputs: Inputs, unit: Unit, halfUnits: CarriedHalfUnits): Band | null {
  try {
    const { outcome } = referenceOf(definition, question, inputs)
    return outcome.is === 'value' ? makeBand(definition, question, inputs, outcome.value, unit, halfUnits) : null
  }
  catch (error) {
    if (error instanceof OutOfRangeError || error instanceof SeriesError || error instanceof RangeError) return null
    throw error
  }
}

/** What rulings have added to this step: a slip that counts here, an interval, or another variant. */
function isRuledIn(definition: QuantityDefinition, question: StepQuestion, typed: string, unit: Unit, ranges: readonly SlipRange[], answer: ReadAnswer): boolean {
  const isDifference = definition.kind !== 'temperature'
  return (question.accepted ?? []).some((accepted: Accepted) => {
    if (accepted.kind === 'slip') return explainingSlip(definition, question, answer, ranges.filter(range => range.slip.key === accepted.slip), unit) !== null
    if (accepted.kind === 'value') {
      if (!(accepted.lowSi <= accepted.highSi) || !Number.isFinite(accepted.highSi - accepted.lowSi)) return false
      const { lowDecimal, highDecimal } = outwardDecimals(accepted.lowSi, accepted.highSi, unit, isDifference)
      return liesWithin(typed, lowDecimal, highDecimal)
    }
    if (!definition.variants.some(variant => variant.key === accepted.variant)) return false
    // where the accepted variant does not hold, this share has no value by it
    const band = bandOf(definition, { ...question, variant: accepted.variant }, question.inputs, unit, {})
    return band !== null && isIn(band, typed)
  })
}

function judgedClass(definition: QuantityDefinition, question: StepQuestion, answer: ReadAnswer, carried: CarriedInputs, base: Judgement): Judgement {
  const classes = classesOf(definition, question, question.inputs)
  const carriedClasses = carried.inputs ? tryClasses(definition, question, carried.inputs) : []
  const typed = answer.reading === 'class' && answer.valueSi !== null ? definition.classes?.[answer.valueSi]?.key ?? null : null
  const isRight = typed !== null && classes.includes(typed)
  const isCarried = typed !== null && !isRight && carriedClasses.includes(typed)
  return {
    ...base,
    classes,
    isAccepted: isRight || isCarried,
    acceptedBy: isRight ? 'word' : isCarried ? 'carried' : null,
    notes: isCarried ? [...base.notes, carriedWords] : base.notes,
    pointsMilli: isRight || isCarried ? withinStep(question.maxMilli, question.maxMilli) : 0,
  }
}

/** Classes that accepted ways give, the convention's own first. */
function classesOf(definition: QuantityDefinition, question: StepQuestion, inputs: Inputs): string[] {
  const found: string[] = []
  for (const way of acceptedWays(definition, question.convention, question.variant)) {
    const outcome = evaluateQuantity(definition, inputs, way.constants, way.variant, way.formulae)
    if (outcome.is === 'class' && !found.includes(outcome.key)) found.push(outcome.key)
  }
  return found
}

function tryClasses(definition: QuantityDefinition, question: StepQuestion, inputs: Inputs): string[] {
  try {
    return classesOf(definition, question, inputs)
  }
  catch {
    return []
  }
}
