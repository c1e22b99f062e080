import { z } from 'zod'
import { sendMailAgain } from '../../../../domain/notices/sendMailAgain'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:resendMail',
  summary: 'Send a mail again that was given up or waits for its next try',
  params: z.object({ mailId: z.string() }),
  body: z.object({}),
  reply: z.object({ state: z.literal('waiting') }),
  makes: true,
  handle: asked => sendMailAgain(useStores(), { ...askedBy(asked), mailId: asked.params.mailId }, asked.now),
})
