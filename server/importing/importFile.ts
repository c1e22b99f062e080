import type { Recipe, RefusedRow } from '#shared/schemas/data'
import type { ObservationsWriter } from '../observations/chunks'
import { OpenDays, RecordWriter } from '../observations/recordWriter'
import type { StoredColumn } from '../observations/root'
import { judgeDays } from './quality/judgeDays'
import { RefusedRows } from './refusals'
import { RowReader, type RowOutcome } from './rows'
import { unpacked } from './unpack'
import { UnreadableFile } from './unreadable'

/** Names the code that made a version; goes up when the same recipe would give other rows. */
export const importer = 'tetherhouse-import-1'

const mostStations = 200
const longestFlight = 500_000

export interface ImportedRecord {
  /** Value of the station column; empty where the file holds one record. */
  station: string
  rootSha256: Buffer
  rowsRead: number
  rowsTaken: number
  rowsRefused: number
  firstAt: number | null
  lastAt: number | null
  columns: StoredColumn[]
  /** Names of the chunks that list the refused rows. */
  refusals: string[]
}

export interface ImportedFile { records: ImportedRecord[], rowsRead: number, commentLines: number, doubledRows: number }

export interface ImportProgress { rows: number, bytes: number }

export interface FileImport {
  source: AsyncIterable<Buffer>
  recipe: Recipe
  mostBytes: number
  observations: ObservationsWriter
  onProgress?: (progress: ImportProgress) => void
  isCancelled?: () => boolean
}

export class ImportCancelled extends Error {}

/** Nothing at all could be taken: the first reasons, so that the recipe can be corrected. */
export class NothingTaken extends UnreadableFile {
  constructor(readonly first: readonly RefusedRow[], rowsRead: number) {
    super('nothing_taken', { rows: rowsRead, reason: first[0]?.reason ?? '', line: first[0]?.line ?? 0, column: first[0]?.column ?? '' })
  }
}

/**
 * Reads a source file by a recipe into chunks, all or nothing. Memory does not grow with the file.
 * @throws {UnreadableFile | NothingTaken | ImportCancelled} and then nothing is kept
 */
export async function importFile({ source, recipe, mostBytes, observations, onProgress, isCancelled }: FileImport): Promise<ImportedFile> {
  assertWhole(recipe)
  observations.begin()
  try {
    const days = new OpenDays()
    const records = new Map<string, OpenRecord>()
    const recordOf = (station: string): OpenRecord => {
      let record = records.get(station)
      if (!record) {
        if (records.size >= mostStations) throw new UnreadableFile('too_many_stations', { column: recipe.stationColumn?.name ?? '', limit: mostStations })
        record = new OpenRecord(observations, days, recipe)
        records.set(station, record)
      }
      return record
    }
    const reader: RowReader = new RowReader(recipe, row => recordOf(row.station ?? reader.neighbor).take(row))
    let bytes = 0
    for await (const chunk of unpacked(source, { mostBytes, limitLabel: `${Math.floor(mostBytes / 1_048_576)} MiB` })) {
      if (isCancelled?.()) throw new ImportCancelled()
      reader.push(chunk)
      bytes += chunk.length
      onProgress?.({ rows: reader.rows, bytes })
    }
    reader.end()
    const columns = recipe.columns.map((column, no): StoredColumn => ({
      no, name: column.title, quantity: column.quantity, unitUcum: column.unit, decimals: column.decimals ?? reader.decimals[no]!, heightM: column.heightM, role: column.role,
    }))
    const taken = [...records.entries()].filter(([, record]) => record.taken > 0)
    if (taken.length === 0) throw new NothingTaken([...records.values()][0]?.refused.first ?? [], reader.rows)
    // Rows of a station from which nothing could be taken are listed with the first record, so that none is lost.
    const lost = [...records.entries()].filter(([, record]) => record.taken === 0)
    for (const [, record] of lost) taken[0]![1].inherit(record)
    const imported = taken.map(([station, record]) => record.finish(station, columns))
    if (isCancelled?.()) throw new ImportCancelled()
    observations.commit()
    return { records: imported, rowsRead: reader.rows, commentLines: reader.commentLines, doubledRows: reader.doubled }
  }
  catch (error) {
    observations.rollback()
    throw error
  }
}

class OpenRecord {
  taken = 0
  refused: RefusedRows
  private inherited = 0
  private inheritedChunks: string[] = []
  private readonly writer: RecordWriter

  constructor(observations: ObservationsWriter, days: OpenDays, private readonly recipe: Recipe) {
    this.refused = new RefusedRows(observations)
    this.writer = new RecordWriter(observations, days, { kind: recipe.kind, isInterval: recipe.stampMeans !== 'instant', heightDatum: recipe.heightDatum, columnCount: recipe.columns.length })
  }

  take(row: RowOutcome): void {
    if (!row.took) {
      this.refused.add(row.line, row.column, row.text, row.reason)
      return
    }
    this.taken += 1
    if (this.recipe.kind === 'flight' && this.taken > longestFlight) throw new UnreadableFile('flight_too_long', { limit: longestFlight })
    this.writer.add(row.at, row.line, row.values)
  }

  inherit(other: OpenRecord): void {
    this.inherited += other.refused.count
    this.inheritedChunks.push(...other.refused.finish())
  }

  finish(station: string, columns: StoredColumn[]): ImportedRecord {
    const { root, firstAt, lastAt } = this.writer.finish(columns, judgeDays(columns, this.recipe.kind))
    const rowsRefused = this.refused.count + this.inherited
    return {
      station, rootSha256: root, rowsRead: this.taken + rowsRefused, rowsTaken: this.taken, rowsRefused, firstAt, lastAt, columns,
      refusals: [...this.refused.finish(), ...this.inheritedChunks],
    }
  }
}

/** A station record needs a clock; a flight needs a height or a pressure. */
function assertWhole(recipe: Recipe): void {
  const hasClock = recipe.time.form !== 'none' && !(recipe.time.form === 'elapsed' && recipe.time.startsAt === null)
  if (recipe.kind === 'station' && !hasClock) throw new UnreadableFile('no_time_column')
  if (recipe.kind === 'flight' && !recipe.columns.some(column => column.quantity === 'height' || column.quantity === 'pressure')) throw new UnreadableFile('no_height_column')
}
