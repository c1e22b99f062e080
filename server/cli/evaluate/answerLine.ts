import { judgeStep } from '#shared/marking/judge'
import { formulaeOf, taughtVariant } from '#shared/marking/alternatives'
import type { Judgement, StepQuestion } from '#shared/marking/types'
import { conventions, defaultConvention, findConvention } from '#shared/thermo/conventions/index'
import type { Convention } from '#shared/thermo/convention'
import type { Inputs, InputValue, QuantityDefinition } from '#shared/thermo/definition'
import { MissingInputError, OutOfRangeError, SeriesError, UnknownInputError } from '#shared/thermo/errors'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity, quantities } from '#shared/thermo/registry'
import { fromDecimal, fromDouble, toDouble } from '#shared/numerics/rational'
import { describeDimension } from '#shared/units/dimension'
import { readClass } from '#shared/units/readClass'
import { plainText } from '#shared/units/plainText'
import { readQuantity } from '#shared/units/readQuantity'
import { readUnit } from '#shared/units/readUnit'
import { CorrelationError } from '#shared/thermo/uncertainty/propagate'
import { NoDerivativeError } from '#shared/thermo/uncertainty/budget'
import { findUnit, fromSi, getUnit, isCommensurable, toSi, type Unit } from '#shared/units/ucum'
import type { AnswerLine, Json } from './json'
import { Refusal } from './refusal'
import { uncertaintyOf } from './uncertaintyOf'

const longestLine = 4_000_000
const longestSeries = 200_000

/** One line of stdin to one of stdout. Never throws. */
export function answerLine(line: string, wants: { trace: boolean, judge: boolean }): AnswerLine {
  let id: Json = null
  try {
    if (line.length > longestLine) throw new Refusal('too_long', `a line holds at most ${longestLine} characters`)
    const question = parse(line)
    id = isJson(question.id) ? question.id : null
    const definition = definitionOf(question)
    const convention = conventionOf(question)
    const variant = variantOf(question, definition)
    const unit = unitOf(question, definition)
    const inputs = inputsOf(question, definition)
    return { id, ...(wants.judge ? judge(question, definition, convention, variant, unit, inputs) : { ...value(definition, convention, variant, unit, inputs, wants.trace), ...withUncertainty(question, definition, convention, variant, unit, inputs) }) }
  }
  catch (error) {
    return { id, error: described(error) }
  }
}

function described(error: unknown): Json {
  if (error instanceof Refusal) return { code: error.code, detail: error.message, ...(error.input === undefined ? {} : { input: error.input }) }
  if (error instanceof MissingInputError) return { code: 'missing_input', detail: error.message, input: error.input }
  if (error instanceof UnknownInputError) return { code: 'unknown_input', detail: error.message, input: error.input }
  if (error instanceof OutOfRangeError) return { code: 'out_of_range', detail: error.message, input: error.input }
  if (error instanceof SeriesError) return { code: 'series_unusable', detail: error.message, input: error.input }
  if (error instanceof CorrelationError) return { code: 'correlation_impossible', detail: error.message }
  if (error instanceof NoDerivativeError) return { code: 'no_derivative', detail: error.message }
  return { code: 'not_evaluated', detail: error instanceof Error ? error.message : String(error) }
}

type Fields = Readonly<Record<string, unknown>>
const isRecord = (value: unknown): value is Fields => typeof value === 'object' && value !== null && !Array.isArray(value)
const isJson = (value: unknown): value is Json => value !== undefined

function parse(line: string): Fields {
  let question: unknown
  try {
    question = JSON.parse(line)
  }
  catch {
    throw new Refusal('bad_json', 'the line is not JSON')
  }
  if (!isRecord(question)) throw new Refusal('bad_question', 'a question is a JSON object')
  return question
}

function definitionOf(question: Fields): QuantityDefinition {
  if (typeof question.quantity !== 'string') throw new Refusal('bad_question', 'quantity is a text')
  const definition = findQuantity(question.quantity)
  if (!definition) throw new Refusal('unknown_quantity', `there is no quantity ${question.quantity.slice(0, 80)}; --list names them`)
  return definition
}

