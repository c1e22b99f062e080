import { sql, type Kysely, type Transaction } from 'kysely'
import { endsTransaction, isFailedSync } from './dialect'
import type { Database } from './schema/tables'

export type Trx = Transaction<Database>
/** A unit of work. Inside it nothing is awaited but `trx`. */
export type Write = <T>(work: (trx: Trx) => Promise<T>) => Promise<T>
export type Read = Kysely<Database>
/** What a use case is handed: a read-only connection and the one way to write. */
export interface Stores { read: Read, write: Write }

interface Waiting {
  work: (trx: Trx) => Promise<unknown>
  resolve: (value: unknown) => void
  reject: (error: unknown) => void
}

/**
 * The only way to a writable transaction. Units of work that wait at the same time share one durable transaction,
 * each inside its own savepoint: a refusal undoes its own piece only, and every promise settles after the commit.
 *
 * `onFailedSync` is called when storage failed at a sync; the process should end then, since the system may have dropped
 * the pages it could not write and would report a later sync as good.
 */
export function groupWriter(db: Kysely<Database>, { most = 64, onFailedSync = () => {} }: { most?: number, onFailedSync?: (error: unknown) => void } = {}): Write {
  const waiting: Waiting[] = []
  let isBusy = false

  async function runBatch(batch: Waiting[]): Promise<void> {
    const settle: (() => void)[] = []
    try {
      await db.transaction().execute(async (trx) => {
        for (const job of batch) {
          await sql`savepoint job`.execute(trx)
          try {
            const value = await job.work(trx)
            settle.push(() => job.resolve(value))
          }
          catch (error) {
            if (endsTransaction(error)) throw error
            await sql`rollback to job`.execute(trx)
            settle.push(() => job.reject(error))
          }
          await sql`release job`.execute(trx)
        }
      })
    }
    catch (error) {
      for (const job of batch) job.reject(error)
      if (isFailedSync(error)) onFailedSync(error)
      return
    }
    for (const done of settle) done()
  }

  async function drain(): Promise<void> {
    isBusy = true
    await new Promise(setImmediate) // this turn's requests join
    while (waiting.length > 0) await runBatch(waiting.splice(0, most))
    isBusy = false
  }

  return <T>(work: (trx: Trx) => Promise<T>) => new Promise<T>((resolve, reject) => {
    waiting.push({ work, resolve: value => resolve(value as T), reject })
    if (!isBusy) void drain()
  })
}
