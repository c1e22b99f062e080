import { z } from 'zod'
import { refuse } from '#shared/errors'
import { takeDispute } from '../../../domain/disputes/takeDispute'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'dispute:take',
  summary: 'Take a dispute, or put it back',
  params: z.object({ disputeId: z.string() }),
  body: z.object({ giveBack: z.boolean().default(false) }),
  reply: z.object({ version: z.number().int(), state: z.enum(['open', 'taken', 'appealed']) }),
  guards: true,
  handle: ({ actor, acting, params, body, seenVersion, now }) => {
    if (!actor || !acting || seenVersion === null) return refuse('not_found')
    return takeDispute(useStores(), { disputeId: params.disputeId, ruler: { actorId: acting.actorId, personId: actor.personId, role: acting.role }, seenVersion, giveBack: body.giveBack }, now)
  },
})