function conventionOf(question: Fields): Convention {
  if (question.convention === undefined || question.convention === null) return defaultConvention
  const convention = typeof question.convention === 'string' ? findConvention(question.convention) : null
  if (!convention) throw new Refusal('unknown_convention', `conventions are ${conventions.map(one => one.key).join(', ')}`)
  return convention
}

function variantOf(question: Fields, definition: QuantityDefinition): string | undefined {
  if (question.variant === undefined || question.variant === null) return undefined
  const variant = definition.variants.find(one => one.key === question.variant)
  if (!variant) throw new Refusal('unknown_variant', `variants of ${definition.key} are ${definition.variants.map(one => one.key).join(', ')}`)
  return variant.key
}

function unitOf(question: Fields, definition: QuantityDefinition): Unit {
  if (question.unit === undefined || question.unit === null) return getUnit(definition.shownUnit)
  return commensurable(question.unit, definition.unit, undefined)
}

function commensurable(code: unknown, like: string, input: string | undefined): Unit {
  if (typeof code !== 'string') throw new Refusal('bad_unit', 'a unit is a text, its UCUM code', input)
  // UCUM codes; and what people write (degC, mb), where it is no code
  const written = findUnit(code) === null && code.length <= 60 ? readUnit(plainText(code), getUnit(like)) : null
  const unit = written?.ok ? written.unit : findUnit(code)
  if (!unit) throw new Refusal('unknown_unit', `${code.slice(0, 60)} is not a unit that is known here`, input)
  const wanted = getUnit(like)
  if (!isCommensurable(unit, wanted)) throw new Refusal('wrong_dimension', `${code} is ${describeDimension(unit.dimension)}; ${describeDimension(wanted.dimension)} is needed, such as ${like}`, input)
  return unit
}

function inputsOf(question: Fields, definition: QuantityDefinition): Inputs {
  const given = question.inputs ?? {}
  if (!isRecord(given)) throw new Refusal('bad_question', 'inputs is an object of {"value","unit"}')
  const inputs: Record<string, InputValue> = {}
  for (const [name, one] of Object.entries(given)) {
    const input = definition.inputs.find(each => each.name === name)
    if (!input) throw new UnknownInputError(name, definition.inputs.map(each => each.name))
    if (!isRecord(one)) throw new Refusal('bad_input', 'an input is {"value","unit"}', name)
    const unit = commensurable(one.unit ?? (input.unit === '1' ? '1' : undefined), input.unit, name)
    const isDifference = input.kind !== 'temperature'
    const convert = (raw: unknown): number => inSi(raw, unit, input.unit, isDifference, name)
    if (Array.isArray(one.value)) {
      if (one.value.length > longestSeries) throw new Refusal('too_long', `a series holds at most ${longestSeries} values`, name)
      inputs[name] = one.value.map(convert)
    }
    else inputs[name] = convert(one.value)
  }
  return inputs
}

/** The decimal that a person wrote, not the double that it became: 15.1 °C is exactly 288.25 K before it is rounded once. */
const decimalOf = (raw: number) => fromDecimal(String(raw)) ?? fromDouble(raw)

function value(definition: QuantityDefinition, convention: Convention, variant: string | undefined, unit: Unit, inputs: Inputs, withTrace: boolean): AnswerLine {
  const taught = taughtVariant(definition, convention, variant)
  const outcome = evaluateQuantity(definition, inputs, convention.constants, taught, formulaeOf(convention))
  const trace = withTrace ? { trace: definition.trace(inputs, convention.constants, taught, formulaeOf(convention)).map(step => ({ ...step })) } : {}
  const notes = 'notes' in outcome && outcome.notes && outcome.notes.length > 0 ? { notes: outcome.notes } : {}
  if (outcome.is === 'class') return { value: outcome.key, unit: '1', ...notes, ...trace }
  if (outcome.is !== 'value') return { value: outcome.is.replace('_', ' '), unit: unit.code, ...notes, ...trace }
  return { value: inUnit(outcome.value, unit, definition), unit: unit.code, ...notes, ...trace }
}

