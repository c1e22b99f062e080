import { z } from 'zod'
import { termCalendar } from './calendar'
import { courseRole, departmentRoleName, termState } from './department'
import { lateRule } from './lab'

/** What the department's routes answer, for their pages. */

const count = z.number().int()
export const accountState = z.enum(['invited', 'active', 'closed', 'erased'])
const openAccountState = accountState.exclude(['erased'])
export const membershipState = z.enum(['active', 'dropped', 'ended'])
/** Rows keep epoch milliseconds, JSON says ISO 8601 with Z. */
const instant = z.number().transform(at => new Date(at).toISOString())

export const peoplePage = z.object({
  page: count, pages: count, count,
  people: z.array(z.object({
    id: z.string(), name: z.string(), email: z.string(), state: openAccountState, roles: z.array(departmentRoleName), courses: z.array(z.object({ code: z.string(), role: courseRole })),
  })),
})
export type PeoplePage = z.output<typeof peoplePage>

export const personDescription = z.object({
  id: z.string(), name: z.string(), email: z.string(), state: openAccountState, createdAt: z.string(), openSessions: count,
  roles: z.array(z.object({ id: z.string(), role: departmentRoleName, until: z.string().nullable() })),
  memberships: z.array(z.object({
    id: z.string(), role: courseRole, state: membershipState, courseId: z.string(), code: z.string(), title: z.string(), term: z.string(), section: z.string().nullable(),
  })),
})
export type PersonDescription = z.output<typeof personDescription>

export const termList = z.object({
  terms: z.array(z.object({
    id: z.string(), name: z.string(), zone: z.string(), startsOn: z.string(), endsOn: z.string(), state: termState, weeks: count, courses: count, students: count, fromTermId: z.string().nullable(),
  })),
})
export type TermList = z.output<typeof termList>

export const termDescription = z.object({
  id: z.string(), name: z.string(), zone: z.string(), startsOn: z.string(), endsOn: z.string(), state: termState, version: count, calendar: termCalendar,
  from: z.object({ id: z.string(), name: z.string() }).nullable(),
  courses: z.array(z.object({
    id: z.string(), code: z.string(), title: z.string(), state: z.enum(['draft', 'open', 'settled', 'closed']), alsoListedAs: z.array(z.string()), sections: z.array(z.string()), students: count, staff: count, labs: count,
  })),
})
export type TermDescription = z.output<typeof termDescription>

export const courseDescription = z.object({
  id: z.string(), code: z.string(), title: z.string(), state: z.enum(['draft', 'open', 'settled', 'closed']), alsoListedAs: z.array(z.string()), lateRule, convention: z.string(), version: count,
  term: z.object({ id: z.string(), name: z.string(), state: termState }),
  ancestor: z.object({ id: z.string(), term: z.string() }).nullable(),
  sections: z.array(z.object({ id: z.string(), name: z.string(), students: count })),
  members: z.array(z.object({
    id: z.string(), personId: z.string().nullable(), name: z.string(), email: z.string(), role: courseRole, state: membershipState, accountState, sectionIds: z.array(z.string()), version: count,
  })),
})
export type CourseDescription = z.output<typeof courseDescription>

const labTitle = z.object({ labId: z.string(), title: z.string() })
export const lateAddTold = z.object({ id: z.string(), notCounted: z.array(labTitle), personalDue: z.array(labTitle.extend({ dueAt: instant })) })
export type LateAddTold = z.output<typeof lateAddTold>
export const moveTold = z.object({ keptDue: z.array(labTitle.extend({ dueAt: instant })), notPosted: z.array(labTitle) })
export type MoveTold = z.output<typeof moveTold>

export const rosterDone = z.object({ added: count, invited: count, moved: count, ended: count, same: count, left: count, refused: count })
export type RosterDone = z.output<typeof rosterDone>

export const ledgerPage = z.object({
  chains: z.array(z.object({ id: z.string(), label: z.string(), seq: count })),
  head: z.object({ seq: count, digest: z.string() }).nullable(),
  actions: z.array(z.string()),
  entries: z.array(z.object({ seq: count, at: z.string(), action: z.string(), by: z.string(), about: z.array(z.string()), facts: z.string(), digest: z.string(), hasPrivateText: z.boolean() })),
  next: count.nullable(),
})
export type LedgerPage = z.output<typeof ledgerPage>

/** Looks at people's records, the newest first. */
export const accessPage = z.object({
  people: z.array(z.object({ id: z.string(), name: z.string() })),
  lines: z.array(z.object({ seq: count, at: z.string(), by: z.string(), about: z.string(), course: z.string(), route: z.string() })),
  next: count.nullable(),
})
export type AccessPage = z.output<typeof accessPage>

export const coursePeople = z.object({
  course: z.object({ code: z.string(), title: z.string(), alsoListedAs: z.array(z.string()), term: z.string(), zone: z.string() }),
  staff: z.array(z.object({ id: z.string(), name: z.string(), email: z.string(), role: courseRole, sections: z.array(z.string()) })),
  sections: z.array(z.object({
    id: z.string(), name: z.string(),
    students: z.array(z.object({ id: z.string(), name: z.string(), email: z.string(), accountState, notCounted: count })),
  })),
  allowances: z.array(z.object({ membershipId: z.string(), postingId: z.string(), title: z.string(), dueLocal: z.string(), kind: z.string() })),
})
export type CoursePeople = z.output<typeof coursePeople>

export const allowanceTold = z.object({ dueAt: instant, told: z.string().nullable() })
export type AllowanceTold = z.output<typeof allowanceTold>

/** A course as whoever keeps the instruments sees it: where a file goes. */
export const dataCourse = z.object({ id: z.string(), code: z.string(), title: z.string(), term: z.string(), termState, dataSets: count })
export type DataCourse = z.output<typeof dataCourse>
