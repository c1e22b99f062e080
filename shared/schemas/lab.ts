import { z } from 'zod'
import { askedOf, askedSteps } from './askedSteps'
import { labParts, leg } from './labParts'
import { labStep } from './steps'

/** Every entry is asked, judged and proved by itself on every share. */
const mostEntries = 200

/**
 * A lab's revision as an author writes it: kept in `lab_revision.body_json`, checked by the editor's form, its route and its row alike.
 * Heights are meters above the flight's datum; points are thousandths of a mark.
 */

export const supplyItem = z.object({ versionId: z.string().min(1), leg, lowM: z.number(), highM: z.number() })
  .refine(item => item.highM > item.lowM, { path: ['highM'], message: 'The layer needs a top above its base.' })
export type SupplyItem = z.infer<typeof supplyItem>

export const labBody = z.object({
  title: z.string().trim().min(1).max(200),
  /** Markdown with TeX. */
  text: z.string().max(40_000).default(''),
  supply: z.array(supplyItem).max(500),
  steps: z.array(labStep).max(60),
  ...labParts,
}).superRefine((body, context) => {
  const entries = askedSteps(body).length
  if (entries > mostEntries) context.addIssue({ code: 'custom', path: ['steps'], message: `A lab asks at most ${mostEntries} entries, and this one asks ${entries}: a table asks one in each of its cells.` })
  /** Keys of what is asked so far, and of the steps that are made of parts. */
  const asked = new Set<string>(), taken = new Set<string>()
  body.steps.forEach((step, at) => {
    const parts = askedOf(step)
    const keys = [...new Set([step.key, ...parts.map(part => part.key)])]
    if (keys.some(key => taken.has(key))) context.addIssue({ code: 'custom', path: ['steps', at, 'key'], message: 'Two steps have this key.' })
    for (const key of keys) taken.add(key)
    for (const part of parts) {
      for (const [name, source] of Object.entries(part.kind === 'choice' ? {} : part.inputs)) {
        if (source.from === 'step' && !asked.has(source.key)) context.addIssue({ code: 'custom', path: ['steps', at, 'inputs', name], message: 'An input can come from an earlier step only.' })
      }
      asked.add(part.key)
    }
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
