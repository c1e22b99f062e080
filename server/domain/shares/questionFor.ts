import { refuse } from '#shared/errors'
import { carriedFrom } from '#shared/marking/graph'
import { judgeStep } from '#shared/marking/judge'
import type { Granted, ReadAnswer, StepQuestion } from '#shared/marking/types'
import { askedSteps, type AskedNumber, type AskedStep } from '#shared/schemas/askedSteps'
import type { InputDefinition } from '#shared/thermo/definition'
import { findQuantity } from '#shared/thermo/registry'
import type { EarlierReadings, LoadedShare } from './loadedShare'
import { stepInputs, type InputGround } from './stepInputs'
import { siWidth } from './units'

/** Asked for the reference's value alone. */
const nothing: ReadAnswer = { typed: '', reading: 'empty', valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null, message: '' }

export type ShareGround = Pick<LoadedShare, 'rows' | 'convention'> & { share: { item: LoadedShare['share']['item'] | { lowM: number, highM: number } }, revision: { body: LoadedShare['revision']['body'] } }
export type AskedQuestion = { question: StepQuestion } | { missing: string, reason: string }

/**
 * The question that a step puts to a share: inputs from the served digits, and beside the true value of each earlier step
 * the student's own reading of it, where that can be carried.
 */
export function questionFor(loaded: ShareGround, stepKey: string, earlier: EarlierReadings): StepQuestion {
  const asked = askedQuestion(loaded, stepKey, earlier)
  return 'question' in asked ? asked.question : refuse('share_degenerate', { step: stepKey, reason: asked.reason })
}

/** As `questionFor`, with a missing input told and not refused: for the check before posting. */
export function askedQuestion(loaded: ShareGround, stepKey: string, earlier: EarlierReadings): AskedQuestion {
  const step = askedSteps(loaded.revision.body).find(entry => entry.key === stepKey)
  if (step?.kind === 'choice') return { question: choiceQuestion(step, loaded.convention) }
  const definition = step ? findQuantity(step.quantity) : undefined
  if (!step || !definition) return { missing: 'quantity', reason: `There is no step "${stepKey}" with a quantity of the reference.` }
  const resolved = stepInputs(step, groundOf(loaded))
  if (!('inputs' in resolved)) return resolved
  const own = ownReadings(step, definition.inputs, earlier, loaded.revision.body)
  const carried = carriedInputs(step, definition.inputs.filter(input => own[input.name] === undefined), earlier)
  const ownRead = Object.fromEntries(Object.entries(own).flatMap(([name, read]) => read.halfUnitSi > 0 ? [[name, read.halfUnitSi]] : []))
  const readOff = Object.fromEntries(Object.entries(step.divisions).map(([name, { division, unit }]) => [name, siWidth(division, unit) / 2]))
  return {
    question: {
      quantity: step.quantity, ...(step.variant === null ? {} : { variant: step.variant }), inputs: { ...resolved.inputs, ...Object.fromEntries(Object.entries(own).map(([name, read]) => [name, read.valueSi])) }, convention: loaded.convention,
      granted: grantedSi(step), digits: step.digits, unit: step.unit, maxMilli: step.pointsMilli, slipMilli: step.slipMilli,
      ...(step.digitsMilli > 0 ? { digitsMilli: step.digitsMilli } : {}), ...(step.near ? { near: step.near } : {}),
      ...(Object.keys(readOff).length > 0 ? { readOff } : {}), ...(Object.keys(ownRead).length > 0 ? { ownRead } : {}),
      ...(step.accuracy ? { accuracy: { stationSi: siWidth(step.accuracy.station, step.unit), ownSi: siWidth(step.accuracy.own, step.unit) } } : {}),
      ...(Object.keys(carried).length > 0 ? { carried } : {}),
    },
  }
}

function groundOf(loaded: ShareGround): InputGround {
  const known = new Map<string, number | null>()
  const ground: InputGround = {
    body: loaded.revision.body, item: loaded.share.item, rows: loaded.rows, convention: loaded.convention,
    valueOf(key) {
      const value = known.get(key)
      if (value !== undefined) return value
      const asked = askedQuestion(loaded, key, {})
      const found = 'question' in asked ? judgeStep(asked.question, nothing).band?.center ?? null : null
      known.set(key, found)
      return found
    },
  }
  return ground
}

function choiceQuestion(step: Extract<AskedStep, { kind: 'choice' }>, convention: StepQuestion['convention']): StepQuestion {
  const right = step.options.filter(option => option.isRight)
  return {
    quantity: 'choice', inputs: {}, convention, granted: {}, digits: 1, unit: '1', maxMilli: step.pointsMilli,
    choice: { options: step.options.map(option => ({ key: option.key, label: option.text })), right: right.map(option => option.key), why: right.map(option => option.why === '' ? option.text : `${option.text}: ${option.why}`) },
  }
}

/** Inputs that the student read on an instrument of their own: what they read stands in place of the station's value, where it can be. */
function ownReadings(step: AskedNumber, inputs: readonly InputDefinition[], earlier: EarlierReadings, body: LoadedShare['revision']['body']): Record<string, { valueSi: number, halfUnitSi: number }> {
  const readings = new Set(body.steps.flatMap(entry => entry.kind === 'reading' ? [entry.key] : []))
  return Object.fromEntries(inputs.flatMap((input) => {
    const source = step.inputs[input.name]
    const carried = source?.from === 'step' && readings.has(source.key) ? carriedFrom(input, earlier[source.key]) : null
    return carried && 'valueSi' in carried ? [[input.name, carried]] : []
  }))
}

function grantedSi(step: AskedNumber): Granted {
  return {
    ...(step.granted.absolute === undefined ? {} : { absoluteSi: siWidth(step.granted.absolute, step.unit) }),
    ...(step.granted.relative === undefined ? {} : { relative: step.granted.relative }),
  }
}

/** A blank or unread earlier step carries nothing: the later one is judged on the true value, and nothing is lost twice. */
function carriedInputs(step: AskedNumber, inputs: readonly InputDefinition[], earlier: EarlierReadings): NonNullable<StepQuestion['carried']> {
  return Object.fromEntries(inputs.flatMap((input) => {
    const source = step.inputs[input.name]
    const carried = source?.from === 'step' ? carriedFrom(input, earlier[source.key]) : null
    return carried === null ? [] : [[input.name, carried]]
  }))
}
