import type { Kysely, Migration } from 'kysely'
import { appendOnly } from '../appendOnly'
import { runStatements } from '../dialect'

/**
 * What staff did for one student, each with who, when and why. Later dues and standings take effect where they always did; granted attempts, accommodations
 * and accepted lateness take effect from here. An accommodation is an effect alone: it has no reason, and nowhere to put one.
 */
const tables = `create table repair (
  id text primary key, seq integer not null unique, membership_id text not null references membership, lab_id text references lab,
  kind text not null check (kind in ('extension','accommodation','excused','counted','not_counted','attempt','moved','lateness')),
  due_at integer, extra_days integer check (extra_days between 0 and 60), submission_id text references submission, late_units integer check (late_units >= 0), late_rule_json text,
  reason_digest text, by_actor_id text not null references actor, at integer not null, ledger_chain text not null, ledger_seq integer not null,
  foreign key (ledger_chain, ledger_seq) references ledger_entry (chain_id, seq) deferrable initially deferred,
  check ((kind in ('accommodation','moved')) = (lab_id is null)),
  check ((kind = 'extension') = (due_at is not null)),
  check ((kind = 'accommodation') = (extra_days is not null)),
  check ((kind = 'accommodation') = (reason_digest is null)),
  check ((kind = 'lateness') = (submission_id is not null)), check ((submission_id is null) = (late_units is null)), check ((submission_id is null) = (late_rule_json is null))
) strict;
create index repair_of_member on repair (membership_id, kind);
create unique index repair_of_lateness on repair (submission_id) where submission_id is not null;
`

export const repairs: Migration = {
  async up(db: Kysely<unknown>): Promise<void> {
    await runStatements(db, `${tables}\n${appendOnly('repair')}`)
  },
}
