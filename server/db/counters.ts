import { join } from 'node:path'
import SQLite from 'better-sqlite3'
import { RateLimiterMemory, RateLimiterRes, RateLimiterSQLite } from 'rate-limiter-flexible'

/** Counts tries by key over a window. Every answer is the seconds to wait, or null while there is room. */
export interface Counter {
  /** Counts one try. */
  take: (key: string) => Promise<number | null>
  /** Looks without counting. */
  look: (key: string) => Promise<number | null>
  /** Takes one try back. */
  giveBack: (key: string) => Promise<void>
  clear: (key: string) => Promise<void>
}

export interface Counters {
  counter: (name: string, most: number, seconds: number) => Counter
  close: () => void
}

/**
 * Tries are counted in a file of their own: they survive a restart, cost the main file no durable write, and where the disk
 * is full they go on in memory, so that signing in does not stop.
 */
export function openCounters(dataDir: string): Counters {
  const file = new SQLite(join(dataDir, 'limits.db'))
  file.pragma('journal_mode = WAL')
  file.pragma('synchronous = NORMAL') // a try forgotten in a power cut is no loss
  file.pragma('busy_timeout = 50')
  file.exec('create table if not exists tries (key text primary key, points integer not null default 0, expire integer) strict')
  return {
    counter(name, most, seconds) {
      const limits = { keyPrefix: name, points: most, duration: seconds }
      const limiter = new RateLimiterSQLite({
        ...limits, storeClient: file, storeType: 'better-sqlite3', tableName: 'tries', tableCreated: true, clearExpiredByTimeout: true,
        insuranceLimiter: new RateLimiterMemory(limits),
      })
      return {
        async take(key) {
          try {
            await limiter.consume(key)
            return null
          }
          catch (refused) {
            if (refused instanceof RateLimiterRes) return secondsOf(refused.msBeforeNext)
            throw refused
          }
        },
        async look(key) {
          const seen = await limiter.get(key)
          return seen && seen.consumedPoints >= most ? secondsOf(seen.msBeforeNext) : null
        },
        async giveBack(key) {
          await limiter.reward(key)
        },
        async clear(key) {
          await limiter.delete(key)
        },
      }
    },
    close: () => file.close(),
  }
}

const secondsOf = (ms: number) => Math.max(1, Math.ceil(ms / 1000))
