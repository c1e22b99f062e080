// Terms, courses, sections and who belongs to them.
export const departmentTables = `create table term (
  id text primary key, name text not null unique, zone text not null, starts_on text not null, ends_on text not null,
  state text not null check (state in ('planned','running','closed')), calendar_json text not null
) strict;
create table course (
  id text primary key, term_id text not null references term, code text not null, title text not null,
  ancestor_id text references course, convention_revision_id text not null references convention_revision,
  state text not null check (state in ('draft','open','settled','closed')), late_rule_json text not null, settings_json text not null default '{}',
  version integer not null, unique (term_id, code)
) strict;
create table course_listing (course_id text not null references course, code text not null, primary key (course_id, code)) strict, without rowid;   -- cross-listed
create table section (id text primary key, course_id text not null references course, name text not null, meets_json text not null default '{}',
  unique (course_id, name), unique (id, course_id)) strict;
-- person_id becomes null at erasure; everything a student made points at the membership, never at the person
create table membership (
  id text primary key references actor, course_id text not null references course, person_id text references person, pseudonym text not null,
  role text not null check (role in ('lead','instructor','ta','student')), section_id text,
  state text not null check (state in ('active','dropped','ended')), version integer not null, created_at integer not null,
  unique (course_id, person_id), unique (course_id, pseudonym), unique (id, course_id),
  foreign key (section_id, course_id) references section (id, course_id),
  check ((role = 'student') = (section_id is not null))
) strict;
create table ta_section (
  membership_id text not null, section_id text not null, course_id text not null, primary key (membership_id, section_id),
  foreign key (membership_id, course_id) references membership (id, course_id),
  foreign key (section_id, course_id) references section (id, course_id)
) strict, without rowid;
create table conflict_of_interest (membership_id text not null references membership, other_id text not null references membership,
  primary key (membership_id, other_id)) strict, without rowid;
`
