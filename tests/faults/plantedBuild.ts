import { cpSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

const output = fileURLToPath(new URL('../../.output', import.meta.url))

/** A bug that a detector must see: a piece of the built server's text, and what stands there instead. */
export interface Plant { find: string, put: string }

/** The writer that answers a submission before its transaction is on the disk: what must never be. Other work is answered as ever, so that signing in goes on. */
export const answerBeforeCommit: Plant = {
  find: 'settle.push(() => job.resolve(value));',
  put: 'if (value && value.receipt) { job.resolve(value); await new Promise((later) => setTimeout(later, 400)); } else settle.push(() => job.resolve(value));',
}

/** The writer that commits each unit of work alone: right, and slow when many wait. */
export const commitAlone: Plant = { find: 'waiting.splice(0, most)', put: 'waiting.splice(0, 1)' }

/** The writer that brings the log over into the database at each commit. */
export const bringOverAtEachCommit: Plant = { find: 'for (const done of settle) done();', put: 'await sql`pragma wal_checkpoint(full)`.execute(db); for (const done of settle) done();' }

/** The connection that prepares every statement anew. */
export const prepareEachTime: Plant = { find: 'if (known && !known.busy) return known;', put: '' }

/** A copy of the built server with a bug in it; its entry and how to remove it. The product itself has no seam for this. */
export function plantedBuild(plant: Plant): { entry: string, remove: () => void } {
  const dir = mkdtempSync(join(tmpdir(), 'tetherhouse-planted-'))
  cpSync(output, dir, { recursive: true, verbatimSymlinks: true })
  const files = readdirSync(join(dir, 'server/chunks'), { recursive: true, withFileTypes: true }).filter(entry => entry.isFile() && entry.name.endsWith('.mjs')).map(entry => join(entry.parentPath, entry.name))
  const hits = files.filter(file => readFileSync(file, 'utf8').includes(plant.find))
  if (hits.length === 0) throw new Error(`The bug has nowhere to be planted: "${plant.find}" is not in the built server.`)
  for (const file of hits) writeFileSync(file, readFileSync(file, 'utf8').replaceAll(plant.find, plant.put))
  return { entry: join(dir, 'server/index.mjs'), remove: () => rmSync(dir, { recursive: true, force: true }) }
}
