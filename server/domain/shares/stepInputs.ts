import type { Convention } from '#shared/marking/types'
import type { AskedNumber } from '#shared/schemas/askedSteps'
import type { LabBody, SupplyItem } from '#shared/schemas/lab'
import type { InputSource } from '#shared/schemas/steps'
import type { InputDefinition, Inputs, InputValue, NumberKind } from '#shared/thermo/definition'
import { findQuantity } from '#shared/thermo/registry'
import { edgeRow, tableRow } from '../labs/rowsOfLayer'
import type { ServedColumn, ServedRows } from './loadedShare'
import { columnOf } from './servedData'
import { siFromText } from './units'

/** What a step's inputs are taken from. */
export interface InputGround {
  body: LabBody
  item: Pick<SupplyItem, 'lowM' | 'highM'>
  rows: ServedRows
  convention: Convention
  /** The true value of an earlier step, SI; null where it has none. */
  valueOf: (stepKey: string) => number | null
}

export type ResolvedInputs = { inputs: Inputs } | { missing: string, reason: string }

/** The inputs of a step in SI, from the digits that were served. A missing one is told with its reason and is never filled in. */
export function stepInputs(step: AskedNumber, ground: InputGround): ResolvedInputs {
  const definition = findQuantity(step.quantity)
  if (!definition) return { missing: 'quantity', reason: `The reference has no quantity "${step.quantity}".` }
  const inputs: Record<string, InputValue> = {}
  for (const input of definition.inputs) {
    const source = step.inputs[input.name]
    if (!source) {
      if (input.isOptional) continue
      return { missing: input.name, reason: `${input.label} is bound to nothing.` }
    }
    const value = inputValue(input, source, ground)
    if (value === null) return { missing: input.name, reason: whyMissing(input, source) }
    inputs[input.name] = value
  }
  return { inputs }
}

function inputValue(input: InputDefinition, source: InputSource, ground: InputGround): InputValue | null {
  switch (source.from) {
    case 'text': return siFromText(String(source.value), source.unit, input.kind)
    case 'constant': return ground.convention.constants[source.name] ?? null
    case 'step': return ground.valueOf(source.key)
    case 'share': return readShare(input, source, ground)
  }
}

function readShare(input: InputDefinition, source: Extract<InputSource, { from: 'share' }>, { item, rows }: InputGround): InputValue | null {
  if (source.read === 'lowBound') return siFromText(String(item.lowM), 'm', input.kind)
  if (source.read === 'highBound') return siFromText(String(item.highM), 'm', input.kind)
  const column = columnOf(rows, source.column)
  if (!column) return null
  const inSi = (row: number) => siOf(column, input.kind, row)
  if (source.read === 'lowest' || source.read === 'highest') {
    const row = edgeRow(rows, source.read)
    return row === null ? null : inSi(row)
  }
  if (source.read === 'row') {
    const row = source.row ? tableRow(rows, source.row.no, source.row.of) : null
    return row === null ? null : inSi(row)
  }
  const series = rows.use.flatMap((isUsed, row) => isUsed ? inSi(row) ?? [] : [])
  if (series.length === 0) return null
  return source.read === 'layer' ? series : series.reduce((sum, value) => sum + value, 0) / series.length
}

/** Served cells in SI, by the kind in which they are read: rows that were served never change, and a class computes on few of them. */
const inSiOf = new WeakMap<ServedColumn, Map<NumberKind, (number | null | undefined)[]>>()

function siOf(column: ServedColumn, kind: NumberKind, row: number): number | null {
  const kinds = inSiOf.get(column) ?? new Map<NumberKind, (number | null | undefined)[]>()
  const values = kinds.get(kind) ?? []
  const value = values[row] ?? siFromText(column.texts[row] ?? '', column.unit, kind)
  values[row] = value
  kinds.set(kind, values)
  inSiOf.set(column, kinds)
  return value
}

function whyMissing(input: InputDefinition, source: InputSource): string {
  if (source.from === 'step') return `${input.label} comes from an earlier step that has no value here.`
  if (source.from === 'constant') return `The convention has no constant "${source.name}".`
  return `No row of this layer and leg gives ${input.label}.`
}
