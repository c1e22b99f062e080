import { z } from 'zod'

/** Marks and what explains them. Values are in the unit that the step asks in; points are thousandths of a mark. */

const instant = z.iso.datetime()

export const bandPart = z.object({ key: z.enum(['granted', 'formulae', 'rounding', 'carried', 'reading', 'accepted']), label: z.string(), below: z.number(), above: z.number() })

/** What the height bar draws. */
export const heightBar = z.object({
  unit: z.string(),
  low: z.number(), center: z.number(), high: z.number(),
  /** The edges as decimals: what a typed value is compared with. */
  lowText: z.string(), highText: z.string(),
  parts: z.array(bandPart),
  value: z.number().nullable(),
  /** Decimals that values are shown with: one more than the asked digits of the worked value. */
  digits: z.number().int(),
  /** Values that a slip would give. */
  ghosts: z.array(z.object({ label: z.string(), value: z.number() })),
})
export type HeightBar = z.infer<typeof heightBar>

/** How a value came out, always with a word. */
export const judgedAs = z.enum(['within', 'above', 'below', 'right', 'wrong', 'accepted', 'empty', 'not_read', 'not_judged'])
export type JudgedAs = z.infer<typeof judgedAs>

export const workedLine = z.object({ text: z.string(), formulaHtml: z.string(), filledHtml: z.string() })

export const markedStep = z.object({
  key: z.string(), no: z.number().int(), title: z.string(), ask: z.string(),
  typed: z.string(), readAs: z.string(),
  judged: judgedAs,
  pointsMilli: z.number().int(), maxMilli: z.number().int(),
  bar: heightBar.nullable(),
  /** The band that follows from the student's own earlier value, where it was carried. */
  carriedBar: heightBar.nullable(),
  carriedNote: z.string().nullable(),
  /** Why not full marks, in the student's own numbers. */
  slip: z.object({ key: z.string(), label: z.string(), sentence: z.string() }).nullable(),
  /** The worked value: a number in the step's unit, or "none", "not reached", "not defined", or a class. */
  worked: z.object({ value: z.string(), unit: z.string(), reason: z.string().nullable(), lines: z.array(workedLine) }),
  notes: z.array(z.string()),
})
export type MarkedStep = z.infer<typeof markedStep>

export const markHistoryEntry = z.object({
  seq: z.number().int(), at: instant, stepKey: z.string(), cause: z.enum(['submission', 'text_marking', 'ruling', 'appeal', 'run', 'undo']),
  beforeMilli: z.number().int().nullable(), afterMilli: z.number().int(), maxMilli: z.number().int(),
  by: z.string().nullable(), role: z.string().nullable(), reason: z.string().nullable(),
})
export type MarkHistoryEntry = z.infer<typeof markHistoryEntry>

/** Where a lab stands for one student. Excused, not counted, missing and unreleased are different things. */
export const labStanding = z.enum(['open', 'submitted', 'late_open', 'missing', 'excused', 'not_counted', 'released', 'withdrawn'])
export type LabStanding = z.infer<typeof labStanding>

export const myLabMarks = z.object({
  labId: z.string(), title: z.string(), standing: labStanding, dueAt: instant, zone: z.string(), releasedAt: instant.nullable(),
  submissionId: z.string().nullable(), attempt: z.number().int().nullable(), submittedAt: instant.nullable(), lateDays: z.number().int().nullable(),
  /** Null until released, and where nothing counts. */
  totalMilli: z.number().int().nullable(), earnedMilli: z.number().int().nullable(), maxMilli: z.number().int(),
})
export type MyLabMarks = z.infer<typeof myLabMarks>

export const submissionMarks = z.object({
  submissionId: z.string(), labId: z.string(), labTitle: z.string(), revisionNo: z.number().int(), receiptNo: z.string(), attempt: z.number().int(), counts: z.boolean(),
  submittedAt: instant, zone: z.string(), lateDays: z.number().int(), lateWords: z.string(), releasedAt: instant.nullable(),
  /** False where only right or not is told yet: feedback at once, before release. */
  isWhole: z.boolean(),
  /** Until then a step can be objected to; null while marks are not released. */
  objectUntil: instant.nullable(),
  earnedMilli: z.number().int(), maxMilli: z.number().int(), totalMilli: z.number().int(),
  reference: z.string(), convention: z.string(), shareNo: z.number().int(),
  steps: z.array(markedStep),
  history: z.array(markHistoryEntry),
})
export type SubmissionMarks = z.infer<typeof submissionMarks>

export const classDot = z.object({
  submissionId: z.string(), name: z.string(),
  /** Distance from the reference of the student's own share, in half-widths of the band on that side; null where there is no number. */
  offset: z.number().nullable(),
  judged: judgedAs, slip: z.string().nullable(),
})
export type ClassDot = z.infer<typeof classDot>
export const classStep = z.object({
  key: z.string(), no: z.number().int(), title: z.string(), maxMilli: z.number().int(),
  within: z.number().int(), outside: z.number().int(), empty: z.number().int(), notRead: z.number().int(),
  /** The parts of the first share's band, as fractions of its half-widths, for the drawing. */
  parts: z.array(z.object({ key: z.string(), label: z.string(), below: z.number(), above: z.number() })),
  dots: z.array(classDot),
})
export type ClassStep = z.infer<typeof classStep>

export const classView = z.object({
  posting: z.object({ id: z.string(), labId: z.string(), section: z.string(), version: z.number().int(), dueAt: instant, closesAt: instant.nullable(), zone: z.string(), releasedAt: instant.nullable(), state: z.string() }),
  lab: z.object({ title: z.string(), revisionNo: z.number().int() }),
  students: z.number().int(), handedIn: z.number().int(), late: z.number().int(), missing: z.number().int(), excused: z.number().int(), mayStillSubmit: z.number().int(),
  meanMilli: z.number().int().nullable(), maxMilli: z.number().int(),
  steps: z.array(classStep),
  slips: z.array(z.object({ key: z.string(), label: z.string(), stepNo: z.number().int(), students: z.number().int() })),
  people: z.array(z.object({ membershipId: z.string(), name: z.string(), standing: labStanding, submissionId: z.string().nullable(), totalMilli: z.number().int().nullable(), lateDays: z.number().int().nullable(), claimedSentAt: instant.nullable() })),
})
export type ClassView = z.infer<typeof classView>

export const marksTable = z.object({
  sections: z.array(z.object({ id: z.string(), name: z.string() })), sectionId: z.string().nullable(),
  labs: z.array(z.object({ id: z.string(), postingId: z.string(), title: z.string(), releasedAt: instant.nullable() })),
  rows: z.array(z.object({
    membershipId: z.string(), name: z.string(),
    cells: z.array(z.object({ labId: z.string(), standing: labStanding, submissionId: z.string().nullable(), totalMilli: z.number().int().nullable(), maxMilli: z.number().int().nullable(), lateDays: z.number().int() })),
  })),
})
export type MarksTable = z.infer<typeof marksTable>
