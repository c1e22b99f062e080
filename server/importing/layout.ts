import { findMeasuredQuantity, findMeasuredUnit, type ColumnRecipe, type Recipe, type TimeRecipe } from '#shared/schemas/data'
import { Fields } from './fields'
import { rangeOf } from './quality/range'
import { readSample, type Sample, type SampleRow } from './sample'
import { guessTimes, type TimeCandidate } from './timeGuess'
import { timeReader } from './times'
import { UnreadableFile } from './unreadable'
import { readHead, unitFromText } from './words'

export interface GuessedColumn {
  name: string
  at: number
  kind: 'number' | 'text' | 'empty'
  /** The first few cells as they stand in the file. */
  samples: string[]
  /** What it could be; null for text. */
  suggestion: ColumnRecipe | null
  /** The suggestion is good enough to be taken unless a person says otherwise. */
  isTaken: boolean
  /** The head names no unit: this one is only likely. */
  isUnitOpen: boolean
}

/** What the start of a file looks like. Everything in it waits for a person's word. */
export interface Guess {
  columns: GuessedColumn[]
  times: TimeCandidate[]
  recipe: Recipe
  /** The file does not say its zone. */
  isZoneOpen: boolean
  /** First lines as they stand in the file. */
  head: string[][]
}

const wordCodes = ['NA', 'NaN', 'NAN']
const otherWordCodes = new Set(['N/A', 'n/a', 'na', 'nan', 'M', 'MM', 'null', 'None', 'missing'])
const numberCodes = new Set([-99, -99.9, -999, -999.9, -9999, -9999.9, -8888, -7999, 6999, 7999, 999, 999.9, 9999, 9999.9, 99999])

export const sampleBytes = 262_144

/** What a person has said already; the rest is guessed. */
export type SaidOfLayout = Partial<Pick<Recipe, 'delimiter' | 'decimal' | 'skipLines' | 'headerRows'>>

/** @throws {UnreadableFile} where it is no table at all, or a table without rows */
export function guessLayout(bytes: Buffer, isWhole: boolean, title: string, said: SaidOfLayout = {}): Guess {
  const sample = readSample(bytes, isWhole, said.delimiter)
  if (sample.width < 2) throw new UnreadableFile('file_wrong_delimiter', { delimiter: said.delimiter === '\t' ? 'a tab' : said.delimiter ?? ',' })
  const { head, data, skipLines } = said.skipLines === undefined && said.headerRows === undefined ? splitHead(sample) : saidHead(sample, said)
  if (data.length === 0) throw new UnreadableFile('file_header_only')
  const names = Array.from({ length: sample.width }, (_, at) => head[0]?.cells[at] ?? (head.length > 0 ? '' : `column ${at + 1}`))
  const decimal = said.decimal ?? decimalOf(data, sample.delimiter)
  const unitRow = head.slice(1).find(row => row.cells.filter(cell => unitFromText(cell) !== null).length >= 1)
  const cellsOf = (at: number) => data.map(row => row.cells[at] ?? '')
  const times = guessTimes(names.map((name, at) => ({ name, at, unit: unitRow?.cells[at] ?? '', cells: cellsOf(at).slice(0, 400) })))
  const chosen = times[0]
  const timeColumns = new Set(chosen ? refsOf(chosen.time) : [])
  const columns = names.map((name, at) => guessColumn(name, at, cellsOf(at), unitRow?.cells[at] ?? '', decimal, times, timeColumns))
  const hasHeight = columns.some(column => column.suggestion?.quantity === 'height')
  const isFlight = hasHeight || columns.some(column => column.suggestion?.quantity === 'elapsed-time') || !chosen
  const kind = isFlight ? 'flight' as const : 'station' as const
  const station = columns.find(column => column.kind === 'text' && /^(station|station_?name|station_?id|site|origin|stn|loc|location)$/i.test(column.name))
  const zone = chosen?.zone ?? (chosen?.hasZone ? 'UTC' : null)
  const taken = columns.flatMap(column => column.isTaken && column.suggestion ? [column.suggestion] : [])
  const guessed: Recipe = {
    title, kind, encoding: sample.encoding, delimiter: sample.delimiter, decimal, comment: sample.comment, skipLines, headerRows: head.length,
    columns: taken, time: chosen?.time ?? { form: 'none' }, zone: zone ?? 'UTC', ignoresCellZone: false, stampMeans: 'instant', intervalS: null,
    stationColumn: kind === 'station' && station ? { name: station.name, at: station.at } : null, heightDatum: hasHeight ? datumOf(columns) : 'unknown',
  }
  const intervalS = kind === 'station' ? usualStepS(guessed, data, names) : null
  return {
    columns, times, isZoneOpen: zone === null && kind === 'station',
    head: [...head, ...data].slice(0, 12).map(row => row.cells),
    recipe: intervalS === null ? guessed : { ...guessed, stampMeans: 'end', intervalS },
  }
}

