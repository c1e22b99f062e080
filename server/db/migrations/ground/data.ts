// Source files and the versions of data sets made from them. Observations themselves lie in their own file.
export const dataTables = `create table source_file (sha256 blob primary key check (length(sha256) = 32), size integer not null, stored_at integer not null) strict;
create table upload (
  id text primary key, course_id text references course, source_sha256 blob not null references source_file, original_name text not null,
  by_actor_id text not null references actor, at integer not null
) strict;
create table sensor (
  id text primary key, instrument text not null, quantity text not null, unit text not null, site_json text not null,
  serves_from integer not null, serves_to integer
) strict;
create table sensor_accuracy (               -- each calibration is a new row; bands name the row, not the sensor
  id text primary key, sensor_id text not null references sensor, valid_from integer not null, valid_to integer,
  half_width real not null, coverage_k real not null, resolution real not null, time_constant_s real, source text not null
) strict;
create table recipe_revision (id text primary key, recipe_key text not null, no integer not null, body_json text not null,
  digest blob not null, unique (recipe_key, no)) strict;
create table data_set (id text primary key, owner_course_id text references course, kind text not null check (kind in ('station','flight')),
  title text not null) strict;
create table data_set_version (
  id text primary key, data_set_id text not null references data_set, no integer not null, parent_id text references data_set_version,
  cause text not null check (cause in ('import','append','flag','correct','derive')), reason text not null,
  root_sha256 blob not null check (length(root_sha256) = 32),     -- Merkle root in observations.db
  rows_read integer not null, rows_taken integer not null, rows_refused integer not null,
  first_at integer, last_at integer, recipe_revision_id text references recipe_revision, importer text not null, meta_json text not null,
  by_actor_id text not null references actor, made_at integer not null,
  unique (data_set_id, no), check (rows_read = rows_taken + rows_refused), check ((no = 1) = (parent_id is null))
) strict;
create table data_set_version_source (version_id text not null references data_set_version, ordinal integer not null,
  source_sha256 blob not null references source_file, primary key (version_id, ordinal)) strict, without rowid;
create table data_column (
  version_id text not null references data_set_version, no integer not null, name text not null, quantity text not null,
  unit_ucum text not null, decimals integer, height_m real, role text not null check (role in ('time','value','quality','label')), sensor_accuracy_id text references sensor_accuracy, primary key (version_id, no)
) strict, without rowid;
`
