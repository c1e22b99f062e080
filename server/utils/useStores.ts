import { openDatabase, type OpenDatabase } from '../db/open'
import type { Stores } from '../db/writer'

let opening: Promise<OpenDatabase> | undefined
let opened: OpenDatabase | undefined

/** Opens the database once for this process; later calls get the same one. */
export function openStores(): Promise<OpenDatabase> {
  opening ??= openDatabase(dataDir(), (error) => {
    console.error(`Storage failed at a sync; ending so that nothing more is promised: ${String(error)}`)
    process.exit(70)
  }).then(database => (opened = database))
  return opening
}

/** The read-only connection and the writer, for use cases. Requests wait for `openStores` in `plugins/open.ts`. */
export function useStores(): Stores {
  if (!opened) throw new Error('The database is not open yet.')
  return opened
}

export async function closeStores(): Promise<void> {
  const database = opened
  opened = undefined
  opening = undefined
  await database?.close()
}

/** Where everything that must be kept lies. */
export function dataDir(): string {
  return process.env.DATA_DIR || './.data'
}
