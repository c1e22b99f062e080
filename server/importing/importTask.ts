import { createReadStream } from 'node:fs'
import type { Recipe, RefusedRow } from '#shared/schemas/data'
import { openObservationsWriter } from '../observations/chunks'
import { sweepChunks } from '../observations/sweep'
import { ImportCancelled, importFile, NothingTaken, type ImportedFile } from './importFile'
import { UnreadableFile } from './unreadable'

export type ImportTask =
  | { kind: 'import', dataDir: string, file: string, recipe: Recipe, mostBytes: number, cancel: SharedArrayBuffer }
  | { kind: 'sweep', dataDir: string, roots: Uint8Array[], refusals: Uint8Array[] }

export type ImportMessage =
  | { is: 'progress', rows: number, readBytes: number }
  | { is: 'done', file: ImportedFile }
  | { is: 'swept', chunks: number }
  | { is: 'refused', code: UnreadableFile['code'], facts: UnreadableFile['facts'], first: readonly RefusedRow[] }
  | { is: 'cancelled' }

const progressEveryMs = 200

async function readFileInto(task: Extract<ImportTask, { kind: 'import' }>, tell: (message: ImportMessage) => void): Promise<void> {
  const cancel = new Int32Array(task.cancel)
  const observations = openObservationsWriter(task.dataDir)
  try {
    let readBytes = 0
    let toldAt = 0
    const counted = async function* () {
      for await (const chunk of createReadStream(task.file, { highWaterMark: 65_536 })) {
        readBytes += (chunk as Buffer).length
        yield chunk as Buffer
      }
    }
    const file = await importFile({
      source: counted(), recipe: task.recipe, mostBytes: task.mostBytes, observations,
      isCancelled: () => Atomics.load(cancel, 0) === 1,
      onProgress: ({ rows }) => {
        const at = Date.now()
        if (at - toldAt < progressEveryMs) return
        toldAt = at
        tell({ is: 'progress', rows, readBytes })
      },
    })
    tell({ is: 'done', file })
  }
  catch (error) {
    if (error instanceof ImportCancelled) tell({ is: 'cancelled' })
    else if (error instanceof UnreadableFile) tell({ is: 'refused', code: error.code, facts: error.facts, first: error instanceof NothingTaken ? error.first : [] })
    else throw error
  }
  finally {
    observations.close()
  }
}

/** What the import worker does when it is asked. Tells of its progress, and once how it ended. */
export async function runImportTask(task: ImportTask, tell: (message: ImportMessage) => void): Promise<void> {
  if (task.kind === 'import') return readFileInto(task, tell)
  const buffers = (arrays: readonly Uint8Array[]) => arrays.map(bytes => Buffer.from(bytes))
  tell({ is: 'swept', chunks: sweepChunks(task.dataDir, { roots: buffers(task.roots), refusals: buffers(task.refusals) }) })
}
