import type { SourceFileTable, UploadTable, SensorTable, SensorAccuracyTable, RecipeRevisionTable, DataSetTable, DataSetVersionTable, DataSetVersionSourceTable, DataColumnTable } from './data'
import type { TermTable, CourseTable, CourseListingTable, SectionTable, MembershipTable, TaSectionTable, ConflictOfInterestTable } from './department'
import type { LabTable, LabRevisionTable, StepTable, StepEdgeTable, AcceptedTable, OwnedRedTable, PostingTable, AllowanceTable, StandingTable, HolderTable, HolderMemberTable, DrawTable, ShareTable } from './labs'
import type { LedgerChainTable, LedgerEntryTable, PrivateBodyTable, WorkFileTable, LedgerAnchorTable } from './ledger'
import type { CounterTable, RequestKeyTable, JobTable, OutboxTable, AccessLogTable, LastChangeTable, InstallationTable } from './machinery'
import type { DisputeTable, DisputeNoteTable, RulingTable, MarkingRunTable, MarkingRunItemTable } from './moderation'
import type { PersonTable, CredentialTable, SessionTable, OneTimeTokenTable, ActorTable, DepartmentRoleTable } from './people'
import type { ReferenceBuildTable, ConventionRevisionTable } from './reference'
import type { RepairTable } from './repairs'
import type { DraftTable, SubmissionTable, AnswerTable, EvaluationTable, MarkTable } from './work'

/** Every table by its name. A test holds these names and columns against the migrated schema. */
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
  owned_red: OwnedRedTable
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
  mark_current: MarkTable
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
  last_change: LastChangeTable
  installation: InstallationTable
  repair: RepairTable
}
