import type { ObservationsWriter } from './chunks'
import { cellsPerDay, ChunkScratch, decodeValues, encodeFlags, encodeMonth, encodeValues, type DayValues, type MonthDay } from './form'
import { putRoot, type Root, type StoredColumn } from './root'

const dayMs = 86_400_000
const flightDay = Number.NEGATIVE_INFINITY

/** Open days of all records of one import share a budget, so that memory does not grow with the file. */
export class OpenDays {
  private readonly days = new Set<OpenDay>()
  private cells = 0

  constructor(private readonly mostCells = 400_000) {}

  /** Chunks are written here one after the other. */
  readonly scratch = new ChunkScratch()

  touch(day: OpenDay): void {
    this.days.delete(day)
    this.days.add(day)
  }

  grew(cells: number, current: OpenDay): void {
    this.cells += cells
    while (this.cells > this.mostCells && this.days.size > 1) {
      for (const day of this.days) {
        if (day !== current) {
          day.flush()
          break
        }
      }
    }
  }

  closed(day: OpenDay, cells: number): void {
    this.days.delete(day)
    this.cells -= cells
  }
}

interface OpenDay { flush: () => void }

/** Flags of one day, one byte a cell; may look at the day before. Days come in order. */
export type DayJudge = (day: DayValues) => readonly Uint8Array[]

export interface RecordForm { kind: 'station' | 'flight', isInterval: boolean, heightDatum: string, columnCount: number }

/**
 * Takes the rows of one record in any order and keeps them as one chunk a day; a day that gets more rows later is read back,
 * merged and put anew. `finish` judges the days in order and puts flags, months and the root. The same rows give the same root,
 * whatever was in memory when.
 */
export class RecordWriter {
  private readonly open = new Map<number, DayBuffer>()
  private readonly stored = new Map<number, { sha256: Buffer, isNew: boolean, rows: number }>()
  private readonly spare: Float64Array[][] = []
  private current: DayBuffer | null = null
  rowCount = 0

  constructor(private readonly observations: ObservationsWriter, private readonly days: OpenDays, private readonly form: RecordForm) {}

  add(time: number, line: number, values: Float64Array): void {
    const key = this.dayOf(time)
    let day = this.current
    if (day === null || day.key !== key) {
      day = this.open.get(key) ?? this.openDay(key)
      this.days.touch(day)
      this.current = day
    }
    const grown = day.add(time, line, values)
    this.rowCount += 1
    if (grown > 0) this.days.grew(grown, day)
  }

  finish(columns: readonly StoredColumn[], judge: DayJudge): { root: Buffer, rowCount: number, firstAt: number | null, lastAt: number | null } {
    for (const day of [...this.open.values()]) day.flush()
    const keys = [...this.stored.keys()].sort((a, b) => a - b)
    const months: { month: string, sha256: string, rows: number }[] = []
    const steps = new StepCounter()
    let month: MonthBuilder | null = null
    let firstAt: number | null = null
    let lastAt: number | null = null
    for (const key of keys) {
      const { sha256 } = this.stored.get(key)!
      const day = decodeValues(this.observations.getChunk(sha256).bytes)
      steps.addDay(day.time)
      const flags = judge(day)
      const flagsSha = this.observations.putChunk('flags', encodeFlags(day.time.length, flags)).sha256
      const name = key === flightDay ? 'flight' : new Date(key * dayMs).toISOString().slice(0, 10)
      const monthName = key === flightDay ? 'flight' : name.slice(0, 7)
      if (month && month.name !== monthName) months.push(month.put(this.observations))
      if (!month || month.name !== monthName) month = new MonthBuilder(monthName, this.form.columnCount)
      month.add({ day: name, values: sha256.toString('hex'), flags: flagsSha.toString('hex'), rows: day.time.length, bits: flags.map(orOf) }, day, key === flightDay ? null : key * dayMs)
      for (const time of day.time) {
        if (Number.isNaN(time)) continue
        firstAt = firstAt === null ? time : Math.min(firstAt, time)
        lastAt = lastAt === null ? time : Math.max(lastAt, time)
      }
    }
    if (month) months.push(month.put(this.observations))
    const root: Root = {
      form: 1, kind: this.form.kind, columns, isInterval: this.form.isInterval, stepMs: steps.most(), heightDatum: this.form.heightDatum,
      rowCount: this.rowCount, firstAt, lastAt, months,
    }
    return { root: putRoot(this.observations, root), rowCount: this.rowCount, firstAt, lastAt }
  }

  /** With interval records the row at 00:00 ends the day before. */
  private dayOf(time: number): number {
    if (this.form.kind === 'flight') return flightDay
    return Math.floor((this.form.isInterval ? time - 1 : time) / dayMs)
  }

  private openDay(key: number): DayBuffer {
    const day = new DayBuffer(key, this.spare.pop() ?? emptyParts(this.form.columnCount), () => this.flush(day))
    this.open.set(key, day)
    this.days.grew(day.cells, day)
    return day
  }

