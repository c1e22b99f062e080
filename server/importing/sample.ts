import type { Recipe } from '#shared/schemas/data'
import { RowSplitter } from './bytes'
import { UnreadableFile } from './unreadable'

export interface SampleRow { line: number, cells: string[] }
export interface Sample {
  encoding: Recipe['encoding']
  delimiter: Recipe['delimiter']
  comment: string | null
  rows: SampleRow[]
  /** Most frequent number of fields. */
  width: number
}

/** The start of a file, cut to whole lines unless it is all of it, split with the delimiter that fits best. */
export function readSample(bytes: Buffer, isWhole: boolean, said?: Recipe['delimiter']): Sample {
  const encoding = encodingOf(bytes, isWhole)
  const text = isWhole ? bytes : wholeLines(bytes, encoding)
  if (said !== undefined) return split(text, encoding, said)
  let best: { sample: Sample, share: number } | null = null
  let reason: UnreadableFile | null = null
  for (const delimiter of [';', '\t', '|', ',', ' '] as const) {
    try {
      const sample = split(text, encoding, delimiter)
      const share = shareOfWidth(sample)
      // Blanks stand in dates and texts as well: they part the fields only where nothing else does.
      const isLikelier = delimiter === ' ' ? best === null || best.share < 0.4 : share > (best?.share ?? 0) + 0.1
      if (sample.width >= 2 && isLikelier) best = { sample, share }
    }
    catch (error) {
      if (!(error instanceof UnreadableFile)) throw error
      if (error.code === 'file_binary' || error.code === 'file_line_too_long') throw error
      reason ??= error
    }
  }
  if (best && !(reason && best.sample.delimiter === ' ')) return best.sample
  if (reason) throw reason
  const sample = split(text, encoding, ',')
  if (sample.rows.length === 0) throw new UnreadableFile('file_empty')
  throw new UnreadableFile('file_wrong_delimiter', { delimiter: ',' })
}

function split(bytes: Buffer, encoding: Recipe['encoding'], delimiter: Recipe['delimiter']): Sample {
  const rows: SampleRow[] = []
  const splitter = new RowSplitter({ encoding, delimiter, onRow: fields => rows.push({ line: fields.line, cells: Array.from({ length: fields.count }, (_, at) => fields.text(at)) }) })
  splitter.push(bytes)
  splitter.end()
  const mark = commentOf(rows)
  const kept = mark === null ? rows : rows.filter(row => !row.cells[0]!.startsWith(mark))
  return { encoding, delimiter, comment: mark, rows: kept, width: modeOf(kept) }
}

/** Lines at the top that begin with a mark of comments; when they have as many fields as the rows, they are a head instead. */
function commentOf(rows: readonly SampleRow[]): string | null {
  const mark = /^(#|%|!|\/\/)/.exec(rows[0]?.cells[0] ?? '')?.[1] ?? null
  if (mark === null) return null
  const rest = rows.filter(row => !row.cells[0]!.startsWith(mark))
  return rows[0]!.cells.length > 1 && rows[0]!.cells.length === modeOf(rest) ? null : mark
}

function modeOf(rows: readonly SampleRow[]): number {
  const counts = new Map<number, number>()
  for (const { cells } of rows) counts.set(cells.length, (counts.get(cells.length) ?? 0) + 1)
  let best = 0
  let most = 0
  for (const [width, count] of counts) {
    if (count > most || (count === most && width > best)) {
      best = width
      most = count
    }
  }
  return best
}

function shareOfWidth(sample: Sample): number {
  const fitting = sample.rows.filter(row => row.cells.length === sample.width).length
  return sample.rows.length === 0 ? 0 : fitting / sample.rows.length
}

function encodingOf(bytes: Buffer, isWhole: boolean): Recipe['encoding'] {
  if (bytes[0] === 0xFF && bytes[1] === 0xFE) return 'utf-16le'
  if (bytes[0] === 0xFE && bytes[1] === 0xFF) return 'utf-16be'
  try {
    new TextDecoder('utf-8', { fatal: true }).decode(isWhole ? bytes : wholeLines(bytes, 'utf-8'))
    return 'utf-8'
  }
  catch {
    return 'windows-1252'
  }
}

function wholeLines(bytes: Buffer, encoding: Recipe['encoding']): Buffer {
  if (encoding === 'utf-16le' || encoding === 'utf-16be') return bytes.subarray(0, bytes.length - (bytes.length % 2))
  const last = Math.max(bytes.lastIndexOf(0x0A), bytes.lastIndexOf(0x0D))
  if (last < 0) {
    if (bytes.includes(0)) throw new UnreadableFile('file_binary', { line: 1, byte: 0 })
    return bytes
  }
  return bytes.subarray(0, last + 1)
}
