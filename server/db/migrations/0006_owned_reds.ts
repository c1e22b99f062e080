import type { Kysely, Migration } from 'kysely'
import { appendOnly } from '../appendOnly'
import { runStatements } from '../dialect'

/** What a proof run found and somebody answers for by name. The key names the finding and how the lab stood: a changed lab makes it a new one. */
const tables = `create table owned_red (
  id text primary key, lab_id text not null references lab, red_key text not null, reason text not null check (length(trim(reason)) > 0),
  by_actor_id text not null references actor, at integer not null, unique (lab_id, red_key)
) strict;
`

export const ownedReds: Migration = {
  async up(db: Kysely<unknown>): Promise<void> {
    await runStatements(db, `${tables}\n${appendOnly('owned_red')}`)
  },
}
