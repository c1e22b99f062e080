// Kept small: each index has a question of the product behind it.
export const indexes = `create index membership_of_person on membership (person_id);
create index department_role_of_person on department_role (person_id);
create index membership_of_section on membership (section_id);
create index posting_by_due on posting (section_id, due_at);
create index share_of_holder on share (holder_id);
create index holder_member_of_membership on holder_member (membership_id);
create index submission_of_share on submission (share_id);
create index submission_by_receipt on submission (received_at);
create index evaluation_of_answer on evaluation (submission_id, step_key);
create index mark_of_submission on mark (submission_id);
create index dispute_by_state on dispute (state, opened_at);
create index ledger_by_action on ledger_entry (action, at);
create index outbox_waiting on outbox (state, next_at);
create index job_waiting on job (state, run_after);
create index session_of_person on session (person_id);
create index private_body_about on private_body (about_membership_id);
create index data_set_of_course on data_set (owner_course_id);
create index standing_of_membership on standing (membership_id, lab_id);
`
