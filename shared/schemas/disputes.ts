import { z } from 'zod'
import { markedStep, markHistoryEntry } from './marks'

/** Disputes and rulings: one definition for form, route and row. */

const instant = z.iso.datetime()
const reason = z.string().trim().min(1, 'Say why.').max(10_000, 'At most 10,000 characters.')

export const openDisputeBody = z.object({ stepKey: z.string().min(1).max(40), reason })
export type OpenDisputeBody = z.infer<typeof openDisputeBody>

/** What a ruling can accept for a step: a reading that a slip names, or another variant of the reference. */
export const acceptable = z.object({ kind: z.enum(['slip', 'variant']), key: z.string().min(1).max(80) })
export type Acceptable = z.infer<typeof acceptable>

export const rulingBody = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('uphold'), reason }),
  z.object({ kind: z.literal('change'), reason, pointsMilli: z.number().int().min(0) }),
  z.object({ kind: z.literal('accept'), reason, accept: acceptable }),
  z.object({ kind: z.literal('fault'), reason }),
])
export type RulingBody = z.infer<typeof rulingBody>

export const disputeState = z.enum(['open', 'taken', 'ruled', 'appealed', 'closed', 'withdrawn'])

export const disputeLine = z.object({
  id: z.string(), version: z.number().int(), state: disputeState, openedAt: instant, zone: z.string(),
  labTitle: z.string(), stepNo: z.number().int(), stepTitle: z.string(), student: z.string(), section: z.string().nullable(),
  takenBy: z.string().nullable(), ruledBy: z.string().nullable(), kind: z.enum(['uphold', 'change', 'accept', 'fault']).nullable(),
  pointsMilli: z.number().int(), maxMilli: z.number().int(),
  /** Only the instructor rules on it now. */
  isForInstructor: z.boolean(),
})
export type DisputeLine = z.infer<typeof disputeLine>

export const likeCase = z.object({ submissionId: z.string(), student: z.string(), shareNo: z.number().int(), typed: z.string(), beforeMilli: z.number().int(), afterMilli: z.number().int(), hasAsked: z.boolean() })

export const disputeNote = z.object({ by: z.string(), at: instant, text: z.string(), file: z.object({ digest: z.string(), name: z.string(), size: z.number().int() }).nullable() })

export const disputeDetail = z.object({
  id: z.string(), version: z.number().int(), state: disputeState, openedAt: instant, zone: z.string(), courseId: z.string(),
  lab: z.object({ id: z.string(), title: z.string(), revisionNo: z.number().int() }),
  submission: z.object({ id: z.string(), receiptNo: z.string(), attempt: z.number().int(), at: instant, lateDays: z.number().int() }),
  student: z.string(), section: z.string().nullable(),
  share: z.object({ id: z.string(), no: z.number().int(), lowM: z.number(), highM: z.number(), leg: z.string(), dataSet: z.string() }),
  step: markedStep,
  convention: z.string(), reference: z.string(),
  /** Height against the column that the step reads, for the small plots; empty where it reads none. */
  plot: z.object({ quantity: z.string(), unit: z.string(), heights: z.array(z.number()), values: z.array(z.number()) }).nullable(),
  notes: z.array(disputeNote),
  history: z.array(markHistoryEntry),
  rulings: z.array(z.object({ level: z.enum(['first', 'appeal']), kind: z.enum(['uphold', 'change', 'accept', 'fault']), reason: z.string(), by: z.string(), at: instant })),
  takenBy: z.string().nullable(), isMine: z.boolean(),
  /** Null where the asker may rule; else why not. */
  mayNotRule: z.enum(['own_work', 'goes_to_instructor', 'dispute_closed', 'not_allowed', 'term_closed']).nullable(),
  /** What could be accepted, and whose marks it would move; empty for students. */
  options: z.array(acceptable.extend({ label: z.string(), cases: z.array(likeCase) })),
  earlierRulings: z.array(z.object({ disputeId: z.string(), stepNo: z.number().int(), kind: z.string(), reason: z.string(), by: z.string(), at: instant })),
})
export type DisputeDetail = z.infer<typeof disputeDetail>
