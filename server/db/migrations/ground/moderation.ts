// Disputes, rulings and marking runs.
export const moderationTables = `create table dispute (
  id text primary key, submission_id text not null, step_key text not null, against_mark_id text not null references mark,
  state text not null check (state in ('open','taken','ruled','appealed','closed','withdrawn')), version integer not null,
  opened_by_membership_id text not null references membership, taken_by text references actor, taken_until integer, opened_at integer not null,
  foreign key (submission_id, step_key) references answer (submission_id, step_key), check ((state = 'taken') = (taken_by is not null))
) strict;
create unique index one_live_dispute on dispute (submission_id, step_key) where state in ('open','taken','appealed');
create table dispute_note (id text primary key, dispute_id text not null references dispute, by_actor_id text not null references actor,
  audience text not null check (audience in ('all','staff')), private_digest blob not null, file_digest blob references work_file, at integer not null) strict;
create table ruling (
  id text primary key, dispute_id text not null references dispute, level text not null check (level in ('first','appeal')),
  kind text not null check (kind in ('uphold','change','accept','fault')), reason text not null check (length(trim(reason)) > 0),
  by_actor_id text not null references actor, at integer not null, ledger_chain text not null, ledger_seq integer not null, unique (dispute_id, level),
  foreign key (ledger_chain, ledger_seq) references ledger_entry (chain_id, seq) deferrable initially deferred
) strict;
create table marking_run (
  id text primary key, lab_id text not null references lab, cause_json text not null, policy text not null check (policy in ('never_lower','as_computed')),
  plan_sha256 blob not null, state text not null check (state in ('planned','applied','undone')), version integer not null
) strict;
create table marking_run_item (
  run_id text not null references marking_run, submission_id text not null, step_key text not null, before_mark_id text not null references mark,
  after_milli integer not null, evaluation_id text references evaluation, primary key (run_id, submission_id, step_key)
) strict, without rowid;
`
