import type { Observations } from './chunks'
import { decodeFlags, decodeMonth, decodeValues } from './form'
import { readRoot, type StoredColumn } from './root'

export interface VersionColumn extends StoredColumn {
  values: Float64Array
  /** One byte a row; bits as in `root.ts`. */
  flags: Uint8Array
}

export interface VersionRows {
  columns: VersionColumn[]
  /** Epoch ms of the end of each row's interval; NaN where the record has no clock. */
  time: Float64Array
  /** Line of the source file that each row stood in. */
  line: Float64Array
  rowCount: number
}

/** All rows of a version: for flights, and for records that fit into memory. Long station records are read by day. */
export function readVersion(observations: Observations, rootSha256: Buffer): VersionRows {
  const root = readRoot(observations, rootSha256)
  const time = new Float64Array(root.rowCount)
  const line = new Float64Array(root.rowCount)
  const columns = root.columns.map(column => ({ ...column, values: new Float64Array(root.rowCount), flags: new Uint8Array(root.rowCount) }))
  let at = 0
  for (const { sha256 } of root.months) {
    for (const day of decodeMonth(observations.getChunk(Buffer.from(sha256, 'hex')).bytes).days) {
      const values = decodeValues(observations.getChunk(Buffer.from(day.values, 'hex')).bytes)
      const flags = decodeFlags(observations.getChunk(Buffer.from(day.flags, 'hex')).bytes)
      time.set(values.time, at)
      line.set(values.line, at)
      columns.forEach((column, n) => {
        column.values.set(values.columns[n]!, at)
        column.flags.set(flags[n]!, at)
      })
      at += day.rows
    }
  }
  return { columns, time, line, rowCount: root.rowCount }
}
