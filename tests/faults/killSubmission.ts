import { rmSync } from 'node:fs'
import { setTimeout as later } from 'node:timers/promises'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { copyOf } from '../fixtures/demoWorld'
import { attachTracer, type Traced, type TracedCall } from '../fixtures/tracer'
import type { Visitor } from '../fixtures/visitor'
import { checkStore, countSubmissions } from './checkStore'
import { bringOver, mailIsOut, type PreparedWork } from './preparedWork'

/** What changes a disk. */
export const changingCalls = ['pwrite64', 'fsync', 'fdatasync', 'rename', 'unlink'] as const

/** The server is ended at this call, the nth of its kind from just before a submission is sent. */
export interface KillPoint { call: string, nth: number }

/** What one submission does to the disk. */
export interface WriteCount { points: KillPoint[], files: string[], threads: number }

export interface KillReport {
  /** At which the server was ended. */
  points: number
  /** Of the points asked for, those that a submission did not get to: its writes differ by a few from one to the next. */
  unmet: number
  /** Ended after the answer was there. */
  acknowledged: number
  /** Stored although no answer came: a retry must get the receipt that was meant. */
  storedUnanswered: number
  /** Acknowledged, and not there once after the restart. */
  lost: number
  /** Points after which something else was found that may never be. */
  unsound: number
  /** From the start to being ready, after each end. */
  restartsMs: number[]
  wrong: string[]
}

export interface KillOptions {
  work: PreparedWork
  /** Whose writes are counted and met: the submission's, up to its answer, or those of its receipt's mail, which begin after it. */
  of: 'submission' | 'mail'
  /** A built server other than the one in place: the one with a bug in it. */
  entry?: string
  /** Stops at the first acknowledged submission that is lost: what a planted bug is to bring about. */
  untilLost?: boolean
}

/** Counts the writes and syncs of one submission, or of its receipt's mail, without disturbing them. */
export async function countWrites(options: KillOptions): Promise<WriteCount> {
  const subject = await Subject.of(options)
  try {
    let calls: TracedCall[] = []
    for (let tries = 0; tries < mostTries && calls.length === 0; tries++) {
      const met = await tracedHandIn(subject, options, `count-the-writes-${tries}`, { calls: changingCalls })
      if (!met.first) throw new Error(`The submission whose writes are counted was refused:\n${subject.server.log()}`)
      calls = met.calls
    }
    if (calls.length === 0) throw new Error(`Not one write of a ${options.of} was counted.`)
    return {
      points: pointsOf(calls), threads: new Set(calls.map(call => call.thread)).size,
      files: [...new Set(calls.flatMap(call => call.path === '' ? [] : [call.path.startsWith(subject.dataDir) ? call.path.slice(subject.dataDir.length + 1) : call.path]))],
    }
  }
  finally {
    await subject.end()
  }
}

/** A mail may be out before the tracer holds the server; then another one is waited for. */
const mostTries = 8

/** Hands in once under the tracer, on a server that rests and a log that is empty; for the mail the tracer comes after the answer. */
async function tracedHandIn(subject: Subject, { work, of }: KillOptions, key: string, traced: Traced): Promise<{ first: Receipted | null, calls: TracedCall[], hasEnded: boolean }> {
  const isMail = of === 'mail'
  if (isMail) await mailIsOut(subject.dataDir)
  bringOver(subject.dataDir)
  let hasEnded = false
  const ended = subject.server.ended().then(() => { hasEnded = true })
  const early = isMail ? await handIn(subject.visitor, work, key) : null
  const tracer = await attachTracer(subject.server.pid, traced)
  const first = early ?? await handIn(subject.visitor, work, key)
  if (isMail) await mailIsOut(subject.dataDir, () => hasEnded)
  // Where it is to be ended, the end may come a while after the answer: a server that answers too early does.
  await Promise.race([ended, later(traced.killAt && !isMail ? 2000 : 300)])
  return { first, calls: await tracer.stop(), hasEnded }
}

/** In the order in which they are met. The tracer counts by thread and by kind of call, so a point is told by both. */
function pointsOf(calls: readonly TracedCall[]): KillPoint[] {
  const counted = new Map<string, number>()
  return calls.map(({ call, thread }) => {
    const nth = (counted.get(`${call} ${thread}`) ?? 0) + 1
    counted.set(`${call} ${thread}`, nth)
    return { call, nth }
  })
}

/** So many of the points, the first and the last among them, and every sync. */
export function spreadOver(points: readonly KillPoint[], most: number): KillPoint[] {
  const step = (points.length - 1) / Math.max(1, most - 1)
  const chosen = new Set(Array.from({ length: most }, (_, at) => Math.round(at * step)))
  return points.filter((point, at) => chosen.has(at) || point.call === 'fsync' || point.call === 'fdatasync')
}

