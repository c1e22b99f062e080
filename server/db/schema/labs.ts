/** Rows of main.db as they stand, in the order of migrations/ground/labs.ts. */
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

export interface OwnedRedTable {
  id: string
  lab_id: string
  red_key: string
  reason: string
  by_actor_id: string
  at: number
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
  /** Hex: the text is in `private_body`, where it can be erased. */
  reason_digest: string | null
}
