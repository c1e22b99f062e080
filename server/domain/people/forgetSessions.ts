import type { Stores } from '../../db/writer'

const keptAfterEnd = 30 * 86_400_000

/** Removes sessions and one-time links a month after they ended: nobody needs them longer. */
export async function forgetSessions({ write }: Stores, now: number): Promise<void> {
  await write(async (trx) => {
    await trx.deleteFrom('session').where('ends_at', '<', now - keptAfterEnd).execute()
    await trx.deleteFrom('one_time_token').where('ends_at', '<', now - keptAfterEnd).execute()
  })
}
