import { z } from 'zod'
import { refuse } from '#shared/errors'
import { disputeDetail } from '#shared/schemas/disputes'
import { describeDispute } from '../../domain/disputes/describeDispute'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useJudging } from '../../utils/useJudging'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'dispute:read',
  summary: 'A dispute with its evidence, side by side',
  params: z.object({ disputeId: z.string() }),
  reply: disputeDetail,
  handle: async ({ actor, acting, params }) => {
    if (!actor || !acting) return refuse('not_found')
    return describeDispute(useStores().read, await useJudging(), { actorId: acting.actorId, personId: actor.personId, role: acting.role }, params.disputeId)
  },
})
