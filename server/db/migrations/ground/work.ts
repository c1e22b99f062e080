// What students type and submit, and the marks it earned.
export const workTables = `create table draft (share_id text not null references share, step_key text not null, membership_id text not null references membership,
  typed text not null, base_version integer not null, version integer not null, saved_at integer not null,
  primary key (share_id, step_key)) strict, without rowid;
create table submission (
  id text primary key, seq integer not null unique, share_id text not null references share, attempt integer not null,
  by_membership_id text not null references membership, lab_revision_id text not null references lab_revision,
  received_at integer not null, due_at_applied integer not null, late_units integer not null check (late_units >= 0),
  late_rule_json text not null, late_reason text not null, claimed_sent_at integer, request_key text not null, body_sha256 blob not null, receipt_no text not null unique,
  ledger_chain text not null, ledger_seq integer not null,
  unique (share_id, attempt), unique (by_membership_id, request_key),
  foreign key (ledger_chain, ledger_seq) references ledger_entry (chain_id, seq) deferrable initially deferred
) strict;
create table answer (
  submission_id text not null references submission, step_key text not null, typed text not null, reading text not null
    check (reading in ('ok','class','none','not_reached','not_defined','empty','unreadable','wrong_dimension','ambiguous')),
  value_si real, unit_ucum text, digits integer, resolution_si real,
  private_digest blob,                  -- free text, working, picture: in private_body / work_file, erasable
  primary key (submission_id, step_key), check (reading <> 'ok' or value_si is not null or private_digest is not null or typed <> '')
) strict, without rowid;
create table evaluation (                     -- everything that is needed to judge again, and what came out
  id text primary key, submission_id text not null, step_key text not null, reference_digest blob not null references reference_build,
  convention_revision_id text not null references convention_revision, data_set_version_id text not null references data_set_version,
  lab_revision_id text not null references lab_revision, inputs_json text not null, carried_json text not null, accepted_json text not null,
  center_bits blob check (length(center_bits) = 8), low_bits blob check (length(low_bits) = 8), high_bits blob check (length(high_bits) = 8),
  parts_json text not null, slips_json text not null, trace_json text not null, digest blob not null,
  outcome text not null check (outcome in ('value','class','none','not_reached','not_defined','refused')), refusal_code text,
  foreign key (submission_id, step_key) references answer (submission_id, step_key),
  check ((center_bits is not null) = (outcome = 'value')), check ((refusal_code is not null) = (outcome = 'refused'))
) strict;
create table mark (
  id text primary key, submission_id text not null, step_key text not null, version integer not null check (version >= 1),
  points_milli integer not null, max_milli integer not null, evaluation_id text references evaluation, cause text not null
    check (cause in ('submission','text_marking','ruling','appeal','run','undo')),
  ledger_chain text not null, ledger_seq integer not null, unique (submission_id, step_key, version),
  foreign key (submission_id, step_key) references answer (submission_id, step_key),
  foreign key (ledger_chain, ledger_seq) references ledger_entry (chain_id, seq) deferrable initially deferred,
  check (points_milli between 0 and max_milli)
) strict;
create view mark_current as select m.* from mark m
  where m.version = (select max(version) from mark where submission_id = m.submission_id and step_key = m.step_key);
`
