/**
 * The fields of one row, as ranges of the bytes that were read: nothing is copied until somebody asks.
 * The object is used again for the next row, so it must not be kept.
 */
export class Fields {
  bytes: Buffer = Buffer.alloc(0)
  count = 0
  /** Number of the row's first line in the file, from 1. */
  line = 0
  /** True for the last row when the file ends without a line end. */
  isUnended = false
  readonly starts: number[] = []
  readonly ends: number[] = []
  private readonly escaped: boolean[] = []
  private readonly decoder: TextDecoder

  constructor(encoding: 'utf-8' | 'windows-1252') {
    this.decoder = new TextDecoder(encoding)
  }

  add(start: number, end: number, isEscaped: boolean): void {
    this.starts[this.count] = start
    this.ends[this.count] = end
    this.escaped[this.count] = isEscaped
    this.count += 1
  }

  /** Fields from texts that were split before. */
  fill(cells: readonly string[]): void {
    const parts = cells.map(cell => Buffer.from(cell))
    this.bytes = Buffer.concat(parts)
    this.count = 0
    let at = 0
    for (const part of parts) {
      this.add(at, at + part.length, false)
      at += part.length
    }
  }

  /** A field's text without blanks around it; empty where the row has no such field. */
  text(at: number): string {
    const start = this.starts[at]
    const end = this.ends[at]
    if (at >= this.count || start === undefined || end === undefined) return ''
    const text = this.decode(start, end).trim()
    return this.escaped[at] ? text.replaceAll('""', '"') : text
  }

  /** The whole row as it stands in the file. */
  raw(): string {
    const first = this.starts[0]
    const last = this.ends[this.count - 1]
    return first === undefined || last === undefined ? '' : this.decode(first, last)
  }

  private decode(start: number, end: number): string {
    for (let i = start; i < end; i += 1) if (this.bytes[i]! > 0x7F) return this.decoder.decode(this.bytes.subarray(start, end))
    return this.bytes.toString('latin1', start, end)
  }
}

const powersOfTen = Array.from({ length: 23 }, (_, n) => Number(`1e${n}`))
const isDigit = (byte: number): boolean => byte >= 0x30 && byte <= 0x39

/**
 * Reads numbers from bytes, correctly rounded: up to 15 digits give an exact integer divided by an exact power of ten;
 * anything longer goes through the engine's own reading of text. NaN where it is no plain decimal number.
 */
export class NumberReader {
  /** Digits behind the decimal mark of the number just read. */
  decimals = 0
  private readonly mark: number

  constructor(private readonly decimal: '.' | ',') {
    this.mark = decimal === '.' ? 0x2E : 0x2C
  }

  read(bytes: Buffer, from: number, to: number): number {
    let start = from
    let end = to
    while (start < end && (bytes[start] === 0x20 || bytes[start] === 0x09)) start += 1
    while (end > start && (bytes[end - 1] === 0x20 || bytes[end - 1] === 0x09)) end -= 1
    const isNegative = bytes[start] === 0x2D
    let at = isNegative || bytes[start] === 0x2B ? start + 1 : start
    let mantissa = 0
    let significant = 0
    let digits = 0
    let decimals = 0
    let seesMark = false
    for (; at < end; at += 1) {
      const byte = bytes[at]!
      if (isDigit(byte)) {
        mantissa = mantissa * 10 + (byte - 0x30)
        digits += 1
        if (mantissa > 0) significant += 1
        if (seesMark) decimals += 1
      }
      else if (byte === this.mark && !seesMark) seesMark = true
      else break
    }
    this.decimals = decimals
    if (digits === 0) return Number.NaN
    if (at === end && significant <= 15 && decimals <= 22) {
      const value = decimals === 0 ? mantissa : mantissa / powersOfTen[decimals]!
      return isNegative && value !== 0 ? -value : value
    }
    return readLongNumber(bytes.toString('latin1', start, end), this.decimal)
  }
}

const plainNumber = /^[+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d{1,4})?$/

function readLongNumber(text: string, decimal: '.' | ','): number {
  if (decimal === ',' && text.includes('.')) return Number.NaN
  const plain = decimal === ',' ? text.replace(',', '.') : text
  if (!plainNumber.test(plain)) return Number.NaN
  const value = Number(plain)
  if (!Number.isFinite(value)) return Number.NaN
  return value === 0 ? 0 : value
}
