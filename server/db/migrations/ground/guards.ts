import { appendOnly } from '../../appendOnly'

/** Tables whose rows are written once: a change or a removal is refused by the database itself. */
export const writtenOnce = [
  'actor', 'source_file', 'upload', 'sensor_accuracy', 'recipe_revision', 'data_set_version', 'data_set_version_source', 'data_column',
  'reference_build', 'convention_revision', 'allowance', 'standing', 'draw', 'share', 'submission', 'answer', 'evaluation', 'mark',
  'dispute_note', 'ruling', 'marking_run_item', 'ledger_entry', 'ledger_anchor',
] as const

const rules = `create trigger ledger_links before insert on ledger_entry begin
  select raise(abort, 'ledger: not the next link') where not exists
    (select 1 from ledger_chain where id = new.chain_id and seq = new.seq - 1 and head = new.prev); end;
create trigger ledger_advances after insert on ledger_entry begin
  update ledger_chain set seq = new.seq, head = new.digest where id = new.chain_id; end;
create trigger chain_moves_by_entries before update on ledger_chain begin
  select raise(abort, 'ledger: head moves by an entry only') where not exists
    (select 1 from ledger_entry where chain_id = new.id and seq = new.seq and digest = new.head) or new.seq <> old.seq + 1; end;
create trigger mark_is_next before insert on mark begin
  select raise(abort, 'mark: not the next version') where new.version <> 1 + coalesce(
    (select max(version) from mark where submission_id = new.submission_id and step_key = new.step_key), 0); end;
create trigger revision_frozen before update on lab_revision when old.frozen_at is not null begin select raise(abort, 'lab_revision: frozen'); end;
create trigger step_frozen before update on step begin select raise(abort, 'step: frozen')
  where (select frozen_at from lab_revision where id = old.lab_revision_id) is not null; end;
create trigger step_no_delete before delete on step begin select raise(abort, 'step: frozen')
  where (select frozen_at from lab_revision where id = old.lab_revision_id) is not null; end;
create trigger step_no_late_insert before insert on step begin select raise(abort, 'step: frozen')
  where (select frozen_at from lab_revision where id = new.lab_revision_id) is not null; end;
create trigger draw_freezes after insert on draw begin
  update lab_revision set frozen_at = new.made_at where id = new.lab_revision_id and frozen_at is null; end;
create trigger ruling_not_own before insert on ruling begin
  select raise(abort, 'ruling: own work or declared conflict') where exists (
    select 1 from dispute d join submission s on s.id = d.submission_id join share h on h.id = s.share_id
      join holder_member hm on hm.holder_id = h.holder_id where d.id = new.dispute_id and (hm.membership_id = new.by_actor_id or exists
      (select 1 from conflict_of_interest c where c.membership_id = new.by_actor_id and c.other_id = hm.membership_id))); end;
create trigger closed_term before insert on submission begin
  select raise(abort, 'term: closed') where exists (select 1 from share h join lab l on l.id = h.lab_id join course c on c.id = l.course_id
    join term t on t.id = c.term_id where h.id = new.share_id and t.state = 'closed'
    and not exists (select 1 from allowance a join posting p on p.id = a.posting_id join holder_member hm on hm.membership_id = a.membership_id
      where p.lab_id = h.lab_id and hm.holder_id = h.holder_id and a.due_at >= new.received_at)); end;     -- incompletes go on by an allowance
`

export const guards = `${writtenOnce.map(appendOnly).join('\n')}\n${rules}`
