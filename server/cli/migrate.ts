// Brings the database up to date, or says in one line why it can't.
import { NewerDatabaseError, openDatabase } from '../db/open'

const dataDir = process.env.DATA_DIR || './.data'
try {
  const database = await openDatabase(dataDir)
  await database.close()
  console.log(`migrated=${dataDir}`)
}
catch (error) {
  const code = error instanceof Error && 'code' in error ? String(error.code) : ''
  const why = error instanceof NewerDatabaseError
    ? error.message
    : code === 'SQLITE_NOTADB'
      ? `${dataDir}/main.db is not a database of Tetherhouse. Name another folder with DATA_DIR, or restore a copy.`
      : /^SQLITE_(READONLY|CANTOPEN|IOERR|FULL)/.test(code)
        ? `The database in ${dataDir} cannot be written (${code}). Free or unlock the disk, or name another folder with DATA_DIR.`
        : `The database in ${dataDir} could not be brought up to date: ${error instanceof Error ? error.message : String(error)}`
  console.error(why)
  process.exit(1)
}
