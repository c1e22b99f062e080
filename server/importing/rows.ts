import type { ColumnRef, Recipe } from '#shared/schemas/data'
import { RowSplitter } from './bytes'
import { NumberReader, type Fields } from './fields'
import { timeReader, type TimeReader } from './times'
import { UnreadableFile } from './unreadable'

/** What becomes of one row. `values` is used again for the next. */
export type RowOutcome =
  | { took: true, line: number, station: string, at: number, values: Float64Array }
  | { took: false, line: number, station: string | null, column: string, text: string, reason: string }

/** Most decimals that are taken over from a file by itself: more are a program's rounding noise. */
const mostDecimals = 6

/**
 * Applies a recipe to a file's bytes, row by row. Every row comes out as taken or as refused with its first problem;
 * heads, comments and blank lines are no rows.
 */
export class RowReader {
  /** Most decimals seen in each column. */
  readonly decimals: number[]
  readonly values: Float64Array
  rows = 0
  commentLines = 0
  private readonly splitter: RowSplitter
  private readonly numbers: NumberReader
  private readonly codes: { texts: ReadonlySet<string>, numbers: readonly number[] }[]
  private readonly comment: Buffer | null
  private headLeft: number
  private names: string[] | null = null
  private width = 0
  private places: number[] = []
  private stationAt = -1
  private times: TimeReader | null = null
  private readonly previous = new Map<string, number>()
  private lastStation = ''

  constructor(private readonly recipe: Recipe, private readonly onRow: (row: RowOutcome) => void) {
    this.splitter = new RowSplitter({ encoding: recipe.encoding, delimiter: recipe.delimiter, onRow: fields => this.take(fields) })
    this.numbers = new NumberReader(recipe.decimal)
    this.values = new Float64Array(recipe.columns.length)
    this.decimals = recipe.columns.map(() => 0)
    this.comment = recipe.comment === null ? null : Buffer.from(recipe.comment)
    this.headLeft = recipe.headerRows
    this.codes = recipe.columns.map(column => ({ texts: new Set(column.missingCodes), numbers: column.missingCodes.map(code => Number(recipe.decimal === ',' ? code.replace(',', '.') : code)).filter(code => !Number.isNaN(code)) }))
  }

  /** Rows of a doubled hour that were told apart by their order. */
  get doubled(): number {
    return this.times?.doubled() ?? 0
  }

  push(chunk: Buffer): void {
    this.splitter.push(chunk)
  }

  end(): void {
    this.splitter.end()
    if (this.splitter.lines === 0) throw new UnreadableFile('file_empty')
    if (this.rows === 0) throw new UnreadableFile('file_header_only')
  }

  private take(fields: Fields): void {
    if (fields.line <= this.recipe.skipLines) return
    if (this.comment && startsWith(fields, this.comment)) {
      this.commentLines += 1
      return
    }
    if (this.headLeft > 0) {
      if (this.names === null) this.open(Array.from({ length: fields.count }, (_, at) => fields.text(at)))
      this.headLeft -= 1
      return
    }
    if (this.times === null) this.open(null, fields.count)
    this.rows += 1
    this.row(fields)
  }

  private open(names: string[] | null, count = names?.length ?? 0): void {
    if (count === 1) throw new UnreadableFile('file_wrong_delimiter', { delimiter: this.recipe.delimiter === '\t' ? 'a tab' : this.recipe.delimiter })
    this.names = names ?? []
    this.width = count
    const place = (ref: ColumnRef) => placeOf(ref, names, count)
    this.places = this.recipe.columns.map(place)
    this.stationAt = this.recipe.stationColumn ? place(this.recipe.stationColumn) : -1
    const times = timeReader(this.recipe, place)
    if ('unknownZone' in times) throw new UnreadableFile('zone_unknown', { zone: times.unknownZone })
    this.times = times
  }

  private row(fields: Fields): void {
    const { line, count, width } = fields.count === this.width ? { line: fields.line, count: fields.count, width: this.width } : { line: fields.line, count: filled(fields, this.width), width: this.width }
    if (count !== width) {
      if (fields.isUnended && count < width) throw new UnreadableFile('file_cut', { line })
      this.onRow({ took: false, line, station: null, column: '', text: fields.raw(), reason: `${count} ${count === 1 ? 'field' : 'fields'} where the head has ${width}` })
      return
    }
    const station = this.stationAt < 0 ? '' : fields.text(this.stationAt)
    if (this.stationAt >= 0 && station === '') {
      this.onRow({ took: false, line, station: null, column: this.recipe.stationColumn?.name ?? '', text: fields.raw(), reason: 'no station' })
      return
    }
    this.lastStation = station
    const time = this.times!.read(fields, this.previous.get(station) ?? null)
    if (!('at' in time)) {
      this.onRow({ took: false, line, station, column: time.column, text: time.text, reason: time.reason })
      return
    }
    for (let n = 0; n < this.places.length; n += 1) {
      const value = this.cell(fields, n)
      if (value === undefined) {
        const text = fields.text(this.places[n]!)
        this.onRow({ took: false, line, station, column: this.recipe.columns[n]!.name, text, reason: notANumber(text, this.recipe.decimal) })
        return
      }
      this.values[n] = value
    }
    if (!Number.isNaN(time.at)) this.previous.set(station, time.at)
    this.onRow({ took: true, line, station, at: time.at, values: this.values })
  }

  /** A number, NaN for a missing one, undefined for what is neither. */
  private cell(fields: Fields, n: number): number | undefined {
    const at = this.places[n]!
    const value = this.numbers.read(fields.bytes, fields.starts[at]!, fields.ends[at]!)
    const { texts, numbers } = this.codes[n]!
    if (Number.isNaN(value)) {
      const text = fields.text(at)
      return text === '' || texts.has(text) ? Number.NaN : undefined
    }
    for (const code of numbers) if (code === value) return Number.NaN
    if (this.numbers.decimals > this.decimals[n]!) this.decimals[n] = Math.min(mostDecimals, this.numbers.decimals)
    return value
  }

  /** The station of the row before: a row too broken to say whose it is counts with its neighbors. */
  get neighbor(): string {
    return this.lastStation
  }
}

/** Fields without blank ones that a trailing delimiter adds. */
function filled(fields: Fields, width: number): number {
  let count = fields.count
  while (count > width && fields.text(count - 1) === '') count -= 1
  return count
}

function startsWith(fields: Fields, prefix: Buffer): boolean {
  const start = fields.starts[0]
  return start !== undefined && fields.bytes.subarray(start, start + prefix.length).equals(prefix)
}

/** The name decides; where it stands more than once, or there is no head, the place does. */
function placeOf(ref: ColumnRef, names: readonly string[] | null, count: number): number {
  if (names === null) {
    if (ref.at >= count) throw new UnreadableFile('column_missing', { column: ref.name })
    return ref.at
  }
  if (names[ref.at] === ref.name) return ref.at
  const found = names.indexOf(ref.name)
  if (found < 0 || names.includes(ref.name, found + 1)) throw new UnreadableFile('column_missing', { column: ref.name })
  return found
}

function notANumber(text: string, decimal: '.' | ','): string {
  const other = decimal === '.' ? ',' : '.'
  if (/^[+-]?\d+[.,]\d+$/.test(text) && text.includes(other)) return `not a number with "${decimal}" as the decimal mark`
  if (/^[+-]?[\d.,]+e[+-]?\d+$/i.test(text)) return 'too large a number'
  return 'not a number, and not one of the missing codes of this column'
}
