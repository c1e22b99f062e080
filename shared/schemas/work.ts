import { z } from 'zod'
import { lateRule } from './lab'
import { fieldPlan } from './labParts'
import { stepKey } from './steps'
import { labStanding } from './marks'

/** What a student sends while working and when submitting: one definition for form, route and row. */

/** A typed answer. A field holds a number and its unit; 400 characters are more than any needs. */
export const typedText = z.string().max(400, 'Longer than a value with its unit: at most 400 characters.')

export const draftBody = z.object({
  typed: typedText,
  /** The saved version that this text was typed over; 0 where nothing was saved yet. */
  baseVersion: z.number().int().min(0),
})
export type DraftBody = z.infer<typeof draftBody>

export const savedDraft = z.object({ stepKey: z.string(), typed: z.string(), version: z.number().int(), savedAt: z.iso.datetime() })
export type SavedDraft = z.infer<typeof savedDraft>

export const checkBody = z.object({ stepKey, typed: typedText })

/** How a typed value is read. It says nothing of what is right. */
export const readBack = z.object({
  reading: z.enum(['ok', 'class', 'none', 'not_reached', 'not_defined', 'empty', 'unreadable', 'wrong_dimension', 'ambiguous']),
  /** "read as −9.6 K km⁻¹", or what is wrong and what is asked. */
  message: z.string(),
})
export type ReadBack = z.infer<typeof readBack>

export const submissionBody = z.object({
  answers: z.record(stepKey, typedText),
  /** When the device says it was sent, where it could not be sent at once: a claim, kept beside the server's own time. */
  claimedSentAt: z.iso.datetime().optional(),
})
export type SubmissionBody = z.infer<typeof submissionBody>

/** The proof of a submission. The digest is that of its entry in the course's ledger. */
export const receipt = z.object({
  no: z.string(),
  at: z.iso.datetime(),
  digest: z.string().regex(/^[0-9a-f]{64}$/),
  ledger: z.object({ chain: z.string(), seq: z.number().int() }),
})
export type Receipt = z.infer<typeof receipt>

export const submissionReply = z.object({ submissionId: z.string(), attempt: z.number().int(), receipt, lateDays: z.number().int() })
export type SubmissionReply = z.infer<typeof submissionReply>

export const workListEntry = z.object({
  labId: z.string(), postingId: z.string(), shareId: z.string().nullable(), title: z.string(),
  /** The person's own: the latest of section, extension and accommodation. */
  dueAt: z.iso.datetime(), isOwnDue: z.boolean(), closesAt: z.iso.datetime().nullable(), zone: z.string(), lateRule,
  attempts: z.number().int(), attemptsMade: z.number().int(), keep: z.enum(['last', 'best']),
  steps: z.number().int(), saved: z.number().int(), maxMilli: z.number().int(),
  last: z.object({ receiptNo: z.string(), at: z.iso.datetime(), lateDays: z.number().int() }).nullable(),
  standing: labStanding,
})
export type WorkListEntry = z.infer<typeof workListEntry>

export const submissionListEntry = z.object({ submissionId: z.string(), attempt: z.number().int(), receiptNo: z.string(), at: z.iso.datetime(), lateDays: z.number().int() })
export type SubmissionListEntry = z.infer<typeof submissionListEntry>

/** A column with the digits of its file; an empty text is a missing value. */
export const servedColumn = z.object({ name: z.string(), quantity: z.string(), unit: z.string(), texts: z.array(z.string()) })

export const workStep = z.object({
  key: stepKey, no: z.number().int(), title: z.string(), ask: z.string(), textHtml: z.string(), pointsMilli: z.number().int(), unit: z.string(), digits: z.number().int(),
  kind: z.enum(['number', 'diagram', 'reading', 'fit', 'table', 'choice']),
  /** The fit or table that it is a part of, and its place there. */
  block: z.object({ key: z.string(), title: z.string(), part: z.string(), row: z.number().int().nullable(), /** The row of the data that a row of a table is about. */ dataRow: z.number().int().nullable() }).nullable(),
  /** What is read off the plot of the share, and how finely its axis is divided. */
  readOff: z.object({ column: z.string(), division: z.number(), unit: z.string() }).nullable(),
  /** For a choice: what can be chosen, in the author's order. */
  options: z.array(z.object({ key: z.string(), html: z.string() })), isSeveral: z.boolean(),
  /** Numbers of the earlier steps from which this one goes on. */
  from: z.array(z.number().int()),
})
export type WorkStep = z.infer<typeof workStep>

/** Everything on a student's work page. No reference, no band, no other student. */
export const work = z.object({
  share: z.object({ id: z.string(), no: z.number().int(), lowM: z.number(), highM: z.number(), leg: z.string(), dataSet: z.string() }),
  lab: z.object({ id: z.string(), title: z.string(), revisionNo: z.number().int(), textHtml: z.string(), maxMilli: z.number().int(), aims: z.array(z.string()), fieldPlan: fieldPlan.nullable(), hasPractice: z.boolean() }),
  convention: z.object({ title: z.string(), constants: z.array(z.object({ name: z.string(), label: z.string(), value: z.number(), unit: z.string() })) }),
  opensAt: z.iso.datetime(), dueAt: z.iso.datetime(), isOwnDue: z.boolean(), closesAt: z.iso.datetime().nullable(), zone: z.string(), lateRule,
  attempts: z.number().int(), keep: z.enum(['last', 'best']), feedback: z.enum(['at_once', 'after_release']), isReleased: z.boolean(),
  steps: z.array(workStep),
  rows: z.object({ times: z.array(z.string()), use: z.array(z.boolean()), columns: z.array(servedColumn) }),
  drafts: z.array(savedDraft),
  made: z.array(submissionListEntry),
  /** Why nothing can be handed in now; null when it can. */
  stopped: z.enum(['lab_closed', 'attempts_used', 'marks_shown', 'term_closed']).nullable(),
  now: z.iso.datetime(),
})
export type Work = z.infer<typeof work>

/** What was handed in, as its student may always see it: no mark, no band. */
export const submissionSent = z.object({
  submissionId: z.string(), courseId: z.string(), courseCode: z.string(), shareId: z.string(), labId: z.string(), labTitle: z.string(), attempt: z.number().int(),
  by: z.string(), at: z.iso.datetime(), dueAt: z.iso.datetime(), zone: z.string(), lateDays: z.number().int(), lateWords: z.string(), receipt,
  answers: z.array(z.object({ stepKey: z.string(), no: z.number().int(), title: z.string(), typed: z.string(), readAs: z.string(), reading: readBack.shape.reading })),
})
export type SubmissionSent = z.infer<typeof submissionSent>
