/** Rows of main.db as they stand, in the order of migrations/ground/moderation.ts. */
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
  /** Of the two the file is known: two people may have handed in the same bytes. */
  file_about_membership_id: string | null
  at: number
}

export interface RulingTable {
  id: string
  dispute_id: string
  level: 'first' | 'appeal'
  kind: 'uphold' | 'change' | 'accept' | 'fault'
  /** Hex: the text is in `private_body`, where it can be erased. */
  reason_digest: string
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
