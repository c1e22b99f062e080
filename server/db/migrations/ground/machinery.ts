// Counters, request keys, jobs, the outbox.
export const machineryTables = `create table counter (name text primary key, value integer not null) strict;
create table request_key (person_id text not null, key text not null, route text not null, body_sha256 blob not null, status integer not null,
  response_json text not null, at integer not null, primary key (person_id, key)) strict, without rowid;
create table job (id text primary key, course_id text references course, by_actor_id text references actor, kind text not null, once_key text unique, payload_json text not null,
  state text not null check (state in ('waiting','leased','done','failed','cancelled')), attempts integer not null, run_after integer not null,
  leased_until integer, lease_owner text, done_units integer not null default 0, all_units integer, result_json text, error_json text, created_at integer not null) strict;
create table outbox (id text primary key, event_key text not null unique, to_membership_id text references membership, to_person_id text references person,
  message_id text not null unique, template text not null, facts_json text not null,
  state text not null check (state in ('waiting','sent','dead')), attempts integer not null, next_at integer not null) strict;
create table access_log (seq integer primary key, at integer not null, actor_person_id text not null, subject_membership_id text not null, route text not null) strict;

create table installation (key text primary key, value_json text not null) strict;
`
