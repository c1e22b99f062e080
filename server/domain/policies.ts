/**
 * Who may do what, on which object, in which state, and what is hidden: one record per action, read by `authorize.ts`,
 * by the API's description and by the access sweep. A route names one of these actions or does not compile.
 *
 * Scopes, from wide to narrow
 *   public      anyone, signed in or not
 *   session     any person who is signed in
 *   department  a role in the department
 *   course      a membership of the object's course (or a listed department role)
 *   section     as course, and a TA or student only in a section of theirs
 *   own         as section, and a student only for what is their own
 *
 * A foreign object answers like a missing one (404). Inside one's own course a role that may not is told so (403).
 */
export type CourseRole = 'lead' | 'instructor' | 'ta' | 'student'
export type DepartmentRoleName = 'admin' | 'technician' | 'visitor'
export type Role = CourseRole | DepartmentRoleName
export type Scope = 'public' | 'session' | 'department' | 'course' | 'section' | 'own'

export interface Policy {
  scope: Scope
  roles: readonly Role[]
  /** Only while the term is not closed. */
  openTerm?: true
  /** For students: only once the lab is posted to their section and open. */
  opened?: true
  /** What the answer leaves out for whom; the use case does it, the sweep checks it. */
  hides?: Partial<Record<Role, readonly string[]>>
}

const staff = ['lead', 'instructor', 'ta'] as const
const teachers = ['lead', 'instructor'] as const
const everyone = [...staff, 'student'] as const

export const policies = {
  // the house
  'house:ready': { scope: 'public', roles: [] },
  'house:describe': { scope: 'public', roles: [] },
  'house:demo': { scope: 'public', roles: [] },
  'house:caughtMail': { scope: 'public', roles: [] },
  // oneself
  'self:read': { scope: 'session', roles: [] },
  'self:endSessions': { scope: 'session', roles: [] },
  'self:changePassphrase': { scope: 'session', roles: [] },
  'passphrase:askReset': { scope: 'public', roles: [] },
  'passphrase:reset': { scope: 'public', roles: [] },
  'invitation:accept': { scope: 'public', roles: [] },
  'reference:read': { scope: 'session', roles: [] },
  'reference:compare': { scope: 'course', roles: staff },
  // courses
  'course:read': { scope: 'course', roles: [...everyone, 'admin'] },
  'course:convention': { scope: 'course', roles: staff },
  'course:chooseConvention': { scope: 'course', roles: ['lead'], openTerm: true },
  'course:open': { scope: 'course', roles: ['lead', 'admin'], openTerm: true },
  'course:people': { scope: 'course', roles: [...staff, 'admin'] },
  'person:read': { scope: 'section', roles: staff },
  'person:repair': { scope: 'course', roles: teachers, openTerm: true },
  'person:acceptLate': { scope: 'section', roles: staff, openTerm: true },
  'course:roof': { scope: 'course', roles: [...everyone, 'admin', 'technician'] },
  // data
  'data:list': { scope: 'course', roles: [...teachers, 'ta', 'technician'] },
  'data:read': { scope: 'course', roles: [...teachers, 'ta', 'technician'] },
  'data:upload': { scope: 'course', roles: [...teachers, 'technician'], openTerm: true },
  'data:import': { scope: 'course', roles: [...teachers, 'technician'], openTerm: true },
  'data:job': { scope: 'course', roles: [...teachers, 'technician'] },
  'data:cancel': { scope: 'course', roles: [...teachers, 'technician'] },
  'data:source': { scope: 'course', roles: [...teachers, 'technician'] },
  // labs
  'lab:list': { scope: 'course', roles: everyone, hides: { student: ['drafts', 'reference'] } },
  'lab:write': { scope: 'course', roles: teachers, openTerm: true },
  'lab:begin': { scope: 'course', roles: teachers },
  'lab:edit': { scope: 'course', roles: [...teachers, 'ta'] },
  'lab:flights': { scope: 'course', roles: [...teachers, 'ta'] },
  'lab:preview': { scope: 'course', roles: [...teachers, 'ta'] },
  'lab:own-finding': { scope: 'course', roles: teachers, openTerm: true },
  'lab:post': { scope: 'course', roles: teachers, openTerm: true },
  'lab:release': { scope: 'course', roles: teachers },
  'lab:class': { scope: 'section', roles: staff },
  'lab:work': { scope: 'own', roles: ['student'], opened: true, hides: { student: ['reference', 'band', 'derived'] } },
  'lab:practice': { scope: 'own', roles: ['student'], opened: true, hides: { student: ['own share', 'what is the same for every share'] } },
  'share:data': { scope: 'own', roles: everyone, opened: true, hides: { student: ['derived'] } },
  'share:redraw': { scope: 'course', roles: teachers, openTerm: true },
  'allowance:grant': { scope: 'course', roles: teachers, openTerm: true },
  // work
  'draft:save': { scope: 'own', roles: ['student'], opened: true, openTerm: true },
  'draft:check': { scope: 'own', roles: ['student'], opened: true },
  'submission:create': { scope: 'own', roles: ['student'], opened: true },
  'submission:list': { scope: 'own', roles: everyone },
  'submission:read': { scope: 'own', roles: everyone },
  'receipt:read': { scope: 'own', roles: everyone },
  'marks:read': { scope: 'own', roles: everyone, hides: { student: ['unreleased'] } },
  'marks:course': { scope: 'course', roles: everyone, hides: { student: ['others', 'unreleased'] } },
  'work:list': { scope: 'course', roles: ['student'] },
  'mark:history': { scope: 'own', roles: everyone, hides: { student: ['unreleased'] } },
  // disputes
  'dispute:open': { scope: 'own', roles: ['student'], openTerm: true },
  'dispute:list': { scope: 'course', roles: everyone },
  'dispute:read': { scope: 'own', roles: everyone, hides: { student: ['likeCases', 'staffNotes'] } },
  'dispute:withdraw': { scope: 'own', roles: ['student'], openTerm: true },
  'dispute:take': { scope: 'section', roles: staff, openTerm: true },
  'dispute:rule': { scope: 'section', roles: staff, openTerm: true },
  'dispute:file': { scope: 'own', roles: everyone },
  // department
  'department:read': { scope: 'department', roles: ['admin'] },
  'department:people': { scope: 'department', roles: ['admin'] },
  'department:invite': { scope: 'department', roles: ['admin'] },
  'department:closeAccount': { scope: 'department', roles: ['admin'] },
  'department:role': { scope: 'department', roles: ['admin'] },
  'department:terms': { scope: 'department', roles: ['admin'] },
  'department:courses': { scope: 'department', roles: ['admin'] },
  'department:memberships': { scope: 'department', roles: ['admin'] },
  'department:roster': { scope: 'department', roles: ['admin'] },
  'department:rollover': { scope: 'department', roles: ['admin'] },
  'department:ledger': { scope: 'department', roles: ['admin'] },
  'department:access': { scope: 'department', roles: ['admin'] },
  'department:jobs': { scope: 'department', roles: ['admin', 'technician'] },
  'department:mail': { scope: 'department', roles: ['admin'] },
  'department:resendMail': { scope: 'department', roles: ['admin'] },
  'department:data': { scope: 'department', roles: ['technician'] },
  // a visit: a stated scope until a stated day, logged
  'visit:read': { scope: 'department', roles: ['visitor'], hides: { visitor: ['names', 'typed', 'unreleased'] } },
} as const satisfies Record<string, Policy>

export type Action = keyof typeof policies
