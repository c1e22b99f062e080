import { z } from 'zod'
import { refuse } from '#shared/errors'
import { rulingBody } from '#shared/schemas/disputes'
import { ruleDispute } from '../../../domain/disputes/ruleDispute'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useJudging } from '../../../utils/useJudging'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'dispute:rule',
  summary: 'Rule on a dispute, once',
  params: z.object({ disputeId: z.string() }),
  body: rulingBody,
  reply: z.object({ rulingId: z.string(), version: z.number().int(), state: z.enum(['ruled', 'appealed', 'closed']), changed: z.number().int() }),
  makes: true,
  guards: true,
  status: 201,
  handle: async ({ actor, acting, params, body, request, seenVersion, now }) => {
    if (!actor || !acting || !request || seenVersion === null) return refuse('not_found')
    const { reference } = await useJudging()
    return ruleDispute(useStores(), reference, {
      disputeId: params.disputeId, ruler: { actorId: acting.actorId, personId: actor.personId, role: acting.role }, seenVersion, body, request: { ...request, personId: actor.personId, now },
    }, now)
  },
})
