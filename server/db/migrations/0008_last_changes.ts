import type { Kysely, Migration } from 'kysely'
import { runStatements } from '../dialect'

/** Who changed a lab, a course or a dispute last: whoever comes second with an older version is told by whom they were forestalled. */
export const lastChanges: Migration = {
  async up(db: Kysely<unknown>): Promise<void> {
    await runStatements(db, 'create table last_change (object_id text primary key, by_actor_id text not null, at integer not null) strict, without rowid;')
  },
}
