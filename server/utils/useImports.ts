import { uploadLimit } from '../domain/data/limits'
import { ImportRunner } from '../domain/data/importRunner'
import { openFileStore, type FileStore } from '../files/store'
import { openObservations, type Observations } from '../observations/chunks'
import { now } from './now'
import { dataDir, useStores } from './useStores'

let observations: Observations | undefined
let files: FileStore | undefined
let runner: ImportRunner | undefined

/** The chunks of all data sets, for reading. */
export function useObservations(): Observations {
  observations ??= openObservations(dataDir())
  return observations
}

/** Source files and students' files. */
export function useFiles(): FileStore {
  files ??= openFileStore(dataDir())
  return files
}

/** The one that does imports in this process. */
export function useImports(): ImportRunner {
  runner ??= new ImportRunner({ stores: useStores(), files: useFiles(), dataDir: dataDir(), mostBytes: uploadLimit().mostBytes, now })
  return runner
}

export async function closeImports(): Promise<void> {
  await runner?.stop()
  observations?.close()
  runner = undefined
  observations = undefined
}
