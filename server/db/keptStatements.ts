import type SQLite from 'better-sqlite3'
import type { SqliteDatabase } from 'kysely'

const mostKept = 400

/**
 * The same connection, with its prepared statements kept at hand by their text: preparing each anew took as long as running it.
 * A statement that is still being read is prepared once more, so that two readers never share one.
 */
export function keptStatements(database: SQLite.Database): SqliteDatabase {
  const kept = new Map<string, SQLite.Statement>()
  return {
    close: () => database.close(),
    prepare(text) {
      const known = kept.get(text)
      if (known && !known.busy) return known
      const statement = database.prepare(text)
      if (kept.size >= mostKept) kept.delete(kept.keys().next().value ?? '')
      kept.set(text, statement)
      return statement
    },
  }
}
