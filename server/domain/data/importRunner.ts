import type { Recipe, RefusedRow } from '#shared/schemas/data'
import { DomainError, type RefusalCode } from '#shared/errors'
import type { Stores } from '../../db/writer'
import type { FileStore } from '../../files/store'
import type { ImportedFile } from '../../importing/importFile'
import type { ImportMessage, ImportTask } from '../../importing/importTask'
import { getUpload } from './describeUpload'
import { runInThisThread, startImportWorker, type RunningWorker } from './importWorker'
import { liveChunks } from './liveChunks'
import { publishVersions } from './publishVersions'
import { importJobKind, type ImportPayload } from './startImport'

export interface ImportRunnerParts {
  stores: Stores
  files: FileStore
  dataDir: string
  mostBytes: number
  now: () => number
  /** Another worker than the product's own: for tests of its death. */
  workerFile?: URL
  /** Import in this thread instead of a worker: for making the demo. */
  isInThisThread?: boolean
}

export interface LiveImport { rows: number, fraction: number, startedAt: number }

/** Why an import ended without a data set; kept in `job.error_json`. */
export interface ImportFailure { code: RefusalCode, facts: Readonly<Record<string, string | number>>, first: readonly RefusedRow[] }

const noteEveryMs = 1000

/** Does imports one after the other: the chunks have one writer. Each is all or nothing. */
export class ImportRunner {
  private queue: Promise<void> = Promise.resolve()
  private readonly live = new Map<string, LiveImport & { cancel: Int32Array, worker: RunningWorker }>()
  private isStopping = false

  constructor(private readonly parts: ImportRunnerParts) {}

  /** Where a running import is; null when it is not running here. */
  progress(jobId: string): LiveImport | null {
    return this.live.get(jobId) ?? null
  }

  enqueue(jobId: string): Promise<void> {
    this.queue = this.queue.then(() => this.isStopping ? undefined : this.run(jobId)).catch((error: unknown) => {
      console.error(`Import ${jobId} could not be noted: ${String(error)}`)
    })
    return this.queue
  }

  /** Stops a running import; what it had put goes back. */
  cancel(jobId: string): void {
    const running = this.live.get(jobId)
    if (running) Atomics.store(running.cancel, 0, 1)
  }

  /** Imports that an earlier process left in the middle have failed; waiting ones go on. Chunks that nothing names are removed. */
  async resume(): Promise<void> {
    const { stores } = this.parts
    await this.parts.files.sweep()
    const left = await stores.read.selectFrom('job').select(['id', 'state']).where('kind', '=', importJobKind).where('state', 'in', ['waiting', 'leased']).orderBy('created_at').execute()
    const broken = left.filter(job => job.state === 'leased')
    for (const job of broken) await this.fail(job.id, { code: 'import_failed', facts: { reason: 'The server ended while the import was running. Nothing was kept of it; start it again.' }, first: [] })
    if (broken.length > 0) this.queue = this.queue.then(() => this.sweep())
    for (const job of left.filter(entry => entry.state === 'waiting')) void this.enqueue(job.id)
  }

  async stop(): Promise<void> {
    this.isStopping = true
    for (const running of this.live.values()) Atomics.store(running.cancel, 0, 1)
    await this.queue
  }

  private async run(jobId: string): Promise<void> {
    const { stores, files, dataDir, mostBytes, now } = this.parts
    const payload = await this.lease(jobId)
    if (!payload) return
    const upload = await getUpload(stores.read, payload.uploadId)
    const cancel = new Int32Array(new SharedArrayBuffer(4))
    let notedAt = now()
    const task: ImportTask = { kind: 'import', dataDir, file: files.pathOf(upload.sha256), recipe: payload.recipe, mostBytes, cancel: cancel.buffer }
    const worker = this.parts.isInThisThread ? runInThisThread(task) : startImportWorker(task, (progress) => {
      const running = this.live.get(jobId)
      if (!running) return
      running.rows = progress.rows
      running.fraction = Math.min(1, progress.readBytes / Math.max(1, upload.size))
      if (now() - notedAt < noteEveryMs) return
      notedAt = now()
      void this.note(jobId, running)
    }, this.parts.workerFile)
    this.live.set(jobId, { rows: 0, fraction: 0, startedAt: now(), cancel, worker })
    try {
      await this.settle(jobId, payload, upload.sha256, await worker.ended)
    }
    catch (error) {
      console.error(`Import ${jobId}: ${error instanceof Error ? error.stack : String(error)}`)
      await this.fail(jobId, { code: 'import_failed', facts: { reason: 'The import stopped unexpectedly. Nothing was kept of it; try again, and tell the department admin if it happens twice.' }, first: [] })
    }
    finally {
      this.live.delete(jobId)
      await worker.kill()
    }
  }

  private async settle(jobId: string, payload: ImportPayload, sourceSha256: Buffer, message: ImportMessage): Promise<void> {
    const { stores, now } = this.parts
    if (message.is === 'refused') return this.fail(jobId, { code: message.code, facts: message.facts, first: message.first })
    if (message.is === 'cancelled') {
      const isStopped = this.isStopping
      await stores.write(trx => trx.updateTable('job').set({ state: isStopped ? 'waiting' : 'cancelled' }).where('id', '=', jobId).where('state', '=', 'leased').execute())
      return
    }
    if (message.is !== 'done') throw new Error(`The import worker said ${message.is}.`)
    const file = withBuffers(message.file)
    try {
      await stores.write(trx => publishVersions(trx, { jobId, payload, sourceSha256, file }, now()))
    }
    catch (error) {
      await this.sweep() // the chunks were there, the version is not
      if (error instanceof DomainError && error.code === 'import_cancelled') return
      throw error
    }
  }

  private async lease(jobId: string): Promise<ImportPayload | null> {
    return this.parts.stores.write(async (trx) => {
      const job = await trx.selectFrom('job').select(['state', 'payload_json']).where('id', '=', jobId).executeTakeFirst()
      if (job?.state !== 'waiting') return null
      await trx.updateTable('job').set(columns => ({ state: 'leased' as const, attempts: columns('attempts', '+', 1) })).where('id', '=', jobId).execute()
      return JSON.parse(job.payload_json) as ImportPayload & { recipe: Recipe }
    })
  }

  private async note(jobId: string, running: LiveImport): Promise<void> {
    const all = running.fraction > 0 ? Math.max(running.rows, Math.round(running.rows / running.fraction)) : null
    await this.parts.stores.write(trx => trx.updateTable('job').set({ done_units: running.rows, all_units: all }).where('id', '=', jobId).where('state', '=', 'leased').execute())
  }

  private async fail(jobId: string, failure: ImportFailure): Promise<void> {
    await this.parts.stores.write(trx => trx.updateTable('job').set({ state: 'failed', error_json: JSON.stringify(failure) }).where('id', '=', jobId).where('state', 'in', ['waiting', 'leased']).execute())
  }

  private async sweep(): Promise<void> {
    const { roots, refusals } = await liveChunks(this.parts.stores.read)
    const task: ImportTask = { kind: 'sweep', dataDir: this.parts.dataDir, roots, refusals }
    const worker = this.parts.isInThisThread ? runInThisThread(task) : startImportWorker(task, () => {})
    await worker.ended.finally(worker.kill)
  }
}

/** Buffers come over from a worker as plain byte arrays. */
function withBuffers(file: ImportedFile): ImportedFile {
  return { ...file, records: file.records.map(record => ({ ...record, rootSha256: Buffer.from(record.rootSha256) })) }
}
