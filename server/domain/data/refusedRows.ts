import type { RefusedRow } from '#shared/schemas/data'
import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import type { VersionMeta } from './publishVersions'
import { csvLine } from './safeCsv'

async function refusalChunks(read: Read, versionId: string): Promise<{ total: number, chunks: string[] }> {
  const version = await read.selectFrom('data_set_version').select(['rows_refused', 'meta_json']).where('id', '=', versionId).executeTakeFirst()
  if (!version) return refuse('not_found')
  return { total: version.rows_refused, chunks: (JSON.parse(version.meta_json) as Partial<VersionMeta>).refusals ?? [] }
}

const rowsIn = (observations: Observations, chunk: string): RefusedRow[] => JSON.parse(observations.getChunk(Buffer.from(chunk, 'hex')).bytes.toString('utf8')) as RefusedRow[]

/** Some of the rows that a version's import did not take. */
export async function refusedRows(read: Read, observations: Observations, input: { versionId: string, offset: number, limit: number }): Promise<{ total: number, offset: number, rows: RefusedRow[] }> {
  const { total, chunks } = await refusalChunks(read, input.versionId)
  const rows: RefusedRow[] = []
  let before = 0
  for (const chunk of chunks) {
    if (rows.length >= input.limit) break
    const part = rowsIn(observations, chunk)
    rows.push(...part.slice(Math.max(0, input.offset - before), Math.max(0, input.offset - before) + input.limit - rows.length))
    before += part.length
  }
  return { total, offset: input.offset, rows }
}

/** All refused rows as CSV, a chunk at a time. Cells that a spreadsheet would run are defused. */
export async function* refusedRowsCsv(read: Read, observations: Observations, versionId: string): AsyncGenerator<string> {
  const { chunks } = await refusalChunks(read, versionId)
  yield csvLine(['line', 'column', 'text', 'reason'])
  for (const chunk of chunks) yield rowsIn(observations, chunk).map(row => csvLine([row.line, row.column, row.text, row.reason])).join('')
}
