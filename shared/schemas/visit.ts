import { z } from 'zod'
import { judgedAs } from './marks'

const count = z.number().int().min(0)
const milli = z.number().int()

export const visitedWork = z.object({
  pseudonym: z.string(), totalMilli: milli,
  values: z.array(z.object({ key: z.string(), /** As it was read; empty where nothing could be. */ read: z.string(), judged: judgedAs, pointsMilli: milli })),
})
export const visitedPosting = z.object({
  id: z.string(), title: z.string(), section: z.string(), students: count, handedIn: count, meanMilli: milli.nullable(), maxMilli: milli,
  steps: z.array(z.object({ key: z.string(), no: count, title: z.string(), maxMilli: milli, within: count, outside: count })),
  pieces: z.array(visitedWork),
})
/** What a visitor reads: a stated scope, until a stated day. */
export const visit = z.object({
  /** The last day of it where the department keeps its clock. */
  lastDay: z.string(),
  courses: z.array(z.object({ id: z.string(), code: z.string(), title: z.string(), term: z.string(), postings: z.array(visitedPosting) })),
})
export type VisitedWork = z.output<typeof visitedWork>
export type VisitedPosting = z.output<typeof visitedPosting>
export type Visit = z.output<typeof visit>
