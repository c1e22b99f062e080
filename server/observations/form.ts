import canonicalize from 'canonicalize'

/**
 * The bytes of chunks. Numbers are little-endian doubles in the file's own unit; a missing one is NaN with one bit pattern,
 * and −0 is 0, so that equal rows give equal digests everywhere.
 */
export interface DayValues {
  /** Epoch ms; NaN where the record has no clock. */
  time: Float64Array
  /** Line of the source file. */
  line: Float64Array
  columns: readonly Float64Array[]
}

const valuesMark = 0x31764854 // "THv1"
const flagsMark = 0x31664854
const monthMark = 0x316D4854
const headBytes = 16

if (new Uint8Array(new Uint16Array([1]).buffer)[0] !== 1) throw new Error('Chunks are little-endian; this machine is not.')

/** Memory that is used again for each chunk: valid until the next one is written into it. */
export class ChunkScratch {
  private memory = new ArrayBuffer(0)

  take(size: number): Buffer {
    if (this.memory.byteLength < size) this.memory = new ArrayBuffer(size * 2)
    return Buffer.from(this.memory, 0, size)
  }
}

/** @param scratch where to write; the bytes are valid until it is used again */
export function encodeValues(day: DayValues, scratch?: ChunkScratch): Buffer {
  const rows = day.time.length
  const size = headBytes + 8 * rows * (2 + day.columns.length)
  const bytes = scratch ? scratch.take(size) : Buffer.alloc(size)
  bytes.writeUInt32LE(0, 12)
  bytes.writeUInt32LE(valuesMark, 0)
  bytes.writeUInt32LE(rows, 4)
  bytes.writeUInt32LE(day.columns.length, 8)
  const numbers = new Float64Array(bytes.buffer, bytes.byteOffset + headBytes, rows * (2 + day.columns.length))
  let at = 0
  for (const part of [day.time, day.line, ...day.columns]) {
    for (let row = 0; row < rows; row += 1) {
      const value = part[row]!
      numbers[at] = value === value ? value + 0 : Number.NaN
      at += 1
    }
  }
  return bytes
}

export function decodeValues(bytes: Buffer): DayValues {
  const { rows, columns } = head(bytes, valuesMark)
  const numbers = doubles(bytes, headBytes, rows * (2 + columns))
  const part = (n: number) => numbers.subarray(n * rows, (n + 1) * rows)
  return { time: part(0), line: part(1), columns: Array.from({ length: columns }, (_, n) => part(n + 2)) }
}

/** One byte a cell, one bit a rule; column after column. */
export function encodeFlags(rows: number, columns: readonly Uint8Array[]): Buffer {
  const bytes = Buffer.alloc(headBytes + rows * columns.length)
  bytes.writeUInt32LE(flagsMark, 0)
  bytes.writeUInt32LE(rows, 4)
  bytes.writeUInt32LE(columns.length, 8)
  columns.forEach((column, n) => bytes.set(column, headBytes + n * rows))
  return bytes
}

export function decodeFlags(bytes: Buffer): Uint8Array[] {
  const { rows, columns } = head(bytes, flagsMark)
  return Array.from({ length: columns }, (_, n) => bytes.subarray(headBytes + n * rows, headBytes + (n + 1) * rows))
}

/** Cells of the stored pyramid in a day: six hours each. */
export const cellsPerDay = 4
export interface PyramidCell { min: number, max: number, sum: number, n: number }
export interface MonthDay {
  /** `2013-01-31`, or `flight`. */
  day: string
  values: string
  flags: string
  rows: number
  /** Per column, the bits of all flags of the day. */
  bits: readonly number[]
}
export interface Month { days: readonly MonthDay[], columns: number, cells: Float64Array }

/** Cells: for each day, column and quarter of the day: least, greatest, sum, count. Least and greatest of nothing are NaN. */
export function encodeMonth(month: Month): Buffer {
  const text = Buffer.from(canonicalize({ columns: month.columns, days: month.days }) ?? '')
  const start = Math.ceil((headBytes + text.length) / 8) * 8
  const bytes = Buffer.alloc(start + month.cells.length * 8)
  bytes.writeUInt32LE(monthMark, 0)
  bytes.writeUInt32LE(text.length, 4)
  bytes.writeUInt32LE(month.columns, 8)
  text.copy(bytes, headBytes)
  new Float64Array(bytes.buffer, bytes.byteOffset + start, month.cells.length).set(month.cells)
  return bytes
}

export function decodeMonth(bytes: Buffer): Month {
  const { rows: textLength, columns } = head(bytes, monthMark)
  const text = JSON.parse(bytes.toString('utf8', headBytes, headBytes + textLength)) as { days: MonthDay[] }
  const start = Math.ceil((headBytes + textLength) / 8) * 8
  return { days: text.days, columns, cells: doubles(bytes, start, (bytes.length - start) / 8) }
}

export function cellOf(month: Month, day: number, column: number, cell: number): PyramidCell {
  const at = ((day * month.columns + column) * cellsPerDay + cell) * 4
  return { min: month.cells[at]!, max: month.cells[at + 1]!, sum: month.cells[at + 2]!, n: month.cells[at + 3]! }
}

function head(bytes: Buffer, mark: number): { rows: number, columns: number } {
  if (bytes.length < headBytes || bytes.readUInt32LE(0) !== mark) throw new Error('A chunk is not of the kind that its parent says.')
  return { rows: bytes.readUInt32LE(4), columns: bytes.readUInt32LE(8) }
}

function doubles(bytes: Buffer, from: number, count: number): Float64Array {
  const start = bytes.byteOffset + from
  return start % 8 === 0 ? new Float64Array(bytes.buffer, start, count) : new Float64Array(Uint8Array.prototype.slice.call(bytes, from, from + count * 8).buffer)
}
