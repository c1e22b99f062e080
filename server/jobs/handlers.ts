import { z } from 'zod'
import { sendReset } from '../domain/people/sendReset'
import type { JobHandler } from './runner'

/** What does each kind of background work. */
export const handlers: Readonly<Record<string, JobHandler>> = {
  passphrase_reset: ({ stores, payload, jobId, now }) => sendReset(stores, { ...z.object({ email: z.string().default('') }).parse(payload), jobId }, now()),
}
