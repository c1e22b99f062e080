import { z } from 'zod'
import { localDateTime } from './calendar'
import { labStanding } from './marks'

/** What staff may do for one student of a course, and what the page of that student shows. */

const id = z.string().min(1)
const instant = z.iso.datetime()
/** Everybody whom it is about may ask to read it. */
export const repairReason = z.string().trim().min(1, 'Say why.').max(500, 'At most 500 characters.')

export const repairBody = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('extension'), labId: id, dueLocal: localDateTime, reason: repairReason }),
  /** An effect alone: no ground is asked for, and none is kept. */
  z.object({ kind: z.literal('accommodation'), extraDays: z.number({ error: 'A whole number of days.' }).int('A whole number of days.').min(0, 'At least 0 days.').max(60, 'At most 60 days.') }),
  z.object({ kind: z.enum(['excused', 'counted', 'not_counted']), labId: id, reason: repairReason }),
  z.object({ kind: z.literal('attempt'), labId: id, reason: repairReason }),
  z.object({ kind: z.literal('section'), sectionId: id, reason: repairReason }),
])
export type RepairBody = z.infer<typeof repairBody>

/**
 * `due`: the student's due moved since the work came, and the late rule counts from it; `claim`: it counts from the device's own time;
 * `work`: late work is accepted where the rule keeps it and gives nothing.
 */
export const lateWorkWay = z.enum(['due', 'claim', 'work'])
export type LateWorkWay = z.infer<typeof lateWorkWay>
export const lateWorkBody = z.object({ submissionId: id, accepts: lateWorkWay, reason: repairReason })
export type LateWorkBody = z.infer<typeof lateWorkBody>

/** Sentences for whoever did it: what it came to, and what they may not have expected. */
export const repairTold = z.object({ told: z.array(z.string()) })
export type RepairTold = z.infer<typeof repairTold>

export const repairEntry = z.object({
  id: z.string(), at: instant, zone: z.string(), kind: z.enum(['extension', 'accommodation', 'excused', 'counted', 'not_counted', 'attempt', 'moved', 'lateness']), labTitle: z.string().nullable(),
  dueAt: instant.nullable(), extraDays: z.number().int().nullable(), lateDays: z.number().int().nullable(),
  /** Null where none is asked for, as with an accommodation. */
  reason: z.string().nullable(), by: z.string(),
})
export type RepairEntry = z.infer<typeof repairEntry>

/** Where a due time comes from: the latest of them is the person's own. */
export const dueSource = z.enum(['section', 'extension', 'accommodation', 'late_add', 'moved_section'])
export type DueSource = z.infer<typeof dueSource>

export const soFar = z.object({ labs: z.number().int(), earnedMilli: z.number().int(), maxMilli: z.number().int() })
export type SoFar = z.infer<typeof soFar>

export const memberAttempt = z.object({
  submissionId: z.string(), attempt: z.number().int(), receiptNo: z.string(), at: instant, lateDays: z.number().int(), claimedSentAt: instant.nullable(), isCounting: z.boolean(),
  /** The grounds on which staff can accept it; none where there is nothing to accept. */
  accepts: z.array(lateWorkWay), isAccepted: z.boolean(), totalMilli: z.number().int(),
})
export const memberLab = z.object({
  labId: z.string(), title: z.string(), zone: z.string(), sectionDueAt: instant, dueAt: instant, dueLocal: z.string(), dueFrom: dueSource, opensAt: instant, closesAt: instant.nullable(),
  attempts: z.number().int(), granted: z.number().int(), made: z.array(memberAttempt), standing: labStanding, releasedAt: instant.nullable(), maxMilli: z.number().int(), totalMilli: z.number().int().nullable(),
})
export type MemberLab = z.infer<typeof memberLab>
export const memberPage = z.object({
  course: z.object({ code: z.string(), title: z.string(), term: z.string(), zone: z.string() }),
  member: z.object({ id: z.string(), name: z.string(), email: z.string(), sectionId: z.string(), section: z.string(), extraDays: z.number().int() }),
  sections: z.array(z.object({ id: z.string(), name: z.string() })),
  mayRepair: z.boolean(), mayAcceptLate: z.boolean(),
  labs: z.array(memberLab), repairs: z.array(repairEntry), soFar,
})
export type MemberPage = z.infer<typeof memberPage>
