import { z } from 'zod'

/** Background work and mail, as their pages show them. */
const count = z.number().int()

export const jobState = z.enum(['waiting', 'leased', 'done', 'failed', 'cancelled'])
export const jobPage = z.object({
  jobs: z.array(z.object({
    id: z.string(), kind: z.string(), state: jobState, attempts: count, course: z.string().nullable(), by: z.string().nullable(), doneUnits: count, allUnits: count.nullable(), createdAt: z.string(), runAfter: z.string(), error: z.string().nullable(),
  })),
  counts: z.record(jobState, count),
})
export type JobPage = z.output<typeof jobPage>

export const mailState = z.enum(['waiting', 'sent', 'dead'])
export const mailPage = z.object({
  mails: z.array(z.object({ id: z.string(), template: z.string(), to: z.string(), state: mailState, attempts: count, nextAt: z.string(), madeAt: z.string() })),
  counts: z.record(mailState, count),
  next: z.string().nullable(),
})
export type MailPage = z.output<typeof mailPage>
