import type { Stores } from '../../db/writer'

/** Keeps a job ours while it runs. False when it was cancelled or taken away. */
export async function renewLease({ read, write }: Stores, { jobId, owner, until }: { jobId: string, owner: string, until: number }): Promise<boolean> {
  const row = await read.selectFrom('job').select(['state', 'lease_owner', 'leased_until']).where('id', '=', jobId).executeTakeFirst()
  if (row?.state !== 'leased' || row.lease_owner !== owner) return false
  // Looked at often, so that a cancel is heard soon; written seldom.
  if ((row.leased_until ?? 0) < until - 20_000) await write(trx => trx.updateTable('job').set({ leased_until: until }).where('id', '=', jobId).where('lease_owner', '=', owner).where('state', '=', 'leased').execute())
  return true
}