  private flush(day: DayBuffer): void {
    const earlier = this.stored.get(day.key)
    const values = day.sorted(earlier ? decodeValues(this.observations.getChunk(earlier.sha256).bytes) : null)
    const { sha256, isNew } = this.observations.putChunk('values', encodeValues(values, this.days.scratch))
    if (earlier?.isNew && !earlier.sha256.equals(sha256)) this.observations.dropChunk(earlier.sha256)
    this.stored.set(day.key, { sha256, isNew, rows: values.time.length })
    this.open.delete(day.key)
    this.days.closed(day, day.cells)
    if (this.current === day) this.current = null
    if (this.spare.length < mostSpare) this.spare.push(day.takeParts())
  }
}

/** Arrays of closed days that the next ones use again. */
const mostSpare = 4
const emptyParts = (columnCount: number): Float64Array[] => Array.from({ length: columnCount + 2 }, () => new Float64Array(0))

class DayBuffer implements OpenDay {
  private capacity: number
  private count = 0

  constructor(readonly key: number, private parts: Float64Array[], readonly flush: () => void) {
    this.capacity = parts[0]!.length
  }

  takeParts(): Float64Array[] {
    return this.parts
  }

  get cells(): number {
    return this.capacity * this.parts.length
  }

  /** @returns by how many cells the buffer grew */
  add(time: number, line: number, values: Float64Array): number {
    const before = this.cells
    if (this.count === this.capacity) {
      this.capacity = Math.max(64, this.capacity * 2)
      this.parts = this.parts.map((part) => {
        const larger = new Float64Array(this.capacity)
        larger.set(part)
        return larger
      })
    }
    this.parts[0]![this.count] = time
    this.parts[1]![this.count] = line
    for (let n = 0; n < values.length; n += 1) this.parts[n + 2]![this.count] = values[n]!
    this.count += 1
    return this.cells - before
  }

  /** Rows by time, those of one instant by line; with the rows that were stored before. */
  sorted(earlier: DayValues | null): DayValues {
    const own = this.parts.map(part => part.subarray(0, this.count))
    const before = earlier ? [earlier.time, earlier.line, ...earlier.columns] : null
    const parts = before ? own.map((part, n) => joined(before[n]!, part)) : own
    const [time, line] = [parts[0]!, parts[1]!]
    if (!isSorted(time, line)) {
      const order = Uint32Array.from({ length: time.length }, (_, n) => n).sort((a, b) => compare(time[a]!, time[b]!) || line[a]! - line[b]!)
      for (let n = 0; n < parts.length; n += 1) parts[n] = Float64Array.from(order, at => parts[n]![at]!)
    }
    return { time: parts[0]!, line: parts[1]!, columns: parts.slice(2) }
  }
}

/** Rows without a clock keep the order of their lines. */
const compare = (a: number, b: number): number => (Number.isNaN(a) || Number.isNaN(b) ? 0 : a - b)

function isSorted(time: Float64Array, line: Float64Array): boolean {
  for (let n = 1; n < time.length; n += 1) {
    const order = compare(time[n - 1]!, time[n]!)
    if (order > 0 || (order === 0 && line[n - 1]! > line[n]!)) return false
  }
  return true
}

function joined(a: Float64Array, b: Float64Array): Float64Array {
  const both = new Float64Array(a.length + b.length)
  both.set(a)
  both.set(b, a.length)
  return both
}

function orOf(flags: Uint8Array): number {
  let bits = 0
  for (const flag of flags) bits |= flag
  return bits
}

class MonthBuilder {
  private readonly days: MonthDay[] = []
  private readonly cells: number[] = []

  constructor(readonly name: string, private readonly columnCount: number) {}

  add(entry: MonthDay, day: DayValues, startsAt: number | null): void {
    this.days.push(entry)
    for (const column of day.columns) {
      const cells = Array.from({ length: cellsPerDay }, () => ({ min: Number.NaN, max: Number.NaN, sum: 0, n: 0 }))
      for (let row = 0; row < column.length; row += 1) {
        const value = column[row]!
        if (Number.isNaN(value)) continue
        const quarter = startsAt === null ? 0 : Math.floor(((day.time[row]! - startsAt) / dayMs) * cellsPerDay)
        const cell = cells[Math.min(cellsPerDay - 1, Math.max(0, quarter))]!
        if (!(value >= cell.min)) cell.min = value
        if (!(value <= cell.max)) cell.max = value
        cell.sum += value
        cell.n += 1
      }
      for (const cell of cells) this.cells.push(cell.min, cell.max, cell.sum, cell.n)
    }
  }

  put(observations: ObservationsWriter): { month: string, sha256: string, rows: number } {
    const bytes = encodeMonth({ days: this.days, columns: this.columnCount, cells: Float64Array.from(this.cells) })
    return { month: this.name, sha256: observations.putChunk('month', bytes).sha256.toString('hex'), rows: this.days.reduce((sum, day) => sum + day.rows, 0) }
  }
}

class StepCounter {
  private readonly counts = new Map<number, number>()
  private last: number | null = null

  addDay(time: Float64Array): void {
    for (const at of time) {
      if (Number.isNaN(at)) return
      if (this.last !== null && at > this.last) {
        const step = at - this.last
        const count = this.counts.get(step)
        if (count !== undefined || this.counts.size < 10_000) this.counts.set(step, (count ?? 0) + 1)
      }
      this.last = at
    }
  }

  most(): number | null {
    let best: number | null = null
    let bestCount = 0
    for (const [step, count] of this.counts) {
      if (count > bestCount || (count === bestCount && best !== null && step < best)) {
        best = step
        bestCount = count
      }
    }
    return best
  }
}
