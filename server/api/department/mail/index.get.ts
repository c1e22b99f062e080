import { z } from 'zod'
import { mailPage } from '#shared/schemas/machinery'
import { listMail } from '../../../domain/notices/listMail'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'department:mail',
  summary: 'Mail of the house: to whom, of which kind, whether it went out',
  query: z.object({ before: z.string().max(60).optional() }),
  reply: mailPage,
  handle: ({ query }) => listMail(useStores().read, { before: query.before ?? null }),
})
