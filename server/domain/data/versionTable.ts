import type { RowsReply } from '#shared/schemas/dataReplies'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { readRows } from '../../observations/readRows'
import { readRoot } from '../../observations/root'
import { rootOf } from './rootOf'
import { shownNumber } from './shownNumber'

/** Rows of a version with the digits that are served. */
export async function versionTable(read: Read, observations: Observations, input: { versionId: string, offset: number, limit: number }): Promise<RowsReply> {
  const sha256 = await rootOf(read, input.versionId)
  const { columns } = readRoot(observations, sha256)
  const { rowCount, rows } = readRows(observations, sha256, input.offset, input.limit)
  return {
    rowCount, offset: input.offset,
    rows: rows.map(row => ({
      line: row.line, at: Number.isNaN(row.at) ? null : new Date(row.at).toISOString(),
      cells: row.values.map((value, n) => ({ text: shownNumber(value, columns[n]!.decimals), flags: row.flags[n]! })),
    })),
  }
}
