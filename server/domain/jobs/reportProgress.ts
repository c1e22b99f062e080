import type { Stores } from '../../db/writer'

/** How far a job is. False when it was cancelled or taken away: the work should stop. */
export async function reportProgress({ write }: Stores, { jobId, owner, doneUnits, allUnits }: { jobId: string, owner: string, doneUnits: number, allUnits: number | null }): Promise<boolean> {
  const changed = await write(trx => trx.updateTable('job').set({ done_units: doneUnits, ...(allUnits === null ? {} : { all_units: allUnits }) })
    .where('id', '=', jobId).where('lease_owner', '=', owner).where('state', '=', 'leased').executeTakeFirst())
  return changed.numUpdatedRows > 0n
}
