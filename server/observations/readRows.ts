import type { Observations } from './chunks'
import { decodeFlags, decodeMonth, decodeValues } from './form'
import { flagsOf, readRoot } from './root'

export interface TableRow { line: number, at: number, values: number[], flags: string[][] }

/** Some rows in order of time, by their number from 0: only the days that hold them are read. */
export function readRows(observations: Observations, rootSha256: Buffer, offset: number, limit: number): { rowCount: number, rows: TableRow[] } {
  const root = readRoot(observations, rootSha256)
  const rows: TableRow[] = []
  let before = 0
  for (const { sha256, rows: inMonth } of root.months) {
    if (before + inMonth <= offset) {
      before += inMonth
      continue
    }
    for (const day of decodeMonth(observations.getChunk(Buffer.from(sha256, 'hex')).bytes).days) {
      if (before + day.rows > offset) {
        const values = decodeValues(observations.getChunk(Buffer.from(day.values, 'hex')).bytes)
        const flags = decodeFlags(observations.getChunk(Buffer.from(day.flags, 'hex')).bytes)
        for (let row = Math.max(0, offset - before); row < day.rows && rows.length < limit; row += 1) {
          rows.push({ line: values.line[row]!, at: values.time[row]!, values: values.columns.map(column => column[row]!), flags: flags.map(column => flagsOf(column[row]!)) })
        }
      }
      before += day.rows
      if (rows.length >= limit) return { rowCount: root.rowCount, rows }
    }
  }
  return { rowCount: root.rowCount, rows }
}
