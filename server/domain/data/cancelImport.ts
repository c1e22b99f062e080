import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import type { ImportRunner } from './importRunner'
import { importJobKind } from './startImport'

/** Cancels an import that waits or runs. One that is done stays done, and its data sets with it. */
export async function cancelImport({ write }: Stores, runner: ImportRunner, input: { jobId: string }): Promise<void> {
  const state = await write(async (trx) => {
    const job = await trx.selectFrom('job').select('state').where('id', '=', input.jobId).where('kind', '=', importJobKind).executeTakeFirst()
    if (!job) return refuse('not_found')
    if (job.state === 'waiting' || job.state === 'leased') await trx.updateTable('job').set({ state: 'cancelled' }).where('id', '=', input.jobId).execute()
    return job.state
  })
  if (state === 'leased') runner.cancel(input.jobId)
}
