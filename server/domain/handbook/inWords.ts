import { fromDouble, toDouble } from '#shared/numerics/rational'
import { constantDefinitions } from '#shared/thermo/constants'
import type { Constants, InputDefinition, TraceStep } from '#shared/thermo/definition'
import { formatQuantity, formatUnit } from '#shared/units/formatQuantity'
import { fromSi, getUnit } from '#shared/units/ucum'
import { renderInline } from '../labs/renderLabText'

/** An SI value in a unit, as a number. */
export function inUnit(si: number, unit: string, isDifference: boolean): number {
  return toDouble(fromSi(fromDouble(si), getUnit(unit), isDifference))
}

/** A value with its unit: 20.00 °C. Digits enough to tell 0.01 K apart where it is a temperature. */
export function valueWords(si: number, unit: string, kind: InputDefinition['kind'], digits = 6): string {
  return trimmed(formatQuantity(inUnit(si, unit, kind !== 'temperature'), unit, digits).text)
}

/** Without the zeros at the end of a decimal fraction: 850.000 hPa → 850 hPa. */
const trimmed = (text: string): string => text.replace(/^(−?\d+)\.(\d*?)0+(?=$|\s|×)/, (_, whole: string, rest: string) => rest === '' ? whole : `${whole}.${rest}`)

export function rangeWords(input: InputDefinition): string {
  return `${valueWords(input.range[0], input.shownUnit, input.kind, 5)} to ${valueWords(input.range[1], input.shownUnit, input.kind, 5)}`
}

export function needsWords(input: InputDefinition): string | null {
  if (input.shape === 'number') return null
  const order = input.needs?.order === 'ascending' ? ', rising' : input.needs?.order === 'descending' ? ', falling' : ', in any order'
  return `a series of at least ${input.needs?.least ?? 1}${order}`
}

/** The constants of a convention in the order of the table, those named alone where names are given. */
export function constantWords(constants: Constants, names?: readonly string[]): { name: string, symbolHtml: string, label: string, value: string }[] {
  return constantDefinitions.filter(({ name }) => constants[name] !== undefined && (names === undefined || names.includes(name)))
    .map(({ name, symbol, label, unit }) => ({ name, symbolHtml: renderInline(`$${symbol}$`), label, value: `${grouped(constants[name] ?? 0)}${unit === '1' ? '' : ` ${formatUnit(unit)}`}` }))
}

export function workedLines(steps: readonly TraceStep[]): { text: string, formulaHtml: string, filledHtml: string }[] {
  const html = (tex: string): string => tex === '' ? '' : renderInline(`$\\displaystyle ${tex}$`)
  return steps.map(step => ({ text: step.text, formulaHtml: html(step.formula), filledHtml: html(step.filled) }))
}

/** Groups of three from five digits on, with U+202F: 2 501 000. */
export function grouped(value: number): string {
  const [whole = '', decimals] = String(value).replace('-', '−').split('.')
  return `${whole.length >= 5 ? whole.replace(/\B(?=(\d{3})+$)/g, '\u202F') : whole}${decimals === undefined ? '' : `.${decimals}`}`
}
