import type { Observations } from './chunks'
import { cellOf, cellsPerDay, decodeFlags, decodeMonth, decodeValues, type Month } from './form'
import { flagRules, flagsOf, readRoot, type FlagRule, type Root } from './root'

/** Runs of marked rows, over the columns asked for. */
export interface FlaggedRun { fromMs: number, toMs: number, rule: FlagRule, no: number, rows: number }

export interface Series {
  fromMs: number
  toMs: number
  /** True where every row of the window is there; false where only what a plot of this width can show. */
  isWhole: boolean
  /** Rows further apart than this are not joined by a line. */
  gapMs: number
  /** Instants in order; each column has a value or null at each. */
  t: number[]
  columns: { no: number, v: (number | null)[] }[]
  flagged: FlaggedRun[]
}

export interface SeriesWindow {
  columns: readonly number[]
  /** Inclusive; the record's own ends where absent. */
  fromMs?: number
  toMs?: number
  /** About as many as the plot has pixels: each keeps its first and last row, and those of each column's least and greatest value. */
  buckets: number
}

const dayMs = 86_400_000
const cellMs = dayMs / cellsPerDay
const mostRuns = 200
const gapSteps = 1.8

/**
 * What a plot of this width needs of a window of a record. Bars of six hours and more come from the stored pyramid,
 * without touching the days; narrower ones from the days themselves. No extreme is lost; gaps and missing values stay gaps.
 */
export function readSeries(observations: Observations, rootSha256: Buffer, window: SeriesWindow): Series {
  const root = readRoot(observations, rootSha256)
  const fromMs = window.fromMs ?? root.firstAt ?? 0
  const toMs = window.toMs ?? root.lastAt ?? 0
  const bucketMs = Math.max(1, (toMs - fromMs) / window.buckets)
  const columns = window.columns.filter(no => root.columns[no] !== undefined)
  if (root.kind === 'station' && bucketMs >= cellMs) return { fromMs, toMs, ...fromCells(observations, root, columns, fromMs, toMs, bucketMs) }
  return { fromMs, toMs, ...fromDays(observations, root, columns, fromMs, toMs, bucketMs, window.buckets) }
}

function* monthsIn(observations: Observations, root: Root, fromMs: number, toMs: number): Generator<Month> {
  const first = new Date(fromMs - dayMs).toISOString().slice(0, 7)
  const last = new Date(toMs).toISOString().slice(0, 7)
  for (const { month, sha256 } of root.months) {
    if (month === 'flight' || (month >= first && month <= last)) yield decodeMonth(observations.getChunk(Buffer.from(sha256, 'hex')).bytes)
  }
}

type Drawn = Omit<Series, 'fromMs' | 'toMs'>

/** Each quarter of a day stands as two instants, its least and its greatest value; several quarters share a bar where the plot is narrow. */
function fromCells(observations: Observations, root: Root, columns: readonly number[], fromMs: number, toMs: number, bucketMs: number): Drawn {
  const widthMs = Math.ceil(bucketMs / cellMs) * cellMs
  const t: number[] = []
  const values = columns.map((): (number | null)[] => [])
  let open: { bar: number, min: number[], max: number[] } | null = null
  const close = () => {
    if (!open) return
    t.push(open.bar * widthMs + widthMs / 4, open.bar * widthMs + (3 * widthMs) / 4)
    for (const [n, column] of values.entries()) column.push(finite(open.min[n]!), finite(open.max[n]!))
    open = null
  }
  for (const month of monthsIn(observations, root, fromMs, toMs)) {
    month.days.forEach((day, at) => {
      const startsAt = Date.parse(`${day.day}T00:00:00Z`)
      for (let cell = 0; cell < cellsPerDay; cell += 1) {
        const from = startsAt + cell * cellMs
        if (from + cellMs < fromMs || from > toMs) continue
        const found = columns.map(no => cellOf(month, at, no, cell))
        if (found.every(one => one.n === 0)) continue
        const bar = Math.floor(from / widthMs)
        if (open?.bar !== bar) {
          close()
          open = { bar, min: columns.map(() => Infinity), max: columns.map(() => -Infinity) }
        }
        found.forEach((one, n) => {
          if (one.n === 0) return
          open!.min[n] = Math.min(open!.min[n]!, one.min)
          open!.max[n] = Math.max(open!.max[n]!, one.max)
        })
      }
    })
  }
  close()
  return { isWhole: false, gapMs: widthMs * 0.51, t, columns: columns.map((no, n) => ({ no, v: values[n]! })), flagged: [] }
}

const finite = (value: number): number | null => Number.isFinite(value) ? value : null

