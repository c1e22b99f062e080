import type { Kysely, Migration } from 'kysely'
import { appendOnly } from '../appendOnly'
import { runStatements } from '../dialect'

/**
 * The same bytes can come from two students: each has a row, with the name that they gave, and erasing one leaves the other's. The bytes themselves are stored once.
 * Until now the first who came stood for all. Whose a note's file is says the dispute; under which name it came says the note's text, `Added a file: NAME`.
 */
const tables = `create table work_file_of_person (digest blob not null check (length(digest) = 32), about_membership_id text not null references membership,
  size integer not null, original_name text not null, primary key (digest, about_membership_id)) strict, without rowid;
create table note_of_person (id text primary key, dispute_id text not null references dispute, by_actor_id text not null references actor,
  audience text not null check (audience in ('all','staff')), private_digest blob not null, file_digest blob, file_about_membership_id text, at integer not null,
  check ((file_digest is null) = (file_about_membership_id is null)),
  foreign key (file_digest, file_about_membership_id) references work_file_of_person (digest, about_membership_id)) strict;
create table note_about (id text primary key, about text not null) strict;
insert into note_about (id, about) select dispute_note.id, coalesce(max(case when holder_member.membership_id = dispute_note.by_actor_id then holder_member.membership_id end), min(holder_member.membership_id))
  from dispute_note join dispute on dispute.id = dispute_note.dispute_id join submission on submission.id = dispute.submission_id join share on share.id = submission.share_id
  join holder_member on holder_member.holder_id = share.holder_id where dispute_note.file_digest is not null group by dispute_note.id;
insert into work_file_of_person (digest, about_membership_id, size, original_name)
  select work_file.digest, note_about.about, min(work_file.size), coalesce(min(substr(private_body.body, 15)), min(work_file.original_name))
  from dispute_note join note_about on note_about.id = dispute_note.id join work_file on work_file.digest = dispute_note.file_digest
  left join private_body on private_body.digest = dispute_note.private_digest and private_body.body like 'Added a file: %' group by work_file.digest, note_about.about;
insert into note_of_person (id, dispute_id, by_actor_id, audience, private_digest, file_digest, file_about_membership_id, at)
  select dispute_note.id, dispute_id, by_actor_id, audience, private_digest, file_digest, note_about.about, at from dispute_note left join note_about on note_about.id = dispute_note.id;
drop table note_about;
drop table dispute_note;
drop table work_file;
alter table work_file_of_person rename to work_file;
alter table note_of_person rename to dispute_note;
`

export const filesOfPeople: Migration = {
  async up(db: Kysely<unknown>): Promise<void> {
    await runStatements(db, `${tables}\n${appendOnly('dispute_note')}`)
  },
}
