import { setImmediate as otherRequests } from 'node:timers/promises'
import { refuse } from '#shared/errors'
import { acceptedWays, formulaeOf, type Way } from '#shared/marking/alternatives'
import { judgeStep } from '#shared/marking/judge'
import type { Convention } from '#shared/marking/types'
import type { compareBody, CompareCause, CompareReply } from '#shared/schemas/handbook'
import type { Inputs, QuantityDefinition } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity } from '#shared/thermo/registry'
import { formatQuantity, formatUnit } from '#shared/units/formatQuantity'
import { readQuantity, type ReadValue } from '#shared/units/readQuantity'
import { findUnit, getUnit, isCommensurable } from '#shared/units/ucum'
import type { z } from 'zod'
import type { Read } from '../../db/writer'
import { conventionOfCourse } from '../labs/conventions'
import { inUnit } from './inWords'
import { pastedRows, type PastedRow } from './pastedRows'

type Row = CompareReply['rows'][number]

const words: Record<CompareCause, string> = {
  same: 'the same to the digits that stand in the sheet',
  variant: 'another formula',
  constant: 'other constants',
  slip: 'a known slip',
  none: 'no cause that is known here',
  not_read: 'not read',
  not_computed: 'not computed',
}

/** The same by the convention that the course teaches with now. @throws {DomainError} `not_found`, `invalid` */
export async function comparePasted(read: Read, courseId: string, asked: z.output<typeof compareBody>): Promise<CompareReply> {
  return compareBeside((await conventionOfCourse(read, courseId)).convention, asked, otherRequests)
}

/**
 * A key column from a sheet beside the reference, by a convention: where it departs, and by which cause. Constants and formulae that the convention accepts are
 * looked at first, then every other formula of the quantity, then its slips; a cause is named where it gives the very digits of the sheet.
 * `between` is awaited before each row: two thousand rows of a moist quantity take many seconds, in which others hand in.
 * @throws {DomainError} `not_found`, `invalid`
 */
export async function compareBeside(convention: Convention, asked: z.output<typeof compareBody>, between: () => Promise<unknown> = async () => {}): Promise<CompareReply> {
  const definition = findQuantity(asked.quantity)
  const unit = findUnit(asked.unit)
  if (!definition) refuse('not_found')
  if (!unit || !isCommensurable(unit, getUnit(definition.unit))) refuse('invalid', {}, [{ path: 'unit', message: `The ${definition.name} is not measured in ${formatUnit(asked.unit)}.` }])
  if (asked.variant !== '' && !definition.variants.some(one => one.key === asked.variant)) refuse('not_found')
  const pasted = pastedRows(definition, asked)
  if (pasted.length === 0) refuse('invalid', {}, [{ path: 'pasted', message: 'No row with a number in the key column was found.' }])
  const rows: Row[] = []
  for (const row of pasted) {
    await between()
    rows.push(comparedRow(definition, convention, asked.variant === '' ? undefined : asked.variant, asked.unit, row))
  }
  const causes = Object.keys(words) as CompareCause[]
  return {
    quantity: definition.name, unit: formatUnit(asked.unit), convention: convention.title, rows,
    causes: causes.map(cause => ({ cause, words: words[cause], rows: rows.filter(row => row.cause === cause).length })).filter(one => one.rows > 0),
  }
}

function comparedRow(definition: QuantityDefinition, convention: Convention, pinned: string | undefined, unit: string, row: PastedRow): Row {
  const told = (cause: CompareCause, said: string, reference = '', difference = ''): Row => ({ line: row.line, key: row.key, reference, difference, cause, words: said })
  if (row.wrong !== null) return told('not_read', row.wrong)
  const answer = readQuantity(row.key, { unit, kind: definition.kind, quantityName: definition.name })
  if (answer.reading !== 'ok' || answer.valueSi === null) return told('not_read', answer.message)
  const [own, ...others] = waysOf(definition, convention, pinned)
  if (!own) return told('not_computed', 'the quantity has no formula')
  let right: number
  try {
    const outcome = evaluateQuantity(definition, row.inputs, own.constants, own.variant, own.formulae)
    if (outcome.is !== 'value') return told('not_computed', 'why' in outcome ? outcome.why : 'the reference gives a class here')
    right = outcome.value
  }
  catch (error) {
    return told('not_computed', error instanceof Error ? error.message : 'it cannot be computed')
  }
  const isDifference = definition.kind !== 'temperature'
  const digits = Math.max(4, (answer.digits ?? 3) + 1)
  const reference = formatQuantity(inUnit(right, unit, isDifference), unit, digits).number
  const difference = formatQuantity(inUnit(answer.valueSi, unit, isDifference) - inUnit(right, unit, isDifference), unit, 2).number
  const full = (cause: CompareCause, said: string) => told(cause, said, reference, difference)
  if (agrees(answer, right)) return full('same', words.same)
  const way = others.find((one) => {
    const value = valueBy(definition, row.inputs, one)
    return value !== null && agrees(answer, value)
  })
  if (way) return full(way.variant === own.variant && way.label !== '' && !changesFormula(way, own) ? 'constant' : 'variant', way.label)
  const judgement = judgeStep({ quantity: definition.key, ...(pinned === undefined ? {} : { variant: pinned }), inputs: row.inputs, convention, granted: {}, digits: Math.min(12, Math.max(2, answer.digits ?? 3)), unit, maxMilli: 0 }, answer)
  return judgement.slip ? full('slip', judgement.slip.label) : full('none', words.none)
}

/** The convention's own way, what it accepts, and every other formula of the quantity. */
function waysOf(definition: QuantityDefinition, convention: Convention, pinned: string | undefined): readonly Way[] {
  const accepted = acceptedWays(definition, convention, pinned)
  const seen = new Set(accepted.map(way => way.variant))
  const rest = definition.variants.filter(one => !seen.has(one.key)).map((one): Way => ({ label: one.label, constants: convention.constants, variant: one.key, formulae: formulaeOf(convention), alternative: { label: one.label } }))
  return [...accepted, ...rest]
}

const changesFormula = (way: Way, own: Way): boolean => JSON.stringify(way.formulae.variants) !== JSON.stringify(own.formulae.variants)

function valueBy(definition: QuantityDefinition, inputs: Inputs, way: Way): number | null {
  try {
    const outcome = evaluateQuantity(definition, inputs, way.constants, way.variant, way.formulae)
    return outcome.is === 'value' ? outcome.value : null
  }
  catch {
    return null
  }
}

/** Within half a unit of the last digit that stands in the sheet. */
function agrees(answer: ReadValue, value: number): boolean {
  const half = answer.halfUnitSi ?? 0
  return answer.valueSi !== null && Math.abs(answer.valueSi - value) <= half * (1 + 1e-9) + 1e-12 * Math.abs(value)
}
