import type { Recipe, RefusedRow } from '#shared/schemas/data'
import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'
import type { FileStore } from '../../files/store'
import { RowReader } from '../../importing/rows'
import { UnreadableFile } from '../../importing/unreadable'
import { getUpload } from './describeUpload'
import { readHeadOf } from './readHeadOf'
import { shownNumber } from './shownNumber'

const previewBytes = 131_072
const shownRows = 12
const shownRefusals = 20

export interface Preview {
  columns: { name: string, quantity: string, unit: string, decimals: number }[]
  rows: { line: number, station: string, at: string | null, values: string[] }[]
  refused: RefusedRow[]
  rowsRead: number
  rowsRefused: number
}

/** The first rows as they would be stored by this recipe, and what would be refused among the first part of the file. */
export async function previewImport(read: Read, files: FileStore, input: { uploadId: string, recipe: Recipe }): Promise<Preview> {
  const upload = await getUpload(read, input.uploadId)
  const { bytes, isWhole } = await readHeadOf(files, upload.sha256, previewBytes)
  const taken: { line: number, station: string, at: number, values: number[] }[] = []
  const refused: RefusedRow[] = []
  let rowsRefused = 0
  const reader = new RowReader(input.recipe, (row) => {
    if (!row.took) {
      rowsRefused += 1
      if (refused.length < shownRefusals) refused.push({ line: row.line, column: row.column, text: row.text.slice(0, 200), reason: row.reason })
    }
    else if (taken.length < shownRows) taken.push({ line: row.line, station: row.station, at: row.at, values: [...row.values] })
  })
  try {
    reader.push(bytes)
    if (isWhole) reader.end()
  }
  catch (error) {
    if (error instanceof UnreadableFile) return refuse(error.code, error.facts)
    throw error
  }
  const columns = input.recipe.columns.map((column, n) => ({ name: column.title, quantity: column.quantity, unit: column.unit, decimals: column.decimals ?? reader.decimals[n]! }))
  return {
    columns, refused, rowsRefused, rowsRead: reader.rows,
    rows: taken.map(row => ({
      line: row.line, station: row.station, at: Number.isNaN(row.at) ? null : new Date(row.at).toISOString(),
      values: row.values.map((value, n) => shownNumber(value, columns[n]!.decimals)),
    })),
  }
}
