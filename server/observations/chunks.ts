import { createHash } from 'node:crypto'
import { existsSync, mkdirSync } from 'node:fs'
import { join } from 'node:path'
import SQLite from 'better-sqlite3'
import { readingPragmas, writingPragmas } from '../db/dialect'

export type ChunkKind = 'values' | 'flags' | 'month' | 'root' | 'refusals' | 'supply'

export interface Observations {
  /** @throws {Error} when there is no such chunk */
  getChunk: (sha256: Buffer) => { kind: ChunkKind, bytes: Buffer }
  hasChunk: (sha256: Buffer) => boolean
  close: () => void
}

export interface ObservationsWriter extends Observations {
  /** Keeps a chunk under the SHA-256 of its bytes. `isNew` is false when it was there already. */
  putChunk: (kind: ChunkKind, bytes: Buffer) => { sha256: Buffer, isNew: boolean }
  /** Takes back a chunk that this unit of work itself put: a day that got more rows. */
  dropChunk: (sha256: Buffer) => void
  /** All or nothing: chunks of an import are there together, durably, or not at all. */
  begin: () => void
  commit: () => void
  rollback: () => void
}

const schema = `create table if not exists chunk (
  sha256 blob primary key check (length(sha256) = 32), kind text not null check (kind in ('values','flags','month','root','refusals','supply')),
  bytes blob not null) strict;
create trigger if not exists chunk_no_update before update on chunk begin select raise(abort, 'chunk: immutable'); end;`

const fileName = 'observations.db'

/** Opens the chunks for reading, making the file where there is none yet. */
export function openObservations(dataDir: string): Observations {
  const file = join(dataDir, fileName)
  if (!existsSync(file)) openObservationsWriter(dataDir).close()
  const db = new SQLite(file, { readonly: true, fileMustExist: true })
  for (const pragma of readingPragmas) db.pragma(pragma)
  return { ...reading(db), close: () => void db.close() }
}

/** Opens the chunks for writing. One at a time: imports queue for it. */
export function openObservationsWriter(dataDir: string): ObservationsWriter {
  mkdirSync(dataDir, { recursive: true })
  const db = new SQLite(join(dataDir, fileName))
  for (const pragma of writingPragmas) db.pragma(pragma)
  db.pragma('busy_timeout = 5000') // another import may still be closing; nobody waits on this connection
  db.pragma('journal_size_limit = 67108864')
  db.exec(schema)
  const insert = db.prepare('insert into chunk (sha256, kind, bytes) values (?, ?, ?) on conflict (sha256) do nothing')
  const remove = db.prepare('delete from chunk where sha256 = ?')
  return {
    ...reading(db),
    putChunk(kind, bytes) {
      const sha256 = createHash('sha256').update(bytes).digest()
      return { sha256, isNew: insert.run(sha256, kind, bytes).changes === 1 }
    },
    dropChunk: sha256 => void remove.run(sha256),
    begin: () => void db.exec('begin immediate'),
    commit: () => void db.exec('commit'),
    rollback: () => { if (db.inTransaction) db.exec('rollback') },
    close: () => void db.close(),
  }
}

function reading(db: SQLite.Database): Pick<Observations, 'getChunk' | 'hasChunk'> {
  const select = db.prepare<[Buffer], { kind: ChunkKind, bytes: Buffer }>('select kind, bytes from chunk where sha256 = ?')
  const has = db.prepare<[Buffer], number>('select 1 from chunk where sha256 = ?').pluck()
  return {
    getChunk(sha256) {
      const row = select.get(sha256)
      if (!row) throw new Error(`No chunk ${sha256.toString('hex')}: the observations are older than the database that names it.`)
      return row
    },
    hasChunk: sha256 => has.get(sha256) === 1,
  }
}
