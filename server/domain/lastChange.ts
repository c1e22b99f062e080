import { refuse } from '#shared/errors'
import type { Trx } from '../db/writer'
import { actorName } from './disputes/rulers'

/** Notes who made the version of an object that stands now, in the unit of work that makes it. */
export async function noteChange(trx: Trx, objectId: string, actorId: string, now: number): Promise<void> {
  await trx.insertInto('last_change').values({ object_id: objectId, by_actor_id: actorId, at: now })
    .onConflict(conflict => conflict.column('object_id').doUpdateSet({ by_actor_id: actorId, at: now })).execute()
}

/** Refuses a change that rests on an older version, and says who was first. @throws {DomainError} `changed_meanwhile` with `by`, `at` and `version` */
export async function refuseOlder(trx: Trx, objectId: string, version: number): Promise<never> {
  const last = await trx.selectFrom('last_change').select(['by_actor_id', 'at']).where('object_id', '=', objectId).executeTakeFirst()
  return refuse('changed_meanwhile', last ? { by: await actorName(trx, last.by_actor_id), at: new Date(last.at).toISOString(), version } : { version })
}