/**
 * R1: a submission is sent while the server is ended at one of its writes or syncs, for each point. After each: the store is sound,
 * what was acknowledged is there once, and a retry under the same key gets one receipt, the same one.
 * The server that was started again is the next to be ended, on what the last one left.
 */
export async function killSubmission(points: readonly KillPoint[], options: KillOptions): Promise<KillReport> {
  const report: KillReport = { points: 0, unmet: 0, acknowledged: 0, storedUnanswered: 0, lost: 0, unsound: 0, restartsMs: [], wrong: [] }
  let subject = await Subject.of(options)
  try {
    for (const point of points) {
      const wasWell = report.lost + report.unsound
      await killAt(point, subject, options, report)
      if (report.lost + report.unsound === wasWell) continue
      if (options.untilLost && report.lost > 0) break
      // What one point left broken must not be found again at the next.
      await subject.end()
      subject = await Subject.of(options)
    }
    return report
  }
  finally {
    await subject.end()
  }
}

async function killAt(point: KillPoint, subject: Subject, options: KillOptions, report: KillReport): Promise<void> {
  const where = `${options.of}, ${point.call} ${point.nth}`
  let key = ''
  let met: Awaited<ReturnType<typeof tracedHandIn>> | undefined
  for (let tries = 0; tries < (options.of === 'mail' ? mostTries : 1) && !met?.hasEnded; tries++) {
    key = `kill-at-${point.call}-${point.nth}-of-${options.of}-${tries}`
    met = await tracedHandIn(subject, options, key, { calls: [point.call], killAt: point })
  }
  const first = met?.first ?? null
  if (!met?.hasEnded) {
    report.unmet++
    if (first) return
    report.unsound++
    report.wrong.push(`${where}: refused, and the server was not ended`)
    return
  }
  report.points++
  const stored = countSubmissions(subject.dataDir, key)
  if (first) report.acknowledged++
  if (first && stored !== 1) report.lost++
  if (!first && stored === 1) report.storedUnanswered++
  const wrong = await checkStore(subject.dataDir)
  report.restartsMs.push(await subject.restart())
  wrong.push(...await retry(subject, options.work, key, first))
  if (wrong.length > 0) report.unsound++
  report.wrong.push(...wrong.map(line => `${where}: ${line}`))
}

interface Receipted { receipt: { no: string, digest: string } }

/** The receipt, or null where the connection broke or the submission was refused. */
async function handIn(visitor: Visitor, { shareId, answers }: PreparedWork, key: string): Promise<Receipted | null> {
  try {
    const answer = await visitor.send('POST', `/api/shares/${shareId}/submissions`, { answers }, { 'Idempotency-Key': key })
    return answer.ok ? await answer.json() as Receipted : null
  }
  catch {
    return null
  }
}

async function retry({ visitor, dataDir }: Subject, work: PreparedWork, key: string, first: Receipted | null): Promise<string[]> {
  const again = await handIn(visitor, work, key)
  if (!again) return ['the retry was refused']
  const wrong: string[] = []
  if (first && (first.receipt.no !== again.receipt.no || first.receipt.digest !== again.receipt.digest)) wrong.push('the retry got another receipt')
  if (countSubmissions(dataDir, key) !== 1) wrong.push('after the retry there is not exactly one submission')
  return wrong
}

/** A server on a copy of its own, warm: the session was looked up and the page read, so that what is written next is the submission's. Mail goes out only where it is looked at. */
class Subject {
  private constructor(readonly server: BuiltServer, readonly dataDir: string, readonly visitor: Visitor, private readonly warmUp: string) {}

  static async of({ work, of, entry }: KillOptions): Promise<Subject> {
    const dataDir = copyOf(work.dir)
    const server = await startBuiltServer({ dataDir, readyWithinMs: 120_000, env: { DEMO: of === 'mail' ? '1' : '0' }, ...(entry ? { wrap: ([program = process.execPath]) => [program, entry] } : {}) })
    const subject = new Subject(server, dataDir, work.visitor.at(server.url), `/api/shares/${work.shareId}/work`)
    await subject.visitor.get(subject.warmUp)
    // The first submission of a copy writes more pages than those that follow.
    if (!await handIn(subject.visitor, work, 'a-submission-before-all')) throw new Error(`The first submission was refused:\n${server.log()}`)
    return subject
  }

  /** Starts it again on the same folder; how long that took, in milliseconds. */
  async restart(): Promise<number> {
    const startedAt = performance.now()
    await this.server.restart('SIGKILL')
    const took = Math.round(performance.now() - startedAt)
    await this.visitor.get(this.warmUp)
    return took
  }

  async end(): Promise<void> {
    await this.server.stop('SIGKILL')
    rmSync(this.dataDir, { recursive: true, force: true })
  }
}