/** Dashes, strokes and the like in place of a number. */
const isSign = (cell: string): boolean => /^[-/*.?#]+$/.test(cell)
const isNumber = (cell: string): boolean => /^[+-]?(\d+([.,]\d*)?|[.,]\d+)(e[+-]?\d+)?$/i.test(cell)
const isTime = (cell: string): boolean => /^\d{1,4}[-/.]\d{1,2}[-/.]\d{1,4}/.test(cell) || /^\d{1,2}:\d{2}/.test(cell)

/** The head is what stands, with as many fields, above the first row that looks like readings; what stands above that is skipped. */
function splitHead({ rows, width }: Sample): { head: SampleRow[], data: SampleRow[], skipLines: number } {
  const isData = (row: SampleRow): boolean => {
    const filled = row.cells.filter(cell => cell !== '')
    return row.cells.length >= Math.min(width, 2) && filled.filter(cell => isNumber(cell) || isTime(cell)).length >= Math.max(1, 0.3 * filled.length)
  }
  const first = rows.findIndex(row => row.cells.length === width && isData(row))
  if (first < 0) return { head: rows, data: [], skipLines: 0 }
  let from = first
  while (from > 0 && rows[from - 1]!.cells.length === width) from -= 1
  const head = rows.slice(from, first)
  return { head, data: rows.slice(first).filter(row => row.cells.length === width), skipLines: from === 0 ? 0 : rows[from]!.line - 1 }
}

function saidHead({ rows, width }: Sample, said: SaidOfLayout): { head: SampleRow[], data: SampleRow[], skipLines: number } {
  const skipLines = said.skipLines ?? 0
  const kept = rows.filter(row => row.line > skipLines)
  const headerRows = said.headerRows ?? 1
  return { head: kept.slice(0, headerRows), data: kept.slice(headerRows).filter(row => row.cells.length === width), skipLines }
}

function decimalOf(data: readonly SampleRow[], delimiter: Recipe['delimiter']): '.' | ',' {
  let points = 0
  let commas = 0
  for (const { cells } of data.slice(0, 400)) {
    for (const cell of cells) {
      if (/^[+-]?\d+\.\d+$/.test(cell)) points += 1
      else if (/^[+-]?\d+,\d+$/.test(cell)) commas += 1
    }
  }
  return commas > points && (delimiter !== ',' || points === 0) ? ',' : '.'
}

function guessColumn(name: string, at: number, cells: readonly string[], unitCell: string, decimal: '.' | ',', times: readonly TimeCandidate[], timeColumns: ReadonlySet<number>): GuessedColumn {
  const filled = cells.filter(cell => cell !== '')
  const numbers = filled.filter(isNumber)
  const words = new Set(filled.filter(cell => !isNumber(cell) && (otherWordCodes.has(cell) || wordCodes.includes(cell) || isSign(cell))))
  const readable = numbers.length + filled.filter(cell => words.has(cell)).length
  const kind = filled.length === 0 ? 'empty' : numbers.length > 0 && readable >= 0.8 * filled.length ? 'number' : 'text'
  const base = { name, at, kind, samples: filled.slice(0, 3) } as const
  const isInTime = timeColumns.has(at)
  const head = readHead(name, unitCell)
  if (kind === 'text' || (kind === 'empty' && head.quantity === null) || (isInTime && head.quantity !== 'elapsed-time')) return { ...base, suggestion: null, isTaken: false, isUnitOpen: false }
  const values = numbers.map(cell => Number(decimal === ',' ? cell.replace(',', '.') : cell))
  const quantity = head.quantity ?? 'other'
  const unit = head.unit ?? likelyUnit(quantity, values)
  const suggestion: ColumnRecipe = {
    name, at, role: head.isQuality ? 'quality' : 'value', title: (name || `column ${at + 1}`).slice(0, 80), quantity, unit, decimals: null,
    missingCodes: [...new Set([...wordCodes, ...words, ...codesAmong(values, quantity, unit)])], heightM: head.heightM,
  }
  const isPartOfATime = times.some(candidate => refsOf(candidate.time).includes(at)) && quantity === 'other'
  return { ...base, suggestion, isTaken: kind === 'number' && !isPartOfATime && (head.quantity !== null || head.isQuality) && !['latitude', 'longitude'].includes(quantity), isUnitOpen: head.unit === null && quantity !== 'other' }
}

/** Codes for missing values that occur and cannot be a value of this quantity. */
function codesAmong(values: readonly number[], quantity: string, unit: string): string[] {
  const range = rangeOf(quantity, unit, 'station')
  if (!range) return []
  return [...new Set(values.filter(value => numberCodes.has(value) && (value < range[0] || value > range[1])))].map(String)
}

function likelyUnit(quantity: string, values: readonly number[]): string {
  const sorted = [...values].sort((a, b) => a - b)
  const middle = sorted[Math.floor(sorted.length / 2)] ?? 0
  const most = sorted[Math.floor(sorted.length * 0.98)] ?? 0
  const units = findMeasuredQuantity(quantity)?.units ?? []
  const pick = (ucum: string) => findMeasuredUnit(quantity, ucum)?.ucum ?? units[0]?.ucum ?? '1'
  if (quantity === 'pressure') return pick(middle > 10_000 ? 'Pa' : middle > 20 && middle < 35 && most < 35 ? '[in_i\'Hg]' : middle > 40 && middle < 115 && most < 115 ? 'kPa' : 'hPa')
  if (quantity === 'wind-direction') return pick(most <= 16 ? '45.deg/2' : most <= 36 ? '10.deg' : 'deg')
  if (quantity === 'relative-humidity') return pick(most <= 1.2 ? '1' : '%')
  if (quantity.endsWith('temperature')) return pick(middle > 150 ? 'K' : middle > 55 ? '[degF]' : 'Cel')
  return units[0]?.ucum ?? '1'
}

/** The most frequent step between rows of the sample, in seconds: the averaging interval is likely as long. Null where rows have no steady step. */
function usualStepS(recipe: Recipe, data: readonly SampleRow[], names: readonly string[]): number | null {
  const fields = new Fields('utf-8')
  const reader = timeReader(recipe, ref => names[ref.at] === undefined ? 0 : ref.at)
  if ('unknownZone' in reader) return null
  const counts = new Map<number, number>()
  let previous: number | null = null
  for (const row of data.slice(0, 500)) {
    fields.fill(row.cells)
    const time = reader.read(fields, previous)
    if (!('at' in time)) continue
    if (previous !== null && time.at !== previous) {
      const step = Math.round(Math.abs(time.at - previous) / 1000)
      counts.set(step, (counts.get(step) ?? 0) + 1)
    }
    previous = time.at
  }
  const [step] = [...counts].sort((a, b) => b[1] - a[1])[0] ?? []
  return step !== undefined && step >= 1 && step <= 86_400 ? step : null
}

function datumOf(columns: readonly GuessedColumn[]): Recipe['heightDatum'] {
  const name = columns.find(column => column.suggestion?.quantity === 'height')?.name.toLowerCase() ?? ''
  return /msl|asl|sea/.test(name) ? 'sea level' : /agl|ground/.test(name) ? 'ground' : 'unknown'
}

export function refsOf(time: TimeRecipe): number[] {
  switch (time.form) {
    case 'stamp': case 'epoch': case 'elapsed': return [time.column.at]
    case 'split': return [time.date.at, time.time.at]
    case 'fields': return [time.year, time.month, time.day, time.hour, time.minute, time.second].flatMap(ref => ref === null ? [] : [ref.at])
    case 'dayOfYear': return [time.year.at, time.day.at, time.time.at]
    case 'none': return []
  }
}
