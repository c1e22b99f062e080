import { DomainError } from '#shared/errors'
import type { Stores } from '../../db/writer'

const mostAttempts = 5
/** Seconds to wait before each further attempt. */
const backoff = [5, 30, 120, 600]

interface Finish { jobId: string, owner: string, now: number, result?: unknown, error?: unknown, isStopping?: boolean }

/**
 * Closes a leased job: done with its result; failed for good by a refusal; back in the queue after any other error, a few times;
 * and back at once where the server was stopping. A cancelled job stays cancelled.
 */
export async function finishJob({ write }: Stores, { jobId, owner, now, result, error, isStopping }: Finish): Promise<void> {
  await write(async (trx) => {
    const job = await trx.selectFrom('job').select(['attempts']).where('id', '=', jobId).where('lease_owner', '=', owner).where('state', '=', 'leased').executeTakeFirst()
    if (!job) return
    const close = (values: { state: 'waiting' | 'done' | 'failed', result_json?: string, error_json?: string | null, run_after?: number, attempts?: number }) =>
      trx.updateTable('job').set({ lease_owner: null, leased_until: null, ...values }).where('id', '=', jobId).execute()
    if (error === undefined) return void await close({ state: 'done', result_json: JSON.stringify(result ?? null), error_json: null })
    if (isStopping) return void await close({ state: 'waiting', run_after: now, attempts: job.attempts - 1 })
    const isRefused = error instanceof DomainError
    const told = isRefused ? { code: error.code, facts: error.facts } : { code: 'failed', facts: {} }
    if (isRefused || job.attempts >= mostAttempts) return void await close({ state: 'failed', error_json: JSON.stringify(told) })
    await close({ state: 'waiting', run_after: now + 1000 * (backoff[job.attempts - 1] ?? 600), error_json: JSON.stringify(told) })
  })
}
