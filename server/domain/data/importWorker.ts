import { existsSync } from 'node:fs'
import { createRequire } from 'node:module'
import { fileURLToPath, pathToFileURL } from 'node:url'
import { Worker } from 'node:worker_threads'
import { runImportTask, type ImportMessage, type ImportTask } from '../../importing/importTask'

export interface RunningWorker { ended: Promise<ImportMessage>, kill: () => Promise<void> }

/**
 * Starts the import worker. In the built server it is a bundle beside the entry; run from the sources it is the source file,
 * read through tsx. The address is looked up at each start: in a built server the module's own one is known only after start-up.
 */
export function startImportWorker(task: ImportTask, onProgress: (message: Extract<ImportMessage, { is: 'progress' }>) => void, file = workerFile()): RunningWorker {
  // A small young generation: an import makes many short-lived values, and a large one would only let them pile up.
  const options = { workerData: task, resourceLimits: { maxOldGenerationSizeMb: 256, maxYoungGenerationSizeMb: 6 } }
  const worker = file.pathname.endsWith('.ts') ? new Worker(throughTsx(file), { ...options, eval: true }) : new Worker(file, options)
  const ended = new Promise<ImportMessage>((resolve, reject) => {
    worker.on('message', (message: ImportMessage) => message.is === 'progress' ? onProgress(message) : resolve(message))
    worker.once('error', reject)
    worker.once('exit', code => reject(new Error(`The import worker ended with ${code} before it was done.`)))
  })
  return { ended, kill: async () => void await worker.terminate() }
}

/** The same in this thread: for the demo's making, where nobody waits for the thread and starting workers would take longest. */
export function runInThisThread(task: ImportTask): RunningWorker {
  const ended = new Promise<ImportMessage>((resolve, reject) => {
    runImportTask(task, (message) => { if (message.is !== 'progress') resolve(message) }).catch(reject)
  })
  return { ended, kill: async () => {} }
}

/** A worker does not inherit the loader of its parent, so it registers its own. */
function throughTsx(file: URL): string {
  const loader = pathToFileURL(createRequire(import.meta.url).resolve('tsx/esm/api')).href
  return `import(${JSON.stringify(loader)}).then(({ register }) => { register(); return import(${JSON.stringify(file.href)}) })`
}

function workerFile(): URL {
  const built = new URL('./workers/importRecord.mjs', import.meta.url)
  return existsSync(fileURLToPath(built)) ? built : new URL('../../workers/importRecord.ts', import.meta.url)
}
