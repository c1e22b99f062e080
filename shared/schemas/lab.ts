import { z } from 'zod'

/**
 * A lab's revision as an author writes it: kept in `lab_revision.body_json`, checked by the editor's form, its route and its row alike.
 * Heights are meters above the flight's datum; points are thousandths of a mark.
 */

/** How one number (or a series) is taken from a student's share. */
export const shareReading = z.enum([
  'layer', // the series of a column over the rows marked `use`
  'lowest', // the value at the lowest row of the layer
  'highest', // the value at the highest row of the layer
  'mean', // the mean of the column over the layer
  'lowBound', 'highBound', // the layer's own bounds, in meters
])

export const inputSource = z.discriminatedUnion('from', [
  z.object({ from: z.literal('share'), column: z.string().min(1).max(60), read: shareReading }),
  z.object({ from: z.literal('text'), value: z.number(), unit: z.string().max(40) }),
  z.object({ from: z.literal('constant'), name: z.string().min(1).max(40) }),
  z.object({ from: z.literal('step'), key: z.string().min(1).max(40) }),
])
export type InputSource = z.infer<typeof inputSource>

export const stepKey = z.string().regex(/^[a-z][a-z0-9-]{0,39}$/)

export const numberStep = z.object({
  key: stepKey,
  kind: z.literal('number'),
  title: z.string().trim().min(1).max(200),
  /** A sentence or two under the ask; Markdown. */
  text: z.string().max(4000).default(''),
  pointsMilli: z.number().int().min(0).max(1_000_000),
  quantity: z.string().min(1).max(80),
  variant: z.string().max(80).nullable().default(null),
  inputs: z.record(z.string(), inputSource),
  /** UCUM code in which the step asks. */
  unit: z.string().min(1).max(40),
  digits: z.number().int().min(1).max(10).default(3),
  /** What the author grants, in `unit`; relative is a fraction and refused for temperatures. */
  granted: z.object({ absolute: z.number().min(0).optional(), relative: z.number().min(0).max(1).optional() }).default({}),
  /** Part of the marks for a value that a named slip alone explains. */
  slipMilli: z.number().int().min(0).default(0),
})
export type NumberStep = z.infer<typeof numberStep>

export const leg = z.enum(['up', 'down', 'all'])

export const supplyItem = z.object({ versionId: z.string().min(1), leg, lowM: z.number(), highM: z.number() })
  .refine(item => item.highM > item.lowM, { path: ['highM'], message: 'The layer needs a top above its base.' })
export type SupplyItem = z.infer<typeof supplyItem>

export const labBody = z.object({
  title: z.string().trim().min(1).max(200),
  /** Markdown with TeX. */
  text: z.string().max(40_000).default(''),
  supply: z.array(supplyItem).max(500),
  steps: z.array(numberStep).max(60),
}).superRefine((body, context) => {
  const seen = new Set<string>()
  body.steps.forEach((step, at) => {
    if (seen.has(step.key)) context.addIssue({ code: 'custom', path: ['steps', at, 'key'], message: 'Two steps have this key.' })
    for (const [name, source] of Object.entries(step.inputs)) {
      if (source.from === 'step' && !seen.has(source.key)) context.addIssue({ code: 'custom', path: ['steps', at, 'inputs', name], message: 'An input can come from an earlier step only.' })
    }
    seen.add(step.key)
  })
})
export type LabBody = z.infer<typeof labBody>

/** The four late rules of a course. `none` keeps late work and gives nothing for it unless staff accept it. */
export const lateRule = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('none') }),
  z.object({ kind: z.literal('open'), closesAfterDays: z.number().int().min(1).max(400) }),
  z.object({ kind: z.literal('of_earned'), percent: z.number().min(0).max(100), closesAfterDays: z.number().int().min(1).max(400) }),
  z.object({ kind: z.literal('of_maximum'), percent: z.number().min(0).max(100), closesAfterDays: z.number().int().min(1).max(400) }),
])
export type LateRule = z.infer<typeof lateRule>

/** A wall time to the minute, in the term's zone. */
export const wallTime = z.string().regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}$/, 'A date and a time, to the minute.')

/** A lab given to sections: their dates, one late rule, attempts and feedback. */
export const postingBody = z.object({
  sections: z.array(z.object({ sectionId: z.string().min(1), opensLocal: wallTime, dueLocal: wallTime })).min(1, 'Choose at least one section.').max(100),
  /** The course's own rule where it is left out. */
  lateRule: lateRule.optional(),
  attempts: z.number().int().min(1).max(20).default(3),
  keep: z.enum(['last', 'best']).default('best'),
  feedback: z.enum(['at_once', 'after_release']).default('after_release'),
})
export type PostingBody = z.infer<typeof postingBody>
