// Makes the demo: an invented department, through the same use cases that serve people, in a folder of its own that is put in place when it is whole.
import { randomBytes } from 'node:crypto'
import { closeSync, existsSync, fsyncSync, mkdirSync, openSync, readdirSync, renameSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { DomainError } from '#shared/errors'
import { openDatabase } from '../db/open'
import { loadShare } from '../domain/shares/loadShare'
import { keepReference, loadReference } from '../domain/marking/reference'
import { openFileStore } from '../files/store'
import { openObservations } from '../observations/chunks'
import { makeDemo, type Made } from '../../seeds/scenarios'
import { bundleReference } from './bundleReference'
import { now } from '../utils/now'

const root = fileURLToPath(new URL('../..', import.meta.url))
const dataDir = process.env.DATA_DIR || './.data'
const isQuietWhenFull = process.argv.includes('--when-empty')
process.env.AUTH_SECRET ??= randomBytes(48).toString('base64url') // every link of the demo is used up when it is made

const startedAt = Date.now()
if (!await isEmpty()) {
  if (isQuietWhenFull) process.exit(0)
  console.error(`There is a department in ${dataDir} already. Name another folder with DATA_DIR, or remove it first.`)
  process.exit(1)
}
const making = join(dataDir, '.demo-in-the-making')
try {
  rmSync(making, { recursive: true, force: true })
  mkdirSync(making, { recursive: true })
  const counts = await make()
  putInPlace()
  console.log(`${Object.entries(counts).map(([what, count]) => `${what}=${count}`).join(' ')} seconds=${((Date.now() - startedAt) / 1000).toFixed(1)}`)
}
catch (error) {
  rmSync(making, { recursive: true, force: true })
  console.error(`The demo could not be made: ${error instanceof Error ? error.stack ?? error.message : String(error)}${error instanceof DomainError ? ` ${JSON.stringify(error.facts)} ${JSON.stringify(error.fields)}` : ''}`)
  process.exit(1)
}

async function isEmpty(): Promise<boolean> {
  const database = await openDatabase(dataDir)
  const anybody = await database.read.selectFrom('person').select('id').limit(1).executeTakeFirst()
  await database.close()
  return anybody === undefined
}

/** Nobody is told of anything until all of it is there, so nothing need be on the disk before the end. */
async function make(): Promise<Made> {
  const database = await openDatabase(making)
  const observations = openObservations(making)
  try {
    database.raw.pragma('synchronous = OFF')
    const { bundle, goldenSha256 } = await bundleReference(root)
    const reference = await loadReference(bundle, goldenSha256)
    await keepReference(database.write, reference, now())
    return await makeDemo({
      stores: database, observations, files: openFileStore(making), dataDir: making, secret: randomBytes(32).toString('hex'), now: now(),
      judging: { reference, loadShare: shareId => loadShare(database.read, observations, shareId) },
    })
  }
  finally {
    observations.close()
    await database.close()
  }
}

/** Moves the finished demo to where the server looks; the database last, since with it the department is there. */
function putInPlace(): void {
  const names = readdirSync(making).sort((a, b) => Number(a === 'main.db') - Number(b === 'main.db'))
  for (const name of names) sync(join(making, name))
  for (const ending of ['', '-wal', '-shm']) rmSync(join(dataDir, `main.db${ending}`), { force: true })
  for (const name of names) {
    if (existsSync(join(dataDir, name))) rmSync(join(dataDir, name), { recursive: true })
    renameSync(join(making, name), join(dataDir, name))
  }
  rmSync(making, { recursive: true })
  sync(dataDir)
}

function sync(path: string): void {
  const file = openSync(path, 'r')
  fsyncSync(file)
  closeSync(file)
}