function fromDays(observations: Observations, root: Root, columns: readonly number[], fromMs: number, toMs: number, bucketMs: number, buckets: number): Drawn {
  const usualMs = root.stepMs === null ? Number.MAX_SAFE_INTEGER : root.stepMs * gapSteps
  const inWindow = root.stepMs === null ? root.rowCount : (toMs - fromMs) / root.stepMs
  const isWhole = inWindow <= buckets * 2
  const thinner = new Thinner(columns.length, fromMs, isWhole ? 0 : bucketMs)
  const runs = new RunCollector(columns)
  for (const month of monthsIn(observations, root, fromMs, toMs)) {
    for (const day of month.days) {
      if (day.day !== 'flight') {
        const startsAt = Date.parse(`${day.day}T00:00:00Z`)
        if (startsAt > toMs || startsAt + dayMs < fromMs) continue
      }
      const values = decodeValues(observations.getChunk(Buffer.from(day.values, 'hex')).bytes)
      const parts = columns.map(no => values.columns[no]!)
      const marks = day.bits.some(bits => bits !== 0) ? decodeFlags(observations.getChunk(Buffer.from(day.flags, 'hex')).bytes) : null
      for (let row = 0; row < values.time.length; row += 1) {
        const at = values.time[row]!
        if (!(at >= fromMs && at <= toMs)) continue
        thinner.add(at, parts, row)
        if (marks) runs.add(at, marks, row)
      }
      thinner.closeDay()
    }
  }
  const { t, values } = thinner.finish()
  return { isWhole, gapMs: isWhole ? usualMs : Math.max(usualMs, bucketMs * 2), t, columns: columns.map((no, n) => ({ no, v: values[n]! })), flagged: runs.finish() }
}

/** Keeps, of each bucket, its first and last row and the rows of each column's least and greatest value; all rows where a bucket has no length. */
class Thinner {
  private readonly t: number[] = []
  private readonly values: (number | null)[][]
  private bucket = Number.NEGATIVE_INFINITY
  private times: number[] = []
  private rows: number[] = []
  private parts: readonly Float64Array[] = []
  private least: number[]
  private greatest: number[]

  constructor(private readonly columnCount: number, private readonly fromMs: number, private readonly bucketMs: number) {
    this.values = Array.from({ length: columnCount }, () => [])
    this.least = []
    this.greatest = []
  }

  add(at: number, parts: readonly Float64Array[], row: number): void {
    this.parts = parts
    if (this.bucketMs === 0) {
      this.keep(at, row)
      return
    }
    const bucket = Math.floor((at - this.fromMs) / this.bucketMs)
    if (bucket !== this.bucket) this.close()
    this.bucket = bucket
    const place = this.rows.length
    this.times.push(at)
    this.rows.push(row)
    for (let n = 0; n < this.columnCount; n += 1) {
      const value = parts[n]![row]!
      if (Number.isNaN(value)) continue
      const low = this.least[n]
      const high = this.greatest[n]
      if (low === undefined || value < parts[n]![this.rows[low]!]!) this.least[n] = place
      if (high === undefined || value > parts[n]![this.rows[high]!]!) this.greatest[n] = place
    }
  }

  /** Rows of the next day lie in other arrays. */
  closeDay(): void {
    this.close()
  }

  finish(): { t: number[], values: (number | null)[][] } {
    this.close()
    return { t: this.t, values: this.values }
  }

  private close(): void {
    if (this.rows.length === 0) return
    const kept = new Set([0, this.rows.length - 1, ...this.least, ...this.greatest].filter(place => place !== undefined))
    for (const place of [...kept].sort((a, b) => a - b)) this.keep(this.times[place]!, this.rows[place]!)
    this.times = []
    this.rows = []
    this.least = []
    this.greatest = []
  }

  private keep(at: number, row: number): void {
    this.t.push(at)
    for (let n = 0; n < this.columnCount; n += 1) {
      const value = this.parts[n]![row]!
      this.values[n]!.push(Number.isNaN(value) ? null : value)
    }
  }
}

/** Joins neighboring marked rows to runs, per column and rule. */
class RunCollector {
  private readonly runs: FlaggedRun[] = []
  private readonly open = new Map<string, FlaggedRun>()

  constructor(private readonly columns: readonly number[]) {}

  add(at: number, marks: readonly Uint8Array[], row: number): void {
    for (const no of this.columns) {
      const rules = flagsOf(marks[no]![row]!)
      for (const rule of flagRules) {
        const key = `${no} ${rule}`
        const run = this.open.get(key)
        if (!rules.includes(rule)) {
          if (run) this.open.delete(key)
        }
        else if (run) {
          run.toMs = at
          run.rows += 1
        }
        else if (this.runs.length < mostRuns) {
          const begun = { fromMs: at, toMs: at, rule, no, rows: 1 }
          this.runs.push(begun)
          this.open.set(key, begun)
        }
      }
    }
  }

  finish(): FlaggedRun[] {
    return this.runs
  }
}