function inSi(raw: unknown, unit: Unit, si: string, isDifference: boolean, name: string): number {
  if (typeof raw !== 'number' || !Number.isFinite(raw)) throw new Refusal('bad_input', `${JSON.stringify(raw)?.slice(0, 40) ?? 'nothing'} is not a number`, name)
  return unit.code === si ? raw : toDouble(toSi(decimalOf(raw), unit, isDifference))
}

function withUncertainty(question: Fields, definition: QuantityDefinition, convention: Convention, variant: string | undefined, unit: Unit, inputs: Inputs): AnswerLine {
  const uncertainty = uncertaintyOf(question, {
    definition, convention, variant: taughtVariant(definition, convention, variant), unit, inputs,
    asDifference: (raw, code, name) => {
      const si = definition.inputs.find(one => one.name === name)?.unit ?? '1'
      return inSi(raw, commensurable(code ?? (si === '1' ? '1' : undefined), si, name), si, true, name)
    },
  })
  return uncertainty === null ? {} : { uncertainty }
}

function inUnit(si: number, unit: Unit, definition: QuantityDefinition): number {
  return unit.code === definition.unit ? si : toDouble(fromSi(fromDouble(si), unit, definition.kind !== 'temperature'))
}

function judge(question: Fields, definition: QuantityDefinition, convention: Convention, variant: string | undefined, unit: Unit, inputs: Inputs): AnswerLine {
  if (typeof question.answer !== 'string') throw new Refusal('bad_question', 'with --judge a question has an answer, a text')
  // says which input is to blame, where one is
  evaluateQuantity(definition, inputs, convention.constants, taughtVariant(definition, convention, variant), formulaeOf(convention))
  const step: StepQuestion = { quantity: definition.key, ...(variant === undefined ? {} : { variant }), inputs, convention, granted: {}, digits: 3, unit: unit.code, maxMilli: 1000 }
  const answer = definition.classes ? readClass(question.answer, definition.classes) : readQuantity(question.answer, { unit: unit.code, kind: definition.kind, quantityName: definition.name })
  const judgement: Judgement = judgeStep(step, answer)
  if (judgement.outcome === 'refused') throw new Refusal(judgement.refusalCode ?? 'not_judged', judgement.reason ?? 'it cannot be judged')
  const { band } = judgement
  return {
    accepted: judgement.isAccepted,
    band: band === null ? null : [Number(band.lowDecimal), Number(band.highDecimal)],
    unit: unit.code,
    slip: judgement.slip?.key ?? null,
    ...(['ok', 'class', 'none', 'not_reached', 'not_defined'].includes(answer.reading) ? {} : { reading: answer.reading, message: answer.message }),
  }
}

/** Every quantity with its inputs, units, variants and slips, for `--list`. */
export function listQuantities(): Json {
  return quantities.map(definition => ({
    quantity: definition.key,
    name: definition.name,
    symbol: definition.symbol,
    unit: definition.shownUnit,
    kind: definition.kind,
    ask: definition.ask,
    inputs: definition.inputs.map(input => ({
      name: input.name, label: input.label, unit: input.shownUnit, unitSi: input.unit, shape: input.shape, isOptional: input.isOptional ?? false, range: [...input.range], ...(input.needs ? { least: input.needs.least } : {}),
    })),
    variants: definition.variants.map(variant => ({ key: variant.key, label: variant.label, source: variant.source.text, status: variant.source.status, validity: variant.validity, knownError: variant.knownError })),
    slips: definition.slips.map(slip => ({ key: slip.key, label: slip.label })),
    ...(definition.classes ? { classes: definition.classes.map(one => one.key) } : {}),
  }))
}
