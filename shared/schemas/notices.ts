import { z } from 'zod'

/** A path of our own pages: what a mail links to. */
const ownPath = z.string().regex(/^\/(?!\/)[\w\-./~%]*$/).max(300)
const label = z.string().max(300)

/**
 * What each mail is told, as it stands in the outbox: ids, labels and instants, no names of other people and no reasons,
 * so that nothing there needs erasing. A token is never in it: the mail makes it from `tokenId`.
 */
export const noticeFacts = {
  receipt: z.object({ course: label, lab: label, receiptNo: z.string(), at: z.int(), zone: z.string(), digest: z.string().regex(/^[0-9a-f]{64}$/), chain: z.string(), seq: z.int(), path: ownPath }),
  dispute_opened: z.object({ course: label, lab: label, step: label.optional(), path: ownPath }),
  dispute_ruled: z.object({ course: label, lab: label, step: label.optional(), kind: z.enum(['uphold', 'change', 'accept', 'fault']).optional(), path: ownPath }),
  marks_released: z.object({ course: label, lab: label, path: ownPath }),
  repair: z.object({ course: label, lab: label.nullable(), kind: z.enum(['extension', 'accommodation', 'excused', 'counted', 'not_counted', 'attempt', 'moved', 'lateness']), dueAt: z.int().nullable(), zone: z.string(), path: ownPath }),
  invitation: z.object({ tokenId: z.string() }),
  passphrase_reset: z.object({ tokenId: z.string() }),
  passphrase_changed: z.object({ at: z.int() }),
} as const

export type NoticeTemplate = keyof typeof noticeFacts
export type NoticeFacts<Template extends NoticeTemplate> = z.output<(typeof noticeFacts)[Template]>
/** A template together with the facts that it needs. */
export type NoticeContent = { [T in NoticeTemplate]: { template: T, facts: NoticeFacts<T> } }[NoticeTemplate]
