import { z } from 'zod'
import { refuse } from '#shared/errors'
import { withdrawDispute } from '../../../domain/disputes/takeDispute'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'dispute:withdraw',
  summary: 'Take an objection back while nobody has ruled on it',
  params: z.object({ disputeId: z.string() }),
  body: z.object({}),
  reply: z.object({ version: z.number().int() }),
  handle: ({ acting, params, now }) => withdrawDispute(useStores(), { disputeId: params.disputeId, membershipId: acting?.actorId ?? refuse('not_found') }, now),
})
