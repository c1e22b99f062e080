import type { CourseRole, DepartmentRoleName } from '../policies'

/** A person as they stand at the moment of a request: looked up anew each time, so that a closed account ends at once. */
export interface Actor {
  personId: string
  displayName: string
  email: string
  /** SHA-256 of the session's token, hex: names the session without being able to use it. */
  sessionId: string
  memberships: readonly ActorMembership[]
  departmentRoles: readonly ActorDepartmentRole[]
}

export interface ActorMembership {
  id: string
  courseId: string
  role: CourseRole
  /** A student's one section; a TA's named sections; empty for lead and instructor, who have all. */
  sectionIds: readonly string[]
}

export interface ActorDepartmentRole {
  id: string
  role: DepartmentRoleName
  scopeJson: string | null
  untilAt: number | null
}

/** The one role in which an action is done. `actorId` is what rows and the ledger name. */
export interface Acting {
  actorId: string
  role: CourseRole | DepartmentRoleName
  courseId: string | null
  sectionIds: readonly string[]
}
