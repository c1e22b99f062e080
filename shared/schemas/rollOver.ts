import { z } from 'zod'
import { localDateTime, termCalendar } from './calendar'
import { termDates } from './department'

/** What an admin chooses before the next term starts from the running one. */
export const rollOverChoices = z.object({
  /** Courses, and labs of courses that come along, that stay behind. */
  leaveOut: z.array(z.string().max(60)).max(2000).default([]),
  /** Times chosen by hand, in place of the moved ones. */
  dates: z.array(z.object({ postingId: z.string().max(60), opensLocal: localDateTime, dueLocal: localDateTime })).max(5000).default([]),
})
export type RollOverChoices = z.infer<typeof rollOverChoices>

export const rollOverAsked = z.object({ fromTermId: z.string().min(1).max(60), term: termDates, choices: rollOverChoices.prefault({}) })
export const rollOverStarted = rollOverAsked.extend({ digest: z.string().regex(/^[0-9a-f]{64}$/) })
export type RollOverAsked = z.infer<typeof rollOverAsked>

const whichTime = z.enum(['opens', 'due'])

/** What the plan has to tell of a date: a sentence is made of it where it is shown. */
export const dateNote = z.discriminatedUnion('kind', [
  /** It would have fallen on a day without classes. */
  z.object({ kind: z.literal('holiday'), which: whichTime, date: z.string(), name: z.string() }),
  /** The clock skips that time, or shows it twice. */
  z.object({ kind: z.literal('clock'), which: whichTime, told: z.string() }),
  /** The new term has no such teaching week. */
  z.object({ kind: z.literal('no_such_week'), which: whichTime, week: z.number() }),
  z.object({ kind: z.literal('outside_term'), which: whichTime, date: z.string() }),
  z.object({ kind: z.literal('chosen') }),
])
export type DateNote = z.infer<typeof dateNote>

export const plannedPosting = z.object({
  fromId: z.string(), sectionFromId: z.string(), section: z.string(),
  was: z.object({ opensLocal: z.string(), dueLocal: z.string(), dueWeek: z.number() }),
  becomes: z.object({ opensLocal: z.string(), dueLocal: z.string(), opensAt: z.number(), dueAt: z.number(), dueWeek: z.number() }),
  notes: z.array(dateNote),
  /** A date that cannot stand: the term does not start until it is changed or the lab is left out. */
  problem: z.string().nullable(),
})
export type PlannedPosting = z.infer<typeof plannedPosting>

export const plannedLab = z.object({
  fromId: z.string(), title: z.string(), revisionId: z.string(), revisionNo: z.number(), revisionDigest: z.string(), isLeftOut: z.boolean(), postings: z.array(plannedPosting),
})

export const plannedCourse = z.object({
  fromId: z.string(), code: z.string(), title: z.string(), alsoListedAs: z.array(z.string()), isLeftOut: z.boolean(),
  sections: z.array(z.object({ fromId: z.string(), name: z.string() })),
  staff: z.array(z.object({ fromId: z.string(), personId: z.string(), name: z.string(), role: z.enum(['lead', 'instructor', 'ta']), sections: z.array(z.string()) })),
  labs: z.array(plannedLab),
  /** What does not come along by itself, and why. */
  staysBehind: z.array(z.object({ what: z.string(), why: z.string() })),
})
export type PlannedCourse = z.infer<typeof plannedCourse>

export const termPlan = z.object({
  from: z.object({ id: z.string(), name: z.string(), startsOn: z.string(), endsOn: z.string(), zone: z.string(), calendar: termCalendar }),
  to: termDates,
  courses: z.array(plannedCourse),
  /** Stays in the old term, as it is. Counted for reading; not part of what is carried out. */
  kept: z.object({ students: z.number(), submissions: z.number() }),
  counts: z.object({ courses: z.number(), sections: z.number(), staff: z.number(), labs: z.number(), dates: z.number(), toldDates: z.number(), problems: z.number() }),
  digest: z.string(),
})
export type TermPlan = z.infer<typeof termPlan>
