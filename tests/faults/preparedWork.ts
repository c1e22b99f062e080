import { readdirSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as later } from 'node:timers/promises'
import SQLite from 'better-sqlite3'
import { startBuiltServer } from '../fixtures/builtServer'
import { copyOf, demoWorld } from '../fixtures/demoWorld'
import { findOpenWork, type OpenWork } from './openWork'

export interface PreparedWork extends OpenWork { dir: string, remove: () => void }

/** A lived-in department at rest: a student signed in, with work that can be handed in again and again, no mail waiting, no log left to bring over. */
export async function preparedWork(): Promise<PreparedWork> {
  const dir = copyOf(demoWorld())
  const server = await startBuiltServer({ dataDir: dir, env: { DEMO: '1' } })
  try {
    const work = await findOpenWork(server.url)
    await mailIsOut(dir)
    return { ...work, dir, remove: () => rmSync(dir, { recursive: true, force: true }) }
  }
  finally {
    await server.stop()
    const raw = new SQLite(join(dir, 'main.db'))
    raw.exec('update posting set attempts = 100000')
    raw.close()
    bringOver(dir)
  }
}

/** Waits until the outbox is empty; false when it does not get so within 15 s. */
export async function mailIsOut(dir: string, isOver: () => boolean = () => false): Promise<boolean> {
  const raw = new SQLite(join(dir, 'main.db'), { readonly: true })
  const waiting = raw.prepare('select count(*) from outbox where state = \'waiting\'').pluck()
  try {
    for (const until = Date.now() + 15_000; Date.now() < until && !isOver();) {
      if (waiting.get() === 0) return true
      await later(50)
    }
    return false
  }
  finally {
    raw.close()
  }
}

/** Brings the logs over into the databases, also under a server that rests: what is written next begins an empty log. */
export function bringOver(dir: string): void {
  for (const name of readdirSync(dir).filter(each => each.endsWith('.db'))) {
    const raw = new SQLite(join(dir, name))
    raw.pragma('wal_checkpoint(TRUNCATE)')
    raw.close()
  }
}
