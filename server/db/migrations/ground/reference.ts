// Builds of the judge and the conventions that courses teach with.
export const referenceTables = `create table reference_build (
  digest blob primary key check (length(digest) = 32), version text not null, interface integer not null,
  bundle text not null, golden_sha256 blob not null, added_at integer not null
) strict;
create table convention_revision (id text primary key, convention_key text not null, no integer not null, body_json text not null,
  digest blob not null unique, unique (convention_key, no)) strict;
`
