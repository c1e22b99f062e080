import { refuse } from '#shared/errors'
import type { compareBody } from '#shared/schemas/handbook'
import type { InputDefinition, Inputs, InputValue, QuantityDefinition } from '#shared/thermo/definition'
import { formatUnit } from '#shared/units/formatQuantity'
import { readQuantity } from '#shared/units/readQuantity'
import { findUnit, getUnit, isCommensurable } from '#shared/units/ucum'
import Papa from 'papaparse'
import type { z } from 'zod'

/** One line of the sheet: the inputs of the quantity and the key as it stands there; or what is wrong with it. */
export interface PastedRow { line: number, inputs: Inputs, key: string, wrong: string | null }

const mostRows = 2000

/**
 * The rows of a pasted sheet. A quantity of single numbers is asked once a row; one that takes a series is asked once, with the series down
 * the rows and its key in the first cell that has one. Rows without a key are left out (a head, an empty line).
 * @throws {DomainError} `invalid`
 */
export function pastedRows(definition: QuantityDefinition, asked: Pick<z.output<typeof compareBody>, 'pasted' | 'columns' | 'unit'>): PastedRow[] {
  const table = Papa.parse<string[]>(asked.pasted.replace(/\r\n?/g, '\n'), { skipEmptyLines: 'greedy', delimiter: asked.pasted.includes('\t') ? '\t' : '' }).data
  if (table.length > mostRows) refuse('invalid', {}, [{ path: 'pasted', message: `At most ${mostRows} rows at a time.` }])
  const keyAt = asked.columns.findIndex(column => column.holds === 'key')
  if (keyAt === -1) refuse('invalid', {}, [{ path: 'columns', message: 'Say which column holds the key values.' }])
  const missing = definition.inputs.filter(input => !input.isOptional && !asked.columns.some(column => column.holds === input.name))
  if (missing.length > 0) refuse('invalid', {}, [{ path: 'columns', message: `Say which column holds ${missing.map(input => input.label).join(', ')}.` }])
  const columns = asked.columns.flatMap((column, at) => {
    const input = definition.inputs.find(one => one.name === column.holds)
    if (!input) return []
    const unit = findUnit(column.unit)
    if (!unit || !isCommensurable(unit, getUnit(input.unit))) refuse('invalid', {}, [{ path: `columns.${at}.unit`, message: `The ${input.label} is not measured in ${formatUnit(column.unit)}.` }])
    return [{ at, input, unit: column.unit }]
  })
  const cell = (row: readonly string[], at: number) => (row[at] ?? '').trim()
  const isHead = (row: readonly string[]) => !/\d/.test(cell(row, keyAt))
  const withUnit = (text: string) => (asked.unit === '1' || /[a-z°%]/i.test(text) ? text : `${text} ${formatUnit(asked.unit)}`)

  if (!definition.inputs.some(input => input.shape === 'series')) {
    return table.flatMap((row, at) => {
      if (isHead(row)) return []
      const { inputs, wrong } = inputsOf(columns.map(column => ({ ...column, texts: [cell(row, column.at)] })))
      return [{ line: at + 1, inputs, key: withUnit(cell(row, keyAt)), wrong }]
    })
  }
  const body = table.filter((row, at) => !(at === 0 && columns.every(column => !/\d/.test(cell(row, column.at)))))
  const key = body.map(row => cell(row, keyAt)).find(text => /\d/.test(text))
  if (key === undefined) return []
  const { inputs, wrong } = inputsOf(columns.map(column => ({ ...column, texts: body.map(row => cell(row, column.at)).filter(text => text !== '') })))
  return [{ line: 1, inputs, key: withUnit(key), wrong }]
}

function inputsOf(columns: readonly { input: InputDefinition, unit: string, texts: readonly string[] }[]): { inputs: Inputs, wrong: string | null } {
  const inputs: Record<string, InputValue> = {}
  for (const { input, unit, texts } of columns) {
    const values: number[] = []
    for (const text of texts) {
      if (text === '' && input.isOptional) continue
      const suffix = unit === '1' || /[a-z°%]/i.test(text) ? '' : ` ${formatUnit(unit)}`
      const read = readQuantity(`${text}${suffix}`, { unit: input.shownUnit, kind: input.kind, quantityName: input.label })
      if (read.reading !== 'ok' || read.valueSi === null) return { inputs, wrong: `${input.label}: ${read.reading === 'empty' ? 'nothing stands there.' : read.message}` }
      values.push(read.valueSi)
    }
    const [first] = values
    if (first === undefined) continue
    inputs[input.name] = input.shape === 'series' ? values : first
  }
  return { inputs, wrong: null }
}
