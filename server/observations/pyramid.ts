import type { Observations } from './chunks'
import { cellOf, cellsPerDay, decodeFlags, decodeMonth, decodeValues, type Month } from './form'
import { flagsOf, readRoot, type Root } from './root'

export interface SeriesColumn { no: number, t: number[], v: (number | null)[], flagged: { t: number, v: number, flags: string[] }[] }
export interface Series { fromMs: number, toMs: number, isWhole: boolean, columns: SeriesColumn[] }

export interface SeriesWindow {
  columns: readonly number[]
  /** Inclusive; the record's own ends where absent. */
  fromMs?: number
  toMs?: number
  /** About as many as the plot has pixels: each keeps its first, least, greatest and last value. */
  buckets: number
}

const dayMs = 86_400_000
const cellMs = dayMs / cellsPerDay
const mostFlagged = 400
/** More than this many usual steps apart, two rows are not joined by a line. */
const gapSteps = 1.8

/**
 * What a plot of this width needs of a window of a record. Bars of six hours and more come from the stored pyramid,
 * without touching the days; narrower ones from the days themselves. Gaps and missing values break the line.
 */
export function readSeries(observations: Observations, rootSha256: Buffer, window: SeriesWindow): Series {
  const root = readRoot(observations, rootSha256)
  const fromMs = window.fromMs ?? root.firstAt ?? 0
  const toMs = window.toMs ?? root.lastAt ?? 0
  const bucketMs = Math.max(1, (toMs - fromMs) / window.buckets)
  const columns = window.columns.filter(no => root.columns[no] !== undefined)
  if (root.kind === 'station' && bucketMs >= cellMs) return { fromMs, toMs, isWhole: false, columns: fromCells(observations, root, columns, fromMs, toMs, bucketMs) }
  return { fromMs, toMs, ...fromDays(observations, root, columns, fromMs, toMs, bucketMs, window.buckets) }
}

function* monthsIn(observations: Observations, root: Root, fromMs: number, toMs: number): Generator<Month> {
  const first = new Date(fromMs - dayMs).toISOString().slice(0, 7)
  const last = new Date(toMs).toISOString().slice(0, 7)
  for (const { month, sha256 } of root.months) {
    if (month === 'flight' || (month >= first && month <= last)) yield decodeMonth(observations.getChunk(Buffer.from(sha256, 'hex')).bytes)
  }
}

function fromCells(observations: Observations, root: Root, columns: readonly number[], fromMs: number, toMs: number, bucketMs: number): SeriesColumn[] {
  const drawn = columns.map(no => new BucketLine(no, fromMs, bucketMs, Math.max(cellMs, bucketMs) * 1.01))
  for (const month of monthsIn(observations, root, fromMs, toMs)) {
    month.days.forEach((day, at) => {
      const startsAt = Date.parse(`${day.day}T00:00:00Z`)
      for (let cell = 0; cell < cellsPerDay; cell += 1) {
        const middle = startsAt + (cell + 0.5) * cellMs
        if (middle < fromMs - cellMs || middle > toMs + cellMs) continue
        for (const line of drawn) {
          const { min, max, n } = cellOf(month, at, line.no, cell)
          if (n > 0) {
            line.add(middle - cellMs / 4, min)
            line.add(middle + cellMs / 4, max)
          }
        }
      }
    })
  }
  return drawn.map(line => line.finish())
}

function fromDays(observations: Observations, root: Root, columns: readonly number[], fromMs: number, toMs: number, bucketMs: number, buckets: number): Pick<Series, 'isWhole' | 'columns'> {
  const gapMs = root.stepMs === null ? Number.POSITIVE_INFINITY : root.stepMs * gapSteps
  const inWindow = root.stepMs === null ? root.rowCount : (toMs - fromMs) / root.stepMs
  const isWhole = inWindow <= buckets * 2
  const drawn = columns.map(no => new BucketLine(no, fromMs, isWhole ? 0 : bucketMs, isWhole ? gapMs : Math.max(gapMs, bucketMs)))
  for (const month of monthsIn(observations, root, fromMs, toMs)) {
    for (const day of month.days) {
      if (day.day !== 'flight') {
        const startsAt = Date.parse(`${day.day}T00:00:00Z`)
        if (startsAt > toMs || startsAt + dayMs < fromMs) continue
      }
      const values = decodeValues(observations.getChunk(Buffer.from(day.values, 'hex')).bytes)
      const flags = day.bits.some(bits => bits !== 0) ? decodeFlags(observations.getChunk(Buffer.from(day.flags, 'hex')).bytes) : null
      for (const line of drawn) {
        const column = values.columns[line.no]!
        const marks = flags?.[line.no]
        for (let row = 0; row < column.length; row += 1) {
          const at = values.time[row]!
          if (!(at >= fromMs && at <= toMs)) continue
          line.add(at, column[row]!)
          const bits = marks?.[row] ?? 0
          if (bits !== 0) line.flag(at, column[row]!, bits)
        }
      }
    }
  }
  return { isWhole, columns: drawn.map(line => line.finish()) }
}

/** Gathers one line: whole where a bucket has no length, else first, least, greatest and last of each bucket in order of time. */
class BucketLine {
  private readonly t: number[] = []
  private readonly v: (number | null)[] = []
  private readonly flagged: SeriesColumn['flagged'] = []
  private bucket = Number.NEGATIVE_INFINITY
  private open: { first: Point, min: Point, max: Point, last: Point } | null = null
  private lastAt: number | null = null
  private breaks = false

  constructor(readonly no: number, private readonly fromMs: number, private readonly bucketMs: number, private readonly gapMs: number) {}

  add(at: number, value: number): void {
    if (Number.isNaN(value)) {
      this.breaks = true
      return
    }
    const isGap = this.breaks || (this.lastAt !== null && at - this.lastAt > this.gapMs)
    const bucket = this.bucketMs > 0 ? Math.floor((at - this.fromMs) / this.bucketMs) : this.bucket + 1
    const point = { at, value }
    if (this.open && bucket === this.bucket) {
      if (value < this.open.min.value) this.open.min = point
      if (value > this.open.max.value) this.open.max = point
      this.open.last = point
    }
    else {
      this.close()
      if (isGap && this.t.length > 0) {
        this.t.push(this.t[this.t.length - 1]!)
        this.v.push(null)
      }
      this.bucket = bucket
      this.open = { first: point, min: point, max: point, last: point }
    }
    this.breaks = false
    this.lastAt = at
  }

  flag(at: number, value: number, bits: number): void {
    if (!Number.isNaN(value) && this.flagged.length < mostFlagged) this.flagged.push({ t: at, v: value, flags: flagsOf(bits) })
  }

  finish(): SeriesColumn {
    this.close()
    return { no: this.no, t: this.t, v: this.v, flagged: this.flagged }
  }

  private close(): void {
    if (!this.open) return
    const { first, min, max, last } = this.open
    const [low, high] = min.at <= max.at ? [min, max] : [max, min]
    let previous: Point | null = null
    for (const point of [first, low, high, last]) {
      if (point === previous) continue
      if (previous && point.at === previous.at && point.value === previous.value) continue
      this.t.push(point.at)
      this.v.push(point.value)
      previous = point
    }
    this.open = null
  }
}

interface Point { at: number, value: number }
