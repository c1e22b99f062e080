import type { Generated } from 'kysely'

/** Rows as they stand in main.db. A test holds these names against the migrated schema. */
export interface PersonTable {
  id: string
  display_name: string | null
  email_norm: string | null
  campus_issuer: string | null
  campus_subject: string | null
  state: 'invited' | 'active' | 'closed' | 'erased'
  credential_epoch: Generated<number>
  created_at: number
  erased_at: number | null
}

export interface CredentialTable {
  person_id: string
  argon2id: string
  changed_at: number
}

export interface SessionTable {
  token_sha256: Buffer
  person_id: string
  credential_epoch: number
  created_at: number
  seen_at: number
  ends_at: number
  ended_at: number | null
  ended_why: string | null
}

export interface OneTimeTokenTable {
  token_sha256: Buffer
  purpose: 'invite' | 'reset' | 'setup'
  person_id: string
  ends_at: number
  used_at: number | null
}

export interface ActorTable {
  id: string
  kind: 'membership' | 'department_role' | 'system'
}

export interface DepartmentRoleTable {
  id: string
  person_id: string | null
  pseudonym: string
  role: 'admin' | 'technician' | 'visitor'
  scope_json: string | null
  until_at: number | null
  state: 'active' | 'ended'
  created_at: number
}

export interface ReferenceBuildTable {
  digest: Buffer
  version: string
  interface: number
  bundle: string
  golden_sha256: Buffer
  added_at: number
}

export interface ConventionRevisionTable {
  id: string
  convention_key: string
  no: number
  body_json: string
  digest: Buffer
}

export interface TermTable {
  id: string
  name: string
  zone: string
  starts_on: string
  ends_on: string
  state: 'planned' | 'running' | 'closed'
  calendar_json: string
}

export interface CourseTable {
  id: string
  term_id: string
  code: string
  title: string
  ancestor_id: string | null
  convention_revision_id: string
  state: 'draft' | 'open' | 'settled' | 'closed'
  late_rule_json: string
  settings_json: Generated<string>
  version: number
}

export interface CourseListingTable {
  course_id: string
  code: string
}

export interface SectionTable {
  id: string
  course_id: string
  name: string
  meets_json: Generated<string>
}

export interface MembershipTable {
  id: string
  course_id: string
  person_id: string | null
  pseudonym: string
  role: 'lead' | 'instructor' | 'ta' | 'student'
  section_id: string | null
  state: 'active' | 'dropped' | 'ended'
  version: number
  created_at: number
}

export interface TaSectionTable {
  membership_id: string
  section_id: string
  course_id: string
}

export interface ConflictOfInterestTable {
  membership_id: string
  other_id: string
}

export interface SourceFileTable {
  sha256: Buffer
  size: number
  stored_at: number
}

export interface UploadTable {
  id: string
  course_id: string | null
  source_sha256: Buffer
  original_name: string
  by_actor_id: string
  at: number
}

export interface SensorTable {
  id: string
  instrument: string
  quantity: string
  unit: string
  site_json: string
  serves_from: number
  serves_to: number | null
}

export interface SensorAccuracyTable {
  id: string
  sensor_id: string
  valid_from: number
  valid_to: number | null
  half_width: number
  coverage_k: number
  resolution: number
  time_constant_s: number | null
  source: string
}

export interface RecipeRevisionTable {
  id: string
  recipe_key: string
  no: number
  body_json: string
  digest: Buffer
}

export interface DataSetTable {
  id: string
  owner_course_id: string | null
  kind: 'station' | 'flight'
  title: string
}

export interface DataSetVersionTable {
  id: string
  data_set_id: string
  no: number
  parent_id: string | null
  cause: 'import' | 'append' | 'flag' | 'correct' | 'derive'
  reason: string
  root_sha256: Buffer
  rows_read: number
  rows_taken: number
  rows_refused: number
  first_at: number | null
  last_at: number | null
  recipe_revision_id: string | null
  importer: string
  meta_json: string
  by_actor_id: string
  made_at: number
}

export interface DataSetVersionSourceTable {
  version_id: string
  ordinal: number
  source_sha256: Buffer
}

export interface DataColumnTable {
  version_id: string
  no: number
  name: string
  quantity: string
  unit_ucum: string
  decimals: number | null
  height_m: number | null
  role: 'time' | 'value' | 'quality' | 'label'
  sensor_accuracy_id: string | null
}

export interface LabTable {
  id: string
  course_id: string
  ancestor_id: string | null
  title: string
  state: 'draft' | 'posted' | 'withdrawn' | 'archived'
  version: number
}

export interface LabRevisionTable {
  id: string
  lab_id: string
  no: number
  body_json: string
  digest: Buffer
  frozen_at: number | null
}

