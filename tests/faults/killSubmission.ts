import { spawn } from 'node:child_process'
import { rmSync } from 'node:fs'
import { startBuiltServer } from '../fixtures/builtServer'
import { checkStore, countSubmissions } from './checkStore'
import { copyOf, demoWorld } from '../fixtures/demoWorld'
import { findOpenWork } from './openWork'

export interface KillReport {
  /** Writes and syncs at which the server was killed. */
  points: number
  acknowledged: number
  /** Stored although no answer came: a retry must get the receipt that was meant. */
  storedUnanswered: number
  lost: number
  half: number
  slowestRestartMs: number
  wrong: string[]
}

const killed = ['pwrite64', 'fsync', 'fdatasync'] as const

/**
 * R1: a submission is sent while the server is killed at its Nth write or sync, for every N until the submission gets through
 * without being met. After each: the store is sound, what was acknowledged is there once, and a retry under the same key gets one receipt.
 */
export async function killSubmission({ entry, from = 1, most = 200, step = 1, isControl = false }: { entry?: string, from?: number, most?: number, step?: number, isControl?: boolean } = {}): Promise<KillReport> {
  const world = demoWorld()
  const report: KillReport = { points: 0, acknowledged: 0, storedUnanswered: 0, lost: 0, half: 0, slowestRestartMs: 0, wrong: [] }
  for (let n = from; n <= most; n += step) {
    if (isControl && report.lost > 0) return report
    const dataDir = copyOf(world)
    const options = { dataDir, env: { DEMO: '1' }, ...(entry ? { wrap: (command: string[]) => [command[0]!, entry] } : {}) }
    const server = await startBuiltServer(options)
    try {
      const work = await findOpenWork(server.url)
      const tracer = await attach(server.pid, n)
      const key = `kill-at-${n}-of-a-submission`
      const send = () => work.visitor.send('POST', `/api/shares/${work.shareId}/submissions`, { answers: work.answers }, { 'Idempotency-Key': key })
      const first = await send().then(async answer => answer.ok ? await answer.json() as Receipted : null, () => null)
      const wasKilled = await Promise.race([server.ended().then(() => true), later(first ? 150 : 2_000).then(() => false)])
      tracer.kill('SIGKILL')
      if (!wasKilled) {
        if (!first) report.wrong.push(`at ${n}: no answer, and the server was not killed`)
        return report
      }
      report.points++
      const startedAt = Date.now()
      const again = await startBuiltServer(options)
      report.slowestRestartMs = Math.max(report.slowestRestartMs, Date.now() - startedAt)
      try {
        const stored = countSubmissions(dataDir, key)
        if (first) report.acknowledged++
        if (first && stored !== 1) report.lost++
        if (!first && stored === 1) report.storedUnanswered++
        const wrong = await checkStore(dataDir)
        if (wrong.length > 0) report.half++
        report.wrong.push(...wrong.map(line => `at ${n}: ${line}`))
        await retry(again.url, work, key, first, dataDir, report, n)
      }
      finally {
        await again.close()
      }
    }
    finally {
      await server.stop('SIGKILL')
      rmSync(dataDir, { recursive: true, force: true })
    }
  }
  return report
}

interface Receipted { receipt: { no: string, digest: string } }

async function retry(url: string, work: Awaited<ReturnType<typeof findOpenWork>>, key: string, first: Receipted | null, dataDir: string, report: KillReport, n: number): Promise<void> {
  // The cookie is the same; only the port differs, and cookies do not know ports.
  const answer = await fetch(`${url}/api/shares/${work.shareId}/submissions`, {
    method: 'POST', body: JSON.stringify({ answers: work.answers }),
    headers: { 'content-type': 'application/json', 'idempotency-key': key, 'cookie': work.visitor.cookieHeader },
  })
  if (!answer.ok) {
    report.wrong.push(`at ${n}: the retry was refused: ${await answer.text()}`)
    return
  }
  const receipted = await answer.json() as Receipted
  if (first && (first.receipt.no !== receipted.receipt.no || first.receipt.digest !== receipted.receipt.digest)) report.wrong.push(`at ${n}: the retry got another receipt`)
  if (countSubmissions(dataDir, key) !== 1) report.wrong.push(`at ${n}: after the retry there is not exactly one submission`)
}

const later = (ms: number): Promise<void> => new Promise(resolve => setTimeout(resolve, ms))

/** Attaches a tracer that kills the server at its Nth write or sync from now on; returns when it holds. */
function attach(pid: number, n: number): Promise<ReturnType<typeof spawn>> {
  const calls = killed.join(',')
  const tracer = spawn('strace', ['-f', '-p', String(pid), '-e', `trace=${calls}`, '-e', `inject=${calls}:signal=SIGKILL:when=${n}`, '-o', '/dev/null'], { stdio: ['ignore', 'ignore', 'pipe'] })
  return new Promise((resolve, reject) => {
    let said = ''
    const timer = setTimeout(() => reject(new Error(`strace did not attach: ${said}`)), 10_000)
    tracer.stderr.on('data', (text: Buffer) => {
      said += text.toString()
      if (!/attached/.test(said)) return
      clearTimeout(timer)
      setTimeout(() => resolve(tracer), 50)
    })
  })
}
