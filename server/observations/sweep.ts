import { join } from 'node:path'
import SQLite from 'better-sqlite3'
import { writingPragmas } from '../db/dialect'
import { openObservations } from './chunks'
import { decodeMonth } from './form'
import { readRoot } from './root'

/**
 * Removes chunks that no version names: left by an import that ended between its chunks and its row.
 * Never beside an import or a backup.
 * @param live roots of all versions, and the chunks that list refused rows
 */
export function sweepChunks(dataDir: string, live: { roots: readonly Buffer[], refusals: readonly Buffer[] }): number {
  const observations = openObservations(dataDir)
  const db = new SQLite(join(dataDir, 'observations.db'))
  try {
    for (const pragma of writingPragmas) db.pragma(pragma)
    db.exec('create temp table live (sha256 blob primary key) strict')
    const keep = db.prepare('insert into live (sha256) values (?) on conflict do nothing')
    db.exec('begin immediate')
    for (const root of live.roots) {
      keep.run(root)
      for (const { sha256 } of readRoot(observations, root).months) {
        const month = Buffer.from(sha256, 'hex')
        keep.run(month)
        for (const day of decodeMonth(observations.getChunk(month).bytes).days) {
          keep.run(Buffer.from(day.values, 'hex'))
          keep.run(Buffer.from(day.flags, 'hex'))
        }
      }
    }
    for (const chunk of live.refusals) keep.run(chunk)
    const { changes } = db.prepare('delete from chunk where kind <> \'supply\' and sha256 not in (select sha256 from live)').run()
    db.exec('commit')
    return changes
  }
  finally {
    db.close()
    observations.close()
  }
}
