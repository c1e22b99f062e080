import { z } from 'zod'
import { labState } from './labReplies'
import { labKind } from './labParts'

/** What a new draft begins from. Nothing at all is a draft with a title alone, which is made like any other. */
export const labBeginning = z.discriminatedUnion('from', [
  z.object({ from: z.literal('library'), key: z.string().min(1).max(60) }),
  z.object({ from: z.literal('earlier'), labId: z.string().min(1).max(60) }),
  z.object({ from: z.literal('text'), text: z.string().min(1, 'The text is empty.').max(1_500_000, 'This text is longer than any lab can be.') }),
])
export type LabBeginning = z.infer<typeof labBeginning>

export const labBeginningsReply = z.object({
  ready: z.array(z.object({
    key: z.string(), title: z.string(), kind: labKind.nullable(), minutes: z.number().nullable(), aims: z.array(z.string()), steps: z.number(), pointsMilli: z.number(),
    goesOut: z.boolean(), hasPractice: z.boolean(), needs: z.array(z.string()), missing: z.array(z.string()), layers: z.number(),
  })),
  earlier: z.array(z.object({ labId: z.string(), title: z.string(), course: z.string(), term: z.string(), state: labState })),
  /** Flights that were looked at. */
  flights: z.number(),
})

/** `left` counts shares that came with the lab and are of no flight of this course. */
export const labBegunReply = z.object({ id: z.string(), revisionId: z.string(), version: z.number(), shares: z.number(), left: z.number() })
