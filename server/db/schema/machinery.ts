import type { Generated } from 'kysely'

/** Rows of main.db as they stand, in the order of migrations/ground/machinery.ts. */
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

export interface LastChangeTable {
  object_id: string
  by_actor_id: string
  at: number
}

export interface InstallationTable {
  key: string
  value_json: string
}
