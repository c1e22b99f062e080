import { z } from 'zod'
import { refuse } from '#shared/errors'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { caughtMails } from '../../utils/useMachinery'

export default defineApiHandler({
  action: 'house:caughtMail',
  summary: 'Mail that the local mail server caught, newest first; only in the demo and in development',
  query: z.object({ to: z.string().max(254).optional() }),
  reply: z.object({ mails: z.array(z.object({ id: z.string(), at: z.string(), from: z.string(), to: z.string(), subject: z.string(), text: z.string() })) }),
  handle: ({ query }) => {
    const caught = caughtMails() ?? refuse('not_found')
    const mails = query.to === undefined ? caught : caught.filter(mail => mail.to.toLowerCase().includes((query.to ?? '').toLowerCase()))
    return { mails: mails.map(mail => ({ ...mail, at: new Date(mail.at).toISOString() })) }
  },
})
