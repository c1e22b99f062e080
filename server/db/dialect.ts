import { sql, SqliteAdapter, SqliteDialect, type Kysely, type Transaction } from 'kysely'

/**
 * What this database says in its own words stands here and nowhere else.
 * Another database needs its own version of this file and of `open.ts`; queries are Kysely's and stay.
 */

/** SQLite's tables are made and changed inside transactions like any rows, so a migration is done whole or not at all. Kysely's own adapter denies it. */
class TransactionalAdapter extends SqliteAdapter {
  override get supportsTransactionalDdl(): boolean {
    return true
  }
}
export class HouseDialect extends SqliteDialect {
  override createAdapter(): SqliteAdapter {
    return new TransactionalAdapter()
  }
}

/** Runs a text of several statements, triggers included: statements end with a semicolon at the end of a line. */
export async function runStatements<T>(db: Kysely<T> | Transaction<T>, text: string): Promise<void> {
  for (const statement of statementsOf(text)) await sql.raw(statement).execute(db)
}

/** Splits at semicolons that end a line, but not inside a trigger's body, which closes with `end;`. */
export function statementsOf(text: string): string[] {
  const statements: string[] = []
  let open = ''
  for (const line of text.split('\n')) {
    open += `${line}\n`
    const code = line.replace(/--.*$/, '').trimEnd()
    if (!code.endsWith(';')) continue
    const isTrigger = /^\s*create trigger/i.test(open)
    if (isTrigger && !/\bend;$/i.test(code)) continue
    statements.push(open.trim())
    open = ''
  }
  if (open.trim() !== '') statements.push(open.trim())
  return statements
}

/**
 * The pragmas of a writing connection. FULL is said aloud: the build's default in WAL is NORMAL, which can lose acknowledged work.
 * What a savepoint may have to undo stays in memory: else it goes to a file in the system's temporary folder, at each submission.
 */
export const writingPragmas = ['journal_mode = WAL', 'synchronous = FULL', 'foreign_keys = ON', 'busy_timeout = 50', 'temp_store = MEMORY'] as const
export const readingPragmas = ['foreign_keys = ON', 'busy_timeout = 1000', 'query_only = ON'] as const

/** Below 3.51.3 two connections that write and checkpoint at once could corrupt the log. */
export const oldestDatabaseEngine = '3.51.3'

/** True for an error after which the whole transaction is gone, not only the piece of work that met it. */
export function endsTransaction(error: unknown): boolean {
  const code = typeof error === 'object' && error !== null && 'code' in error ? String(error.code) : ''
  return /^SQLITE_(FULL|IOERR|CORRUPT|NOTADB|NOMEM|READONLY|CANTOPEN|BUSY)/.test(code)
}

/** True when the storage itself failed at a sync: nothing that was promised since can be trusted. */
export function isFailedSync(error: unknown): boolean {
  const code = typeof error === 'object' && error !== null && 'code' in error ? String(error.code) : ''
  return code === 'SQLITE_IOERR_FSYNC' || code === 'SQLITE_IOERR_DIR_FSYNC'
}

/** True when the disk had no room (or refused the write), so that the asker can be told so. */
export function isOutOfRoom(error: unknown): boolean {
  const code = typeof error === 'object' && error !== null && 'code' in error ? String(error.code) : ''
  return /^SQLITE_(FULL|IOERR|READONLY)/.test(code)
}
