import type { Generated } from 'kysely'

/** Rows of main.db as they stand, in the order of migrations/ground/department.ts. */
export interface TermTable {
  id: string
  name: string
  zone: string
  starts_on: string
  ends_on: string
  state: 'planned' | 'running' | 'closed'
  calendar_json: string
  version: Generated<number>
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