export interface StepTable {
  lab_revision_id: string
  step_key: string
  rank: number
  kind: 'number' | 'table' | 'diagram' | 'fit' | 'reading' | 'choice' | 'text' | 'file'
  points_milli: number
  binding_json: string
  ask: string
  band_json: string
}

export interface StepEdgeTable {
  lab_revision_id: string
  from_key: string
  to_key: string
  from_rank: number
  to_rank: number
}

export interface AcceptedTable {
  id: string
  lab_id: string
  step_key: string
  body_json: string
  digest: Buffer
  from_ruling_id: string | null
  added_at: number
  revoked_at: number | null
}

export interface PostingTable {
  id: string
  lab_id: string
  section_id: string
  opens_local: string
  due_local: string
  zone: string
  opens_at: number
  due_at: number
  late_rule_json: string
  attempts: number
  keep: 'last' | 'best'
  feedback: 'at_once' | 'after_release'
  state: 'planned' | 'posted' | 'withdrawn'
  released_at: number | null
  version: number
}

export interface AllowanceTable {
  id: string
  posting_id: string
  membership_id: string
  due_at: number
  reason: string
  by_actor_id: string
  seq: number
}

export interface StandingTable {
  id: string
  membership_id: string
  lab_id: string
  kind: 'counted' | 'excused' | 'not_counted'
  reason: string
  by_actor_id: string | null
  seq: number
}

export interface HolderTable {
  id: string
  lab_id: string
  kind: 'one' | 'group'
}

export interface HolderMemberTable {
  holder_id: string
  membership_id: string
  lab_id: string
}

export interface DrawTable {
  id: string
  lab_id: string
  lab_revision_id: string
  algorithm: string
  seed: Buffer
  supply_json: string
  supply_sha256: Buffer
  made_at: number
}

export interface ShareTable {
  id: string
  lab_id: string
  holder_id: string
  redraw: number
  draw_id: string
  ordinal: number
  supply_no: number
  data_set_version_id: string
  inputs_json: string
  served_sha256: Buffer
  digest: Buffer
  reason: string | null
}

export interface LedgerChainTable {
  id: string
  seq: number
  head: Buffer
}

export interface LedgerEntryTable {
  chain_id: string
  seq: number
  at: number
  actor: string
  action: string
  facts_json: string
  private_digest: Buffer | null
  prev: Buffer
  digest: Buffer
}

export interface PrivateBodyTable {
  digest: Buffer
  about_membership_id: string
  salt: Buffer
  body: string
}

export interface WorkFileTable {
  digest: Buffer
  about_membership_id: string
  size: number
  original_name: string
}

export interface LedgerAnchorTable {
  chain_id: string
  seq: number
  sent_to: string
  digest: Buffer
  sent_at: number
}

export interface DraftTable {
  share_id: string
  step_key: string
  membership_id: string
  typed: string
  base_version: number
  version: number
  saved_at: number
}

export interface SubmissionTable {
  id: string
  seq: number
  share_id: string
  attempt: number
  by_membership_id: string
  lab_revision_id: string
  received_at: number
  due_at_applied: number
  late_units: number
  late_rule_json: string
  late_reason: string
  claimed_sent_at: number | null
  request_key: string
  body_sha256: Buffer
  receipt_no: string
  ledger_chain: string
  ledger_seq: number
}

export interface AnswerTable {
  submission_id: string
  step_key: string
  typed: string
  reading: 'ok' | 'class' | 'none' | 'not_reached' | 'not_defined' | 'empty' | 'unreadable' | 'wrong_dimension' | 'ambiguous'
  value_si: number | null
  unit_ucum: string | null
  digits: number | null
  resolution_si: number | null
  private_digest: Buffer | null
}

export interface EvaluationTable {
  id: string
  submission_id: string
  step_key: string
  reference_digest: Buffer
  convention_revision_id: string
  data_set_version_id: string
  lab_revision_id: string
  inputs_json: string
  carried_json: string
  accepted_json: string
  center_bits: Buffer | null
  low_bits: Buffer | null
  high_bits: Buffer | null
  parts_json: string
  slips_json: string
  trace_json: string
  digest: Buffer
  outcome: 'value' | 'class' | 'none' | 'not_reached' | 'not_defined' | 'refused'
  refusal_code: string | null
}

export interface MarkTable {
  id: string
  submission_id: string
  step_key: string
  version: number
  points_milli: number
  max_milli: number
  evaluation_id: string | null
  cause: 'submission' | 'text_marking' | 'ruling' | 'appeal' | 'run' | 'undo'
  ledger_chain: string
  ledger_seq: number
}

