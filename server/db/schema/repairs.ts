/** Rows of main.db as they stand: what staff did for one student. */
export interface RepairTable {
  id: string
  seq: number
  membership_id: string
  lab_id: string | null
  kind: 'extension' | 'accommodation' | 'excused' | 'counted' | 'not_counted' | 'attempt' | 'moved' | 'lateness'
  due_at: number | null
  extra_days: number | null
  submission_id: string | null
  late_units: number | null
  late_rule_json: string | null
  /** Hex: the text is in `private_body`, where it can be erased. */
  reason_digest: string | null
  by_actor_id: string
  at: number
  ledger_chain: string
  ledger_seq: number
}
