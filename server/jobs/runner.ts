import { randomUUID } from 'node:crypto'
import { finishJob } from '../domain/jobs/finishJob'
import { leaseJob, type LeasedJob } from '../domain/jobs/leaseJob'
import { releaseLeftOvers } from '../domain/jobs/releaseLeftOvers'
import { renewLease } from '../domain/jobs/renewLease'
import { reportProgress } from '../domain/jobs/reportProgress'
import type { Stores } from '../db/writer'

/** What a piece of background work is handed. */
export interface JobTools {
  jobId: string
  courseId: string | null
  payload: unknown
  stores: Stores
  now: () => number
  /** Aborts when the job was cancelled or the server stops: clean up and throw. */
  signal: AbortSignal
  progress: (doneUnits: number, allUnits?: number) => Promise<void>
}

/** Does one kind of background work; what it returns is kept as the job's result. A DomainError fails it for good, any other error is tried again. */
export type JobHandler = (tools: JobTools) => Promise<unknown>

export interface RunnerOptions {
  stores: Stores
  handlers: Readonly<Record<string, JobHandler>>
  now: () => number
  /** How many at a time. */
  atOnce?: number
  pollMs?: number
  onError?: (error: unknown, job: LeasedJob) => void
}

const leaseMs = 60_000

/** Takes waiting jobs in turn. A job whose server died is taken again when its lease is over. */
export function startRunner({ stores, handlers, now, atOnce = 2, pollMs = 1000, onError = () => {} }: RunnerOptions) {
  const owner = randomUUID()
  const running = new Map<string, { stop: AbortController, done: Promise<void> }>()
  let isStopping = false
  let timer: NodeJS.Timeout | undefined

  async function runOne(job: LeasedJob): Promise<void> {
    const stop = new AbortController()
    const done = work(job, stop)
    running.set(job.id, { stop, done })
    await done
    running.delete(job.id)
  }

  async function work(job: LeasedJob, stop: AbortController): Promise<void> {
    const renewing = setInterval(() => {
      renewLease(stores, { jobId: job.id, owner, until: now() + leaseMs }).then((isOurs) => { if (!isOurs) stop.abort(new Error('cancelled')) }, () => {})
    }, 2000)
    try {
      const handler = handlers[job.kind]
      if (!handler) throw new Error(`There is no work of kind "${job.kind}".`)
      const result = await handler({
        jobId: job.id, courseId: job.courseId, payload: job.payload, stores, now, signal: stop.signal,
        progress: async (doneUnits, allUnits) => {
          const isOurs = await reportProgress(stores, { jobId: job.id, owner, doneUnits, allUnits: allUnits ?? null })
          if (!isOurs) stop.abort(new Error('cancelled'))
        },
      })
      await finishJob(stores, { jobId: job.id, owner, result: result ?? null, now: now() })
    }
    catch (error) {
      if (!stop.signal.aborted) onError(error, job)
      await finishJob(stores, { jobId: job.id, owner, error, isStopping, now: now() }).catch(() => {})
    }
    finally {
      clearInterval(renewing)
    }
  }

  async function turn(): Promise<void> {
    while (!isStopping && running.size < atOnce) {
      const job = await leaseJob(stores, { owner, kinds: Object.keys(handlers), now: now(), until: now() + leaseMs })
      if (!job) return
      void runOne(job).finally(wake)
    }
  }

  let turning: Promise<void> | undefined
  /** Looks for work now instead of at the next poll. */
  function wake(): void {
    if (isStopping || turning) return
    turning = turn().catch(() => {}).finally(() => { turning = undefined })
  }

  void releaseLeftOvers(stores, Object.keys(handlers), now()).catch(() => {}).finally(() => {
    wake()
    if (!isStopping) timer = setInterval(wake, pollMs)
  })

  return {
    wake,
    /** Lets running work clean up, at most `withinMs`; what is left over waits for the next start. */
    async stop(withinMs = 8000): Promise<void> {
      isStopping = true
      clearInterval(timer)
      await turning
      for (const { stop } of running.values()) stop.abort(new Error('the server stops'))
      await Promise.race([Promise.all([...running.values()].map(({ done }) => done)), new Promise(resolve => setTimeout(resolve, withinMs).unref())])
    },
  }
}

export type Runner = ReturnType<typeof startRunner>
