import { spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

/**
 * Syncs (fsync and fdatasync) for each acknowledged submission, at 1 client and at 32, counted by strace from outside.
 * The same program runs once without a submission; what it needs then is taken off. A count of zero would be a check that cannot fail, and is an error.
 *
 *   node --import tsx tests/bench/submissionSyncs.ts
 */
const here = fileURLToPath(import.meta.url)
const rounds = 20

export interface SyncsFigure { clients: number, submissions: number, syncs: number, perSubmission: number }

export function countSyncs(clients: number): SyncsFigure {
  const submissions = clients * rounds
  const [without, all] = [traced(clients, 0), traced(clients, rounds)]
  const syncs = all - without
  if (without <= 0 || syncs <= 0) throw new Error(`strace counted ${all} syncs, ${without} without a submission: nothing was measured.`)
  return { clients, submissions, syncs, perSubmission: syncs / submissions }
}

function traced(clients: number, times: number): number {
  const folder = mkdtempSync(join(tmpdir(), 'tetherhouse-syncs-'))
  const log = join(folder, 'strace.log')
  const ran = spawnSync('strace', ['-f', '-qq', '-e', 'trace=fsync,fdatasync', '-o', log, process.execPath, '--import', 'tsx', here, 'hand-in', String(clients), String(times)], { encoding: 'utf8', env: { ...process.env, TMPDIR: folder } })
  if (ran.status !== 0) throw new Error(`The traced run failed: ${ran.stderr}`)
  const syncs = readFileSync(log, 'utf8').split('\n').filter(line => /\b(fsync|fdatasync)\(/.test(line)).length
  rmSync(folder, { recursive: true, force: true })
  return syncs
}

async function handInRounds(clients: number, times: number): Promise<void> {
  const { openTemporary } = await import('../fixtures/openTemporary')
  const { referenceIn } = await import('../fixtures/reference')
  const { workingCourse } = await import('../fixtures/workingCourse')
  const { handIn } = await import('../fixtures/submitting')
  const stores = await openTemporary()
  const reference = await referenceIn(stores.write)
  const course = await workingCourse(stores, { students: clients, attempts: 1000, times: { zone: 'UTC', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }, lateRule: { kind: 'none' } })
  const judging = { reference, loadShare: async (shareId: string) => course.loaded(shareId) }
  for (let round = 0; round < times; round++) {
    await Promise.all(course.students.map((_, no) => handIn(stores, judging, course, { no, key: `key-${no}-round-${round}`, at: Date.parse('2026-10-15T12:00:00Z') })))
  }
  await stores.remove()
}

if (process.argv[2] === 'hand-in') await handInRounds(Number(process.argv[3]), Number(process.argv[4]))
else if (process.argv[1] === here) for (const clients of [1, 32]) console.log(JSON.stringify(countSyncs(clients)))
