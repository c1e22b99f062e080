import type { Stores } from '../../db/writer'

/** At start: one server serves a data folder, so whatever of these kinds is still leased was left by one that died. */
export async function releaseLeftOvers({ read, write }: Stores, kinds: readonly string[], now: number): Promise<void> {
  const left = await read.selectFrom('job').select('id').where('state', '=', 'leased').where('kind', 'in', kinds).execute()
  if (left.length === 0) return
  await write(trx => trx.updateTable('job').set({ state: 'waiting', lease_owner: null, leased_until: null, run_after: now }).where('state', '=', 'leased').where('id', 'in', left.map(row => row.id)).execute())
}
