import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import SQLite from 'better-sqlite3'
import { Kysely, Migrator } from 'kysely'
import { HouseDialect, oldestDatabaseEngine, readingPragmas, writingPragmas } from './dialect'
import { keptStatements } from './keptStatements'
import { migrations } from './migrations'
import type { Database } from './schema/tables'
import { groupWriter, type Stores } from './writer'

export interface OpenDatabase extends Stores {
  /** The writing connection itself: for migrations, backup and checks, never for a use case. */
  connection: Kysely<Database>
  raw: SQLite.Database
  close: () => Promise<void>
}

export class NewerDatabaseError extends Error {
  constructor(readonly unknown: string[]) {
    super(`This database was made by a newer version (it knows ${unknown.join(', ')}). Start that version, or restore an older copy.`)
  }
}

/** Opens `main.db` in the data directory: one writing connection, one that only reads. Migrates first. */
export async function openDatabase(dataDir: string, onFailedSync?: (error: unknown) => void): Promise<OpenDatabase> {
  mkdirSync(dataDir, { recursive: true })
  const file = join(dataDir, 'main.db')
  const raw = new SQLite(file)
  for (const pragma of writingPragmas) raw.pragma(pragma)
  assertEngine(raw)
  const connection = new Kysely<Database>({ dialect: new HouseDialect({ database: keptStatements(raw) }) })
  await migrate(connection)
  // A fresh WAL file answers 2 before its first transaction whatever was set; after one the answer is true.
  raw.exec('begin immediate; create table if not exists sync_probe (n integer) strict; drop table sync_probe; commit')
  if (raw.pragma('synchronous', { simple: true }) !== 2) throw new Error('The database does not keep synchronous = FULL; acknowledged work could be lost. Not starting.')
  const reading = new SQLite(file, { readonly: true, fileMustExist: true })
  for (const pragma of readingPragmas) reading.pragma(pragma)
  const read = new Kysely<Database>({ dialect: new HouseDialect({ database: keptStatements(reading) }) })
  return {
    connection, raw, read,
    write: groupWriter(connection, { onFailedSync }),
    close: async () => {
      await read.destroy()
      await connection.destroy()
    },
  }
}

/** Opens `main.db` for a command that only reads, also beside a running server. Nothing is migrated. */
export function openForReading(dataDir: string): { read: Kysely<Database>, close: () => Promise<void> } {
  const reading = new SQLite(join(dataDir, 'main.db'), { readonly: true, fileMustExist: true })
  for (const pragma of readingPragmas) reading.pragma(pragma)
  const read = new Kysely<Database>({ dialect: new HouseDialect({ database: keptStatements(reading) }) })
  return { read, close: () => read.destroy() }
}

/** Brings the schema up to date, or refuses a database that a newer version made. */
export async function migrate(connection: Kysely<Database>): Promise<void> {
  const migrator = new Migrator({ db: connection, provider: { getMigrations: async () => migrations } })
  const applied = await appliedMigrations(connection)
  const unknown = applied.filter(name => !(name in migrations))
  if (unknown.length > 0) throw new NewerDatabaseError(unknown)
  const { error } = await migrator.migrateToLatest()
  if (error) throw error
}

async function appliedMigrations(connection: Kysely<Database>): Promise<string[]> {
  const tables = await connection.introspection.getTables({ withInternalKyselyTables: true })
  if (!tables.some(table => table.name === 'kysely_migration')) return []
  const rows = await connection.withTables<{ kysely_migration: { name: string } }>().selectFrom('kysely_migration').select('name').execute()
  return rows.map(row => row.name)
}

function assertEngine(raw: SQLite.Database): void {
  const version = String(raw.prepare('select sqlite_version()').pluck().get())
  const order = (text: string) => text.split('.').map(Number).reduce((sum, part) => sum * 1000 + part, 0)
  if (order(version) < order(oldestDatabaseEngine)) throw new Error(`SQLite ${version} is too old: ${oldestDatabaseEngine} is needed.`)
}
