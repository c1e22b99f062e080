// Labs, their frozen revisions, postings, and the draw of shares.
export const labsTables = `create table lab (id text primary key, course_id text not null references course, ancestor_id text references lab, title text not null,
  state text not null check (state in ('draft','posted','withdrawn','archived')), version integer not null) strict;
create table lab_revision (
  id text primary key, lab_id text not null references lab, no integer not null, body_json text not null, digest blob not null,
  frozen_at integer, unique (lab_id, no)
) strict;
create table step (
  lab_revision_id text not null references lab_revision, step_key text not null, rank integer not null, kind text not null
    check (kind in ('number','table','diagram','fit','reading','choice','text','file')),
  points_milli integer not null check (points_milli >= 0), binding_json text not null, ask text not null, band_json text not null,
  primary key (lab_revision_id, step_key), unique (lab_revision_id, rank), unique (lab_revision_id, step_key, rank)
) strict, without rowid;
create table step_edge (                      -- rank order makes a cycle impossible to store
  lab_revision_id text not null, from_key text not null, to_key text not null, from_rank integer not null, to_rank integer not null,
  primary key (lab_revision_id, from_key, to_key), check (from_rank < to_rank),
  foreign key (lab_revision_id, from_key, from_rank) references step (lab_revision_id, step_key, rank),
  foreign key (lab_revision_id, to_key, to_rank) references step (lab_revision_id, step_key, rank)
) strict, without rowid;
create table accepted (                       -- what a ruling added to a step; part of a re-marking's inputs
  id text primary key, lab_id text not null references lab, step_key text not null, body_json text not null, digest blob not null,
  from_ruling_id text references ruling, added_at integer not null, revoked_at integer
) strict;
create table posting (
  id text primary key, lab_id text not null references lab, section_id text not null references section,
  opens_local text not null, due_local text not null, zone text not null, opens_at integer not null, due_at integer not null,
  late_rule_json text not null, attempts integer not null, keep text not null check (keep in ('last','best')),
  feedback text not null check (feedback in ('at_once','after_release')), state text not null check (state in ('planned','posted','withdrawn')),
  released_at integer, version integer not null, unique (lab_id, section_id), check (due_at > opens_at)
) strict;
create table allowance (id text primary key, posting_id text not null references posting, membership_id text not null references membership,
  due_at integer not null, reason text not null, by_actor_id text not null references actor, seq integer not null unique) strict;
create table standing (                       -- excused leaves the denominator, not_counted waits for staff; neither is a zero
  id text primary key, membership_id text not null references membership, lab_id text not null references lab,
  kind text not null check (kind in ('counted','excused','not_counted')), reason text not null, by_actor_id text references actor, seq integer not null unique
) strict;
create table holder (id text primary key, lab_id text not null references lab, kind text not null check (kind in ('one','group')),
  unique (id, lab_id)) strict;
create table holder_member (holder_id text not null, membership_id text not null references membership, lab_id text not null,
  primary key (holder_id, membership_id), unique (lab_id, membership_id),
  foreign key (holder_id, lab_id) references holder (id, lab_id)) strict, without rowid;
create table draw (
  id text primary key, lab_id text not null references lab, lab_revision_id text not null references lab_revision,
  algorithm text not null, seed blob not null check (length(seed) = 16), supply_json text not null, supply_sha256 blob not null,
  made_at integer not null
) strict;
create table share (
  id text primary key, lab_id text not null, holder_id text not null, redraw integer not null, draw_id text not null references draw,
  ordinal integer not null, supply_no integer not null, data_set_version_id text not null references data_set_version,
  inputs_json text not null, served_sha256 blob not null, digest blob not null, reason text,   -- served = the CSV with its digits
  unique (lab_id, holder_id, redraw), unique (draw_id, ordinal), foreign key (holder_id, lab_id) references holder (id, lab_id),
  check (redraw = 0 or reason is not null)
) strict;
`
