import { z } from 'zod'
import { servedReply } from './labReplies'
import { heightBar, judgedAs, markedStep } from './marks'
import { stepKey } from './steps'
import { typedText } from './work'

/** The practice of a lab: unmarked, on readings that come with the lab, with the worked answer of a step after a try at it. */
export const practice = z.object({
  title: z.string(), served: servedReply,
  steps: z.array(z.object({
    key: z.string(), no: z.number().int(), title: z.string(), ask: z.string(), textHtml: z.string(),
    /** It can be tried here; else it is the same for everybody, and is found with one's own data alone. */
    isTried: z.boolean(),
    /** What would be read outdoors: here it is given. */
    isOwnReading: z.boolean(),
  })),
})
export type Practice = z.infer<typeof practice>

export const practiceTry = z.object({ stepKey, /** What stands in the practice's fields, by step. */ typed: z.record(stepKey, typedText) })
export type PracticeTry = z.infer<typeof practiceTry>

/** `worked` is null until something was typed that can be read. */
export const triedStep = z.object({ readAs: z.string(), judged: judgedAs, worked: markedStep.shape.worked.nullable(), bar: heightBar.nullable(), slip: z.string().nullable() })
export type TriedStep = z.infer<typeof triedStep>
