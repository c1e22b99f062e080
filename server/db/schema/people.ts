import type { Generated } from 'kysely'

/** Rows of main.db as they stand, in the order of migrations/ground/people.ts. */
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
