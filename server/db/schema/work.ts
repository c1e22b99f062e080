/** Rows of main.db as they stand, in the order of migrations/ground/work.ts. */
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
