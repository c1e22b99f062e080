import { parentPort, workerData } from 'node:worker_threads'
import { runImportTask, type ImportTask } from '../importing/importTask'

/** Reads a source file into chunks beside the server's own thread. */
const port = parentPort
if (!port) throw new Error('This is a worker: it is started, not imported.')
await runImportTask(workerData as ImportTask, message => port.postMessage(message))
