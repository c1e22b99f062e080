import { z } from 'zod'

const constants = z.record(z.string().min(1).max(40), z.number())
const variants = z.record(z.string().min(1).max(80), z.string().min(1).max(60))

/** A set of constants and formulae that a course teaches with: kept as a row, checked by the form, the route and the row alike. */
export const conventionBody = z.object({
  key: z.string().regex(/^[a-z][a-z0-9-]{0,39}$/),
  title: z.string().trim().min(1, 'Give it a title.').max(120, 'At most 120 characters.'),
  source: z.string().trim().min(1, 'Say where its numbers come from.').max(400, 'At most 400 characters.'),
  constants,
  variants,
  /** What is done beyond the stated range of a formula. */
  beyond: z.enum(['compute', 'next', 'refuse']).optional(),
  accepted: z.array(z.object({ label: z.string().min(1).max(120), group: z.string().min(1).max(40).optional(), constants: constants.optional(), variants: variants.optional() })).max(60),
})

/** What a lead chooses: one of the house's conventions by its key, or the course's own. */
export const conventionChoice = z.discriminatedUnion('is', [
  z.object({ is: z.literal('named'), key: z.string().min(1).max(40) }),
  z.object({ is: z.literal('own'), convention: conventionBody.omit({ key: true }) }),
])
export type ConventionChoice = z.input<typeof conventionChoice>

export const courseConventionReply = z.object({
  version: z.number().int(), revisionNo: z.number().int(), isOwn: z.boolean(), mayChange: z.boolean(), convention: conventionBody,
  named: z.array(z.object({ key: z.string(), title: z.string(), convention: conventionBody })),
  constants: z.array(z.object({ name: z.string(), symbolHtml: z.string(), label: z.string(), unit: z.string(), low: z.number(), high: z.number(), isOptional: z.boolean() })),
  quantities: z.array(z.object({ key: z.string(), name: z.string(), variants: z.array(z.object({ key: z.string(), label: z.string() })) })),
})
export type CourseConvention = z.output<typeof courseConventionReply>
