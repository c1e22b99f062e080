import { Fields } from './fields'
import { UnreadableFile } from './unreadable'

export const longestLine = 1_048_576
/** Beyond this a quoted field that goes over several lines is a quote that was never closed. */
const longestQuoted = 65_536
export const mostFields = 5000

export interface Splitting {
  encoding: 'utf-8' | 'windows-1252' | 'utf-16le' | 'utf-16be'
  delimiter: ',' | ';' | '\t' | '|' | ' '
  /** Called for each line that is not blank. The fields are used again afterwards. */
  onRow: (fields: Fields) => void
}

const ordinary = 0
const between = 1
const quote = 2
const carriageReturn = 3
const lineFeed = 4
const forbidden = 5

function classesFor(delimiter: Splitting['delimiter']): Uint8Array {
  const classes = new Uint8Array(256)
  for (let byte = 0; byte < 32; byte += 1) classes[byte] = forbidden
  classes[0x7F] = forbidden
  classes[0x09] = ordinary
  classes[0x0C] = ordinary // form feed between pages
  classes[0x22] = quote
  classes[0x0D] = carriageReturn
  classes[0x0A] = lineFeed
  classes[delimiter.charCodeAt(0)] = between
  if (delimiter === ' ') classes[0x09] = between
  return classes
}

/**
 * Splits a stream of bytes into rows and fields. Lines end with LF, CRLF, CR CR LF or CR alone. A field may stand in quotes,
 * with `""` for a quote and line ends inside. A byte order mark is skipped; UTF-16 is turned into UTF-8 on the way.
 * What no text table holds is refused with its line: NUL and other control bytes, a line above 1 MiB, a quote that never closes.
 */
export class RowSplitter {
  private readonly classes: Uint8Array
  private readonly fields: Fields
  private readonly wide: TextDecoder | null
  private carry: Buffer | null = null
  private line = 1
  private isFirst = true
  private readonly collapses: boolean

  constructor(private readonly splitting: Splitting) {
    this.classes = classesFor(splitting.delimiter)
    this.collapses = splitting.delimiter === ' '
    this.wide = splitting.encoding.startsWith('utf-16') ? new TextDecoder(splitting.encoding) : null
    this.fields = new Fields(splitting.encoding === 'windows-1252' ? 'windows-1252' : 'utf-8')
  }

  /** Physical lines ended so far. */
  get lines(): number {
    return this.line - 1
  }

  push(chunk: Buffer): void {
    this.take(this.wide ? Buffer.from(this.wide.decode(chunk, { stream: true }), 'utf8') : chunk, false)
  }

  end(): void {
    this.take(this.wide ? Buffer.from(this.wide.decode(), 'utf8') : Buffer.alloc(0), true)
  }

  private take(chunk: Buffer, isLast: boolean): void {
    let bytes = this.carry ? Buffer.concat([this.carry, chunk]) : chunk
    this.carry = null
    if (this.isFirst && bytes.length < 3 && !isLast) {
      this.carry = bytes
      return
    }
    if (this.isFirst) {
      this.isFirst = false
      if (bytes[0] === 0xEF && bytes[1] === 0xBB && bytes[2] === 0xBF) bytes = bytes.subarray(3)
    }
    let at = 0
    while (at < bytes.length) {
      const next = this.row(bytes, at, isLast)
      if (next < 0) {
        if (bytes.length - at > longestLine) throw new UnreadableFile('file_line_too_long', { line: this.line, limit: '1 MiB' })
        this.carry = Buffer.from(bytes.subarray(at))
        return
      }
      at = next
    }
  }

