import { existsSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { Worker } from 'node:worker_threads'
import type { ImportMessage, ImportTask } from '../../workers/importRecord'

export interface RunningWorker { ended: Promise<ImportMessage>, kill: () => Promise<void> }

/**
 * Starts the import worker. In the built server it is a bundle beside the entry; run from the sources it is the source file,
 * read through tsx. The address is looked up at each start: in a built server the module's own one is known only after start-up.
 */
export function startImportWorker(task: ImportTask, onProgress: (message: Extract<ImportMessage, { is: 'progress' }>) => void, file = workerFile()): RunningWorker {
  const worker = new Worker(file, {
    workerData: task, resourceLimits: { maxOldGenerationSizeMb: 256 },
    ...(file.pathname.endsWith('.ts') ? { execArgv: ['--import', 'tsx'] } : {}),
  })
  const ended = new Promise<ImportMessage>((resolve, reject) => {
    worker.on('message', (message: ImportMessage) => message.is === 'progress' ? onProgress(message) : resolve(message))
    worker.once('error', reject)
    worker.once('exit', code => reject(new Error(`The import worker ended with ${code} before it was done.`)))
  })
  return { ended, kill: async () => void await worker.terminate() }
}

function workerFile(): URL {
  const built = new URL('./workers/importRecord.mjs', import.meta.url)
  return existsSync(fileURLToPath(built)) ? built : new URL('../../workers/importRecord.ts', import.meta.url)
}
