import { refuse } from '#shared/errors'
import { formulaeOf, taughtVariant } from '#shared/marking/alternatives'
import { judgeStep } from '#shared/marking/judge'
import type { Convention, Judgement } from '#shared/marking/types'
import type { computeBody, ComputeReply } from '#shared/schemas/handbook'
import { findConvention } from '#shared/thermo/conventions/index'
import type { Inputs, QuantityDefinition } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity } from '#shared/thermo/registry'
import { formatQuantity, formatUnit } from '#shared/units/formatQuantity'
import { readQuantity } from '#shared/units/readQuantity'
import { findUnit, getUnit, isCommensurable } from '#shared/units/ucum'
import type { z } from 'zod'
import { curveOf } from './curveOf'
import { inUnit, workedLines } from './inWords'
import { readTypedInputs } from './readTypedInputs'

/** Digits of the calculator: a student's answer is asked in fewer. */
const shownDigits = 6
const askedDigits = 3

/**
 * The calculator of a handbook page: inputs as typed, the value with its working, what a step with three digits would accept, and a curve.
 * Bands and slips are for staff (`seesBands`): a student's are named after release, on their own work.
 * @throws {DomainError} `not_found` for a quantity, convention, variant or unit that there is not
 */
export function computeQuantity(key: string, asked: z.output<typeof computeBody>, { isStaff, isHeld }: { isStaff: boolean, isHeld: boolean }): ComputeReply {
  const definition = findQuantity(key)
  const convention = findConvention(asked.convention)
  const unit = findUnit(asked.unit)
  if (!definition || !convention || !unit || !isCommensurable(unit, getUnit(definition.unit))) refuse('not_found')
  const pinned = asked.variant === '' ? undefined : asked.variant
  if (pinned !== undefined && !definition.variants.some(one => one.key === pinned)) refuse('not_found')
  const { inputs, read, isWhole } = readTypedInputs(definition, asked.inputs)
  const empty: ComputeReply = { read, refused: null, outcome: null, band: null, notes: [], lines: [], slips: [], curve: null }
  if (!isWhole) return empty
  if (isHeld && !isExample(definition, inputs)) return { ...empty, refused: held }
  const refusal = whyNot(definition, convention, pinned, inputs)
  if (refusal !== null) return { ...empty, refused: refusal }
  const nothing = readQuantity('', { unit: asked.unit, kind: definition.kind, quantityName: definition.name })
  const judgement = judgeStep({ quantity: key, ...(pinned === undefined ? {} : { variant: pinned }), inputs, convention, granted: {}, digits: askedDigits, unit: asked.unit, maxMilli: 0 }, nothing)
  if (judgement.outcome === 'refused') return { ...empty, refused: judgement.reason }
  const show = (si: number, digits = shownDigits) => formatQuantity(inUnit(si, asked.unit, definition.kind !== 'temperature'), asked.unit, digits).text
  return {
    ...empty,
    outcome: { words: outcomeWords(definition, judgement, show), why: judgement.outcome === 'value' || judgement.outcome === 'class' ? null : judgement.reason },
    band: judgement.band && isStaff ? { low: show(judgement.band.low), high: show(judgement.band.high), unit: formatUnit(asked.unit) } : null,
    notes: [...judgement.notes],
    lines: workedLines(judgement.trace),
    slips: !isStaff ? [] : judgement.slipValues.map(slip => ({ label: slip.label, words: show(slip.value, 5) })),
    curve: asked.along === '' ? null : curveOf(definition, convention, pinned, inputs, asked.along, asked.unit),
  }
}

const held = 'a lab of yours asks for this, and its marks are not released yet. Until then the worked example stands here'

/** The definition's own example, as far as its printed digits tell. */
function isExample(definition: QuantityDefinition, inputs: Inputs): boolean {
  const isClose = (a: number | undefined, b: number) => a !== undefined && Math.abs(a - b) <= 1e-5 * Math.max(Math.abs(a), Math.abs(b))
  return definition.inputs.every(({ name }) => {
    const example = definition.example.inputs[name], given = inputs[name]
    if (example === undefined || given === undefined) return example === given
    if (typeof example === 'number') return typeof given === 'number' && isClose(given, example)
    return typeof given !== 'number' && given.length === example.length && example.every((value, at) => isClose(given[at], value))
  })
}

/** Why it cannot be computed, in the words of the error; null where it can. */
function whyNot(definition: QuantityDefinition, convention: Convention, pinned: string | undefined, inputs: Inputs): string | null {
  try {
    evaluateQuantity(definition, inputs, convention.constants, taughtVariant(definition, convention, pinned), formulaeOf(convention))
    return null
  }
  catch (error) {
    return error instanceof Error ? error.message : 'It cannot be computed.'
  }
}

function outcomeWords(definition: QuantityDefinition, judgement: Judgement, show: (si: number) => string): string {
  if (judgement.band) return show(judgement.band.center)
  if (judgement.outcome === 'class') return judgement.classes.map(key => definition.classes?.find(one => one.key === key)?.label ?? key).join(' or ')
  return judgement.outcome.replace('_', ' ')
}
