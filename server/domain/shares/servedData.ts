import { createHash } from 'node:crypto'
import { askedNumbers, type AskedNumber } from '#shared/schemas/askedSteps'
import type { LabBody, SupplyItem } from '#shared/schemas/lab'
import { rowsOfLeg } from './legs'
import type { ServedColumn, ServedRows } from './loadedShare'
import { metersFromText } from './units'

/** A flight as it lies in the observations: full precision, in the file's own units. */
export interface Flight {
  versionId: string
  versionNo: number
  title: string
  /** Hex. Proves every value of the version. */
  rootSha256: string
  /** What its heights are counted from: "ground", "sea level" … */
  heightDatum: string
  columns: readonly FlightColumn[]
  /** Epoch milliseconds; NaN where a row has no instant. */
  time: ArrayLike<number>
  rowCount: number
}

export interface FlightColumn {
  name: string
  quantity: string
  unit: string
  decimals: number | null
  role: 'time' | 'value' | 'quality' | 'label'
  /** NaN where a value is missing. */
  values: ArrayLike<number>
  /** One byte a row; anything but 0 is a doubt about that value. */
  flags?: ArrayLike<number>
}

/** The digits in which a value is served: fixed by the column, else the shortest that give the number back. */
export function servedText(value: number, decimals: number | null): string {
  if (Number.isNaN(value)) return ''
  const text = decimals === null ? String(value) : value.toFixed(decimals)
  return Number(text) === 0 ? text.replace('-', '') : text
}

/** Quantities that some step takes from the share. */
export function neededQuantities(body: LabBody): string[] {
  const needed = new Set<string>()
  for (const step of askedNumbers(body)) for (const source of Object.values(step.inputs)) if (source.from === 'share' && source.read !== 'lowBound' && source.read !== 'highBound') needed.add(source.column)
  return [...needed]
}

/**
 * The columns a student gets: what was measured. A column that already holds what a step asks for is left out, unless a step takes it as an input,
 * and so is what no quantity names.
 */
function isServed(column: FlightColumn, body: LabBody, needed: readonly string[]): boolean {
  if (column.role !== 'value' || column.quantity === 'other') return false
  return needed.includes(column.quantity) || !askedNumbers(body).some(step => step.quantity === column.quantity)
}

/** The first column of a quantity is the one that steps use; a second sensor's stays beside it. */
export function columnOf<Column extends { quantity: string }>(rows: { columns: readonly Column[] }, quantity: string): Column | undefined {
  return rows.columns.find(column => column.quantity === quantity)
}

/** The columns that a student gets. What only own readings are compared with stays with the reference, or the readings would stand in the data. */
export const shownColumns = <Column extends { isWithheld?: true }>(rows: { columns: readonly Column[] }): Column[] => rows.columns.filter(column => !column.isWithheld)

function isWithheld(quantity: string, body: LabBody): boolean {
  const takes = (step: AskedNumber) => Object.values(step.inputs).some(source => source.from === 'share' && source.column === quantity)
  const steps = askedNumbers(body)
  return quantity !== 'height' && steps.some(step => step.kind === 'reading' && takes(step)) && !steps.some(step => step.kind !== 'reading' && takes(step))
}

/** A flight with the digits in which it is served: the same for every share that is drawn from it. */
export interface ServedFlight {
  columns: readonly ServedColumn[]
  /** Served heights in meters; null where there is none. */
  heights: readonly (number | null)[]
  /** Whether a row has every value that a step needs, none of them flagged. */
  isWhole: (row: number) => boolean
  times: readonly string[]
  count: number
}

export function serveFlight(flight: Flight, body: LabBody): ServedFlight {
  const needed = neededQuantities(body)
  const columns = flight.columns.filter(column => isServed(column, body, needed)).map(column => ({ ...serveColumn(column, flight.rowCount), ...(isWithheld(column.quantity, body) ? { isWithheld: true as const } : {}) }))
  const height = columnOf({ columns }, 'height')
  const neededColumns = needed.flatMap(quantity => columnOf({ columns }, quantity) ?? [])
  const flags = flight.columns.filter(column => neededColumns.some(needs => needs.name === column.name)).map(column => column.flags)
  return {
    columns, count: flight.rowCount,
    heights: height ? height.texts.map(text => metersFromText(text, height.unit)) : new Array<null>(flight.rowCount).fill(null),
    isWhole: row => neededColumns.length === needed.length && neededColumns.every(column => column.values[row] !== null) && flags.every(of => !of?.[row]),
    times: Array.from({ length: flight.rowCount }, (_, row) => instantText(flight.time[row])),
  }
}

/**
 * The rows as one share is served, and which of them its steps use: those of the leg whose height lies in the layer,
 * both bounds included, and that have every value a step needs, none of them flagged.
 */
export function serveRows(flight: ServedFlight, item: Pick<SupplyItem, 'leg' | 'lowM' | 'highM'>): ServedRows {
  const inLeg = rowsOfLeg(flight.heights, item.leg)
  const use = flight.heights.map((meters, row) => inLeg[row] === true && meters !== null && meters >= item.lowM && meters <= item.highM && flight.isWhole(row))
  return { columns: flight.columns, use, times: flight.times, count: flight.count }
}

function serveColumn(column: FlightColumn, count: number): ServedColumn {
  const texts = Array.from({ length: count }, (_, row) => servedText(column.values[row] ?? Number.NaN, column.decimals))
  return { name: column.name, quantity: column.quantity, unit: column.unit, decimals: column.decimals, texts, values: texts.map(text => text === '' ? null : Number(text)) }
}

function instantText(at: number | undefined): string {
  return at === undefined || Number.isNaN(at) ? '' : new Date(at).toISOString().replace('.000Z', 'Z')
}

/** The file that a student takes: a head of comment lines, names with units, then every row with the digits that the reference computes from. */
export function csvOf(head: readonly string[], rows: ServedRows): string {
  const comments = head.flatMap(line => line.split(/[\r\n]+/)).map(line => `# ${line}`.trimEnd())
  const hasTimes = rows.times.some(time => time !== '')
  const names = ['row', ...(hasTimes ? ['time_utc'] : []), ...shownColumns(rows).map(column => `${column.name} [${column.unit}]`), 'use']
  const lines = Array.from({ length: rows.count }, (_, row) => [
    String(row + 1), ...(hasTimes ? [rows.times[row] ?? ''] : []), ...shownColumns(rows).map(column => column.texts[row] ?? ''), rows.use[row] ? '1' : '0',
  ].join(','))
  return [...comments, names.map(nameCell).join(','), ...lines, ''].join('\n')
}

/** A column's name as one cell that no spreadsheet takes for a formula. */
function nameCell(name: string): string {
  const safe = /^[=+\-@\t\r]/.test(name) ? `'${name}` : name
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
}

export const sha256Hex = (bytes: string): string => createHash('sha256').update(bytes).digest('hex')
