import { createHash } from 'node:crypto'
import type { Recipe } from '#shared/schemas/data'
import type { Stores } from '../server/db/writer'
import { acceptUpload } from '../server/domain/data/acceptUpload'
import { ImportRunner } from '../server/domain/data/importRunner'
import { startImport } from '../server/domain/data/startImport'
import type { FileStore } from '../server/files/store'
import type { Acting } from '../server/domain/people/actor'
import { place } from './generator/place'
import type { LoggerFile } from './observing'

/** What a technician says of each column beyond what the file says itself. */
const titles: Readonly<Record<string, string>> = {
  'air-temperature': 'Air temperature', 'relative-humidity': 'Relative humidity', 'pressure': 'Pressure', 'wind-speed': 'Wind speed', 'wind-gust': 'Gust', 'wind-direction': 'Wind from',
  'global-radiation': 'Global radiation', 'precipitation': 'Rain', 'height': 'Height', 'elapsed-time': 'Elapsed time',
}
const aboveRoofM: Readonly<Record<string, number>> = { 'air-temperature': 2, 'relative-humidity': 2, 'wind-speed': 6, 'wind-gust': 6, 'wind-direction': 6, 'global-radiation': 2, 'precipitation': 1 }

/** Brings files in as the technician does: to disk, looked at, the guess put right, imported. */
export class Technician {
  private readonly runner: ImportRunner
  private clock = 0

  constructor(private readonly stores: Stores, private readonly files: FileStore, dataDir: string) {
    this.runner = new ImportRunner({ stores, files, dataDir, mostBytes: 16_000_000, now: () => this.clock, isInThisThread: true })
  }

  /** Returns the version of the data set that came of it. */
  async bringIn(file: LoggerFile, by: { acting: Acting, personId: string, courseId: string }, now: number): Promise<string> {
    this.clock = now
    const key = createHash('sha256').update(file.fileName).digest('hex').slice(0, 32)
    const upload = await acceptUpload(this.stores, this.files, {
      courseId: by.courseId, actorId: by.acting.actorId, personId: by.personId, name: file.fileName, body: bytesOf(file.content), expectedBytes: Buffer.byteLength(file.content), request: { key: `upload-${key}`, route: 'POST upload' },
    }, now)
    const recipe = confirmed(upload.guess.recipe, file)
    const { jobId } = await startImport(this.stores, {
      acting: by.acting, personId: by.personId, courseId: by.courseId, uploadId: upload.id, recipe, forDepartment: true,
      request: { key: `import-${key}`, route: 'POST import', bodySha256: createHash('sha256').update(JSON.stringify(recipe)).digest() },
    }, now)
    await this.runner.enqueue(jobId)
    const version = await this.stores.read.selectFrom('data_set_version').innerJoin('data_set', 'data_set.id', 'data_set_version.data_set_id').select('data_set_version.id').where('data_set.title', '=', file.title).executeTakeFirst()
    if (version) return version.id
    const job = await this.stores.read.selectFrom('job').select(['state', 'error_json']).where('id', '=', jobId).executeTakeFirstOrThrow()
    throw new Error(`${file.fileName} was not imported: ${job.state} ${job.error_json ?? ''}`)
  }
}

/** The guess at a file's layout, with what only the technician knows. */
function confirmed(guess: Recipe, file: LoggerFile): Recipe {
  const isFlight = file.kind === 'flight'
  return {
    ...guess,
    title: file.title,
    zone: file.kind === 'field' ? place.zone : 'UTC',
    stampMeans: isFlight ? 'instant' : 'end',
    intervalS: isFlight ? null : file.everyMinutes * 60,
    heightDatum: isFlight ? 'ground' : file.kind === 'roof' ? 'roof' : 'ground',
    columns: guess.columns.map(column => ({
      ...column,
      title: titles[column.quantity] ?? column.title,
      missingCodes: isFlight ? column.missingCodes : [file.kind === 'roof' ? '-9999' : '---'],
      heightM: isFlight ? null : file.kind === 'roof' ? aboveRoofM[column.quantity] ?? null : column.quantity === 'pressure' ? null : 2,
    })),
  }
}

async function* bytesOf(text: string): AsyncGenerator<Uint8Array> {
  yield Buffer.from(text, 'utf8')
}
