import type { Stores } from '../../db/writer'

/** Cancels a job that is not over yet. False when it was over already. Work that is running hears of it within seconds and cleans up. */
export async function cancelJob({ write }: Stores, jobId: string): Promise<boolean> {
  const changed = await write(trx => trx.updateTable('job').set({ state: 'cancelled', lease_owner: null, leased_until: null }).where('id', '=', jobId).where('state', 'in', ['waiting', 'leased']).executeTakeFirst())
  return changed.numUpdatedRows > 0n
}
