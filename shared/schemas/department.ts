import { z } from 'zod'
import { localDate, localDateTime, termCalendar, zoneName } from './calendar'
import { lateRule } from './lab'

/** What an admin writes about people, terms, courses and who belongs to them: one schema for form, route and row. */

const id = z.string().min(1).max(60)
const hasControl = (text: string) => [...text].some((letter) => { const code = letter.codePointAt(0)!; return code < 32 || code === 127 })

export const personName = z.string().trim().min(1, 'A name is needed.').max(120).refine(text => !hasControl(text), 'A name is one line of text.')

/** As it is compared: no blanks around, one form of each letter, lower case. */
export const emailAddress = z.string().transform(text => text.trim().normalize('NFKC').toLowerCase()).pipe(z.string().max(254).regex(/^[^\s@,;<>()"]+@[^\s@,;<>()"]+\.[^\s@,;<>()".]+$/, 'An e-mail address looks like name@place.edu.'))

export const invitation = z.object({ name: personName, email: emailAddress })

export const courseRole = z.enum(['lead', 'instructor', 'ta', 'student'])
export const departmentRoleName = z.enum(['admin', 'technician', 'visitor'])
export const departmentRoleGrant = z.object({
  role: departmentRoleName,
  /** For a visitor: what may be read, and the last day of it. */
  courseIds: z.array(id).max(200).default([]),
  until: localDate.nullable().default(null),
}).superRefine((grant, context) => {
  if (grant.role !== 'visitor') return
  if (grant.until === null) context.addIssue({ code: 'custom', path: ['until'], message: 'A visitor reads until a stated day.' })
  if (grant.courseIds.length === 0) context.addIssue({ code: 'custom', path: ['courseIds'], message: 'Say which courses a visitor may read.' })
})

export const termName = z.string().trim().min(1, 'A term needs a name.').max(60)
export const termState = z.enum(['planned', 'running', 'closed'])

export const termDates = z.object({ name: termName, zone: zoneName, startsOn: localDate, endsOn: localDate, calendar: termCalendar }).superRefine((term, context) => {
  if (term.endsOn <= term.startsOn) context.addIssue({ code: 'custom', path: ['endsOn'], message: 'A term ends after it starts.' })
  const last = term.calendar.weeks.at(-1)
  if (last !== undefined && last > term.endsOn) context.addIssue({ code: 'custom', path: ['calendar', 'weeks'], message: `The last teaching week (${last}) starts after the term ends.` })
})
export type TermDates = z.infer<typeof termDates>

export const courseCode = z.string().trim().min(1, 'A course needs a code.').max(30).refine(text => !hasControl(text), 'A code is one line of text.')
export const sectionName = z.string().trim().min(1, 'A section needs a name.').max(30).refine(text => !hasControl(text), 'A name is one line of text.')

export const courseDraft = z.object({
  termId: id,
  code: courseCode,
  title: z.string().trim().min(1, 'A course needs a title.').max(200),
  /** Codes under which other departments list the same course. */
  alsoListedAs: z.array(courseCode).max(20).default([]),
  lateRule,
  conventionRevisionId: id.nullable().default(null),
  sections: z.array(sectionName).max(40).default([]),
  leadPersonId: id.nullable().default(null),
})

export const courseEdit = courseDraft.pick({ code: true, title: true, alsoListedAs: true, lateRule: true })

export const enrolment = z.discriminatedUnion('role', [
  z.object({ role: z.literal('student'), personId: id, sectionId: id }),
  z.object({ role: z.literal('ta'), personId: id, sectionIds: z.array(id).max(40).default([]) }),
  z.object({ role: z.literal('instructor'), personId: id }),
  z.object({ role: z.literal('lead'), personId: id }),
])
export type Enrolment = z.infer<typeof enrolment>

export const allowanceGrant = z.object({ membershipId: id, dueLocal: localDateTime, reason: z.string().trim().min(1, 'Say why.').max(500) })

/** Which columns of a roster file hold what, by their place; a name may stand in two. */
export const rosterColumns = z.object({
  email: z.number().int().min(0),
  name: z.array(z.number().int().min(0)).min(1).max(2),
  section: z.number().int().min(0).nullable(),
})
export type RosterColumns = z.infer<typeof rosterColumns>

export const rosterFile = z.object({
  text: z.string().min(1, 'The file is empty.').max(1_500_000),
  delimiter: z.enum([',', ';', '\t', '|']).nullable().default(null),
  columns: rosterColumns.nullable().default(null),
})

export const rosterChoices = z.object({
  /** Where the file names no section: everybody's section. */
  sectionId: id.nullable().default(null),
  /** Section names of the file that the course does not have yet and that are to be made. */
  makeSections: z.array(sectionName).max(40).default([]),
  /** Memberships that are in the course, are not in the file, and are to end. */
  end: z.array(id).max(5000).default([]),
})
export const rosterAsked = rosterFile.extend({ choices: rosterChoices.prefault({}) })
export const rosterCarriedOut = rosterAsked.extend({ digest: z.string().regex(/^[0-9a-f]{64}$/) })
export type RosterChoices = z.infer<typeof rosterChoices>

const refusedLine = z.object({ line: z.number().int(), text: z.string(), reason: z.string() })
export const rosterPreview = z.object({
  delimiter: z.enum([',', ';', '\t', '|']), header: z.array(z.string()), columns: rosterColumns, isGuess: z.boolean(), sample: z.array(z.array(z.string())), count: z.number().int(), rows: z.number().int(),
  course: z.object({ code: z.string(), title: z.string(), term: z.string() }),
  sections: z.array(z.object({ id: z.string(), name: z.string() })),
  adds: z.array(z.object({ line: z.number().int(), email: z.string(), name: z.string(), section: z.string(), isNew: z.boolean(), isBack: z.boolean() })),
  moves: z.array(z.object({ line: z.number().int(), membershipId: z.string(), email: z.string(), name: z.string(), from: z.string(), to: z.string() })),
  absent: z.array(z.object({ membershipId: z.string(), email: z.string(), name: z.string(), section: z.string(), ends: z.boolean() })),
  same: z.number().int(), newSections: z.array(z.string()), unknownSections: z.array(z.string()), refused: z.array(refusedLine), digest: z.string(),
})
export type RosterPreview = z.infer<typeof rosterPreview>
