// People, their sign-in, and what they may be in the department.
export const peopleTables = `create table person (
  id text primary key, display_name text, email_norm text unique, campus_issuer text, campus_subject text,
  state text not null check (state in ('invited','active','closed','erased')), credential_epoch integer not null default 0,
  created_at integer not null, erased_at integer, unique (campus_issuer, campus_subject),
  check ((state = 'erased') = (erased_at is not null)),
  check (state <> 'erased' or (display_name is null and email_norm is null and campus_subject is null))
) strict;
create table credential (person_id text primary key references person, argon2id text not null, changed_at integer not null) strict;
create table session (
  token_sha256 blob primary key, person_id text not null references person, credential_epoch integer not null,
  created_at integer not null, seen_at integer not null, ends_at integer not null, ended_at integer, ended_why text
) strict;
create table one_time_token (
  token_sha256 blob primary key, purpose text not null check (purpose in ('invite','reset','setup')),
  person_id text not null references person, ends_at integer not null, used_at integer
) strict;

-- whoever acts: a membership of a course or a role in the department; what was done keeps pointing here when the person is erased
create table actor (id text primary key, kind text not null check (kind in ('membership','department_role','system'))) strict;
create table department_role (
  id text primary key references actor, person_id text references person, pseudonym text not null unique,
  role text not null check (role in ('admin','technician','visitor')), scope_json text, until_at integer,
  state text not null check (state in ('active','ended')), created_at integer not null,
  check (role <> 'visitor' or (scope_json is not null and until_at is not null))
) strict;
create unique index one_department_role on department_role (person_id, role) where state = 'active';
`