  /** Reads one row from `from`; returns where the next begins, or −1 when its end has not arrived yet. */
  private row(bytes: Buffer, from: number, isLast: boolean): number {
    const { classes, fields } = this
    const length = bytes.length
    fields.bytes = bytes
    fields.count = 0
    fields.line = this.line
    let start = from
    let at = from
    let innerLines = 0
    for (;;) {
      if (at >= length) {
        if (!isLast) return -1
        this.close(start, at, true)
        this.line += 1 + innerLines
        return length
      }
      const kind = classes[bytes[at]!]!
      if (kind === ordinary) {
        at += 1
        continue
      }
      if (kind === between) {
        if (!this.collapses || at > start) this.addField(start, at, false)
        at += 1
        start = at
        continue
      }
      if (kind === quote && isBlank(bytes, start, at)) {
        const closed = this.quoted(bytes, at, isLast)
        if (closed === null) return -1
        at = closed.next
        innerLines += closed.lines
        while (at < length && isBlankByte(bytes[at]!) && classes[bytes[at]!] === ordinary) at += 1
        if (at >= length && !isLast) return -1
        const after = at < length ? classes[bytes[at]!]! : lineFeed
        if (after === ordinary || after === quote) {
          // Text after the closing quote: the quotes belong to the text, unless they swallowed a line end.
          if (closed.lines > 0) throw new UnreadableFile('file_quote_open', { line: this.line })
          continue
        }
        if (after === forbidden) throw new UnreadableFile('file_binary', { line: this.line + innerLines, byte: bytes[at]! })
        this.addField(closed.from, closed.to, closed.isEscaped)
        if (after === between) {
          at += 1
          start = at
        }
        else {
          start = -1
        }
        continue
      }
      if (kind === quote) {
        at += 1
        continue
      }
      if (kind === forbidden) throw new UnreadableFile('file_binary', { line: this.line + innerLines, byte: bytes[at]! })
      const next = lineEnd(bytes, at, isLast)
      if (next < 0) return -1
      if (at - from > longestLine) throw new UnreadableFile('file_line_too_long', { line: this.line, limit: '1 MiB' })
      this.close(start, at, false)
      this.line += 1 + innerLines
      return next
    }
  }

  private addField(start: number, end: number, isEscaped: boolean): void {
    if (this.fields.count >= mostFields) throw new UnreadableFile('file_too_many_columns', { line: this.line, limit: mostFields })
    this.fields.add(start, end, isEscaped)
  }

  /** `start` is −1 when the last field was quoted and is in already. */
  private close(start: number, end: number, isUnended: boolean): void {
    const { fields } = this
    if (start >= 0 && !(this.collapses && start === end && fields.count > 0)) this.addField(start, end, false)
    if (fields.count === 0 || (fields.count === 1 && isBlank(fields.bytes, fields.starts[0]!, fields.ends[0]!))) return
    fields.isUnended = isUnended
    this.splitting.onRow(fields)
  }

  private quoted(bytes: Buffer, open: number, isLast: boolean): { from: number, to: number, next: number, lines: number, isEscaped: boolean } | null {
    let isEscaped = false
    let lines = 0
    for (let at = open + 1; at < bytes.length; at += 1) {
      const byte = bytes[at]!
      if (byte === 0x22) {
        if (bytes[at + 1] === 0x22) {
          isEscaped = true
          at += 1
          continue
        }
        if (at + 1 >= bytes.length && !isLast) return null
        return { from: open + 1, to: at, next: at + 1, lines, isEscaped }
      }
      if (byte === 0x0A || (byte === 0x0D && bytes[at + 1] !== 0x0A)) lines += 1
      if (this.classes[byte] === forbidden) throw new UnreadableFile('file_binary', { line: this.line + lines, byte })
      if (at - open > longestQuoted) throw new UnreadableFile('file_quote_open', { line: this.line })
    }
    if (isLast) throw new UnreadableFile('file_quote_open', { line: this.line })
    return null
  }
}

const isBlankByte = (byte: number): boolean => byte === 0x20 || byte === 0x09

function isBlank(bytes: Buffer, from: number, to: number): boolean {
  for (let at = from; at < to; at += 1) if (!isBlankByte(bytes[at]!)) return false
  return true
}

/** Where the next line begins after the line end at `at`; −1 when more bytes are needed to know. */
function lineEnd(bytes: Buffer, at: number, isLast: boolean): number {
  if (bytes[at] === 0x0A) return at + 1
  let next = at
  while (bytes[next] === 0x0D) next += 1
  if (next >= bytes.length && !isLast && next - at < 3) return -1
  return bytes[next] === 0x0A ? next + 1 : at + 1
}