export interface MarkCurrentTable {
  id: string
  submission_id: string
  step_key: string
  version: number
  points_milli: number
  max_milli: number
  evaluation_id: string | null
  cause: 'submission' | 'text_marking' | 'ruling' | 'appeal' | 'run' | 'undo'
  ledger_chain: string
  ledger_seq: number
}

export interface DisputeTable {
  id: string
  submission_id: string
  step_key: string
  against_mark_id: string
  state: 'open' | 'taken' | 'ruled' | 'appealed' | 'closed' | 'withdrawn'
  version: number
  opened_by_membership_id: string
  taken_by: string | null
  taken_until: number | null
  opened_at: number
}

export interface DisputeNoteTable {
  id: string
  dispute_id: string
  by_actor_id: string
  audience: 'all' | 'staff'
  private_digest: Buffer
  file_digest: Buffer | null
  at: number
}

export interface RulingTable {
  id: string
  dispute_id: string
  level: 'first' | 'appeal'
  kind: 'uphold' | 'change' | 'accept' | 'fault'
  reason: string
  by_actor_id: string
  at: number
  ledger_chain: string
  ledger_seq: number
}

export interface MarkingRunTable {
  id: string
  lab_id: string
  cause_json: string
  policy: 'never_lower' | 'as_computed'
  plan_sha256: Buffer
  state: 'planned' | 'applied' | 'undone'
  version: number
}

export interface MarkingRunItemTable {
  run_id: string
  submission_id: string
  step_key: string
  before_mark_id: string
  after_milli: number
  evaluation_id: string | null
}

export interface CounterTable {
  name: string
  value: number
}

export interface RequestKeyTable {
  person_id: string
  key: string
  route: string
  body_sha256: Buffer
  status: number
  response_json: string
  at: number
}

export interface JobTable {
  id: string
  course_id: string | null
  by_actor_id: string | null
  kind: string
  once_key: string | null
  payload_json: string
  state: 'waiting' | 'leased' | 'done' | 'failed' | 'cancelled'
  attempts: number
  run_after: number
  leased_until: number | null
  lease_owner: string | null
  done_units: Generated<number>
  all_units: number | null
  result_json: string | null
  error_json: string | null
  created_at: number
}

export interface OutboxTable {
  id: string
  event_key: string
  to_membership_id: string | null
  to_person_id: string | null
  message_id: string
  template: string
  facts_json: string
  state: 'waiting' | 'sent' | 'dead'
  attempts: number
  next_at: number
}

export interface AccessLogTable {
  seq: Generated<number>
  at: number
  actor_person_id: string
  subject_membership_id: string
  route: string
}

export interface InstallationTable {
  key: string
  value_json: string
}

export interface Database {
  person: PersonTable
  credential: CredentialTable
  session: SessionTable
  one_time_token: OneTimeTokenTable
  actor: ActorTable
  department_role: DepartmentRoleTable
  reference_build: ReferenceBuildTable
  convention_revision: ConventionRevisionTable
  term: TermTable
  course: CourseTable
  course_listing: CourseListingTable
  section: SectionTable
  membership: MembershipTable
  ta_section: TaSectionTable
  conflict_of_interest: ConflictOfInterestTable
  source_file: SourceFileTable
  upload: UploadTable
  sensor: SensorTable
  sensor_accuracy: SensorAccuracyTable
  recipe_revision: RecipeRevisionTable
  data_set: DataSetTable
  data_set_version: DataSetVersionTable
  data_set_version_source: DataSetVersionSourceTable
  data_column: DataColumnTable
  lab: LabTable
  lab_revision: LabRevisionTable
  step: StepTable
  step_edge: StepEdgeTable
  accepted: AcceptedTable
  posting: PostingTable
  allowance: AllowanceTable
  standing: StandingTable
  holder: HolderTable
  holder_member: HolderMemberTable
  draw: DrawTable
  share: ShareTable
  ledger_chain: LedgerChainTable
  ledger_entry: LedgerEntryTable
  private_body: PrivateBodyTable
  work_file: WorkFileTable
  ledger_anchor: LedgerAnchorTable
  draft: DraftTable
  submission: SubmissionTable
  answer: AnswerTable
  evaluation: EvaluationTable
  mark: MarkTable
  mark_current: MarkCurrentTable
  dispute: DisputeTable
  dispute_note: DisputeNoteTable
  ruling: RulingTable
  marking_run: MarkingRunTable
  marking_run_item: MarkingRunItemTable
  counter: CounterTable
  request_key: RequestKeyTable
  job: JobTable
  outbox: OutboxTable
  access_log: AccessLogTable
  installation: InstallationTable
}
