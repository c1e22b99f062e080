import { z } from 'zod'
import { refuse } from '#shared/errors'
import { computeBody, computeReply } from '#shared/schemas/handbook'
import { computeQuantity } from '../../../../domain/handbook/computeQuantity'
import { isAskedNow } from '../../../../domain/handbook/isAskedNow'
import { seesBands } from '../../../../domain/handbook/seesBands'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useComputingLimits } from '../../../../utils/useLimits'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'reference:read',
  summary: 'Computes a quantity from typed values, with its working and a curve; stores nothing',
  params: z.object({ quantityKey: z.string().max(80) }),
  body: computeBody,
  reply: computeReply,
  handle: async ({ params, body, actor, now }) => {
    const { read } = useStores()
    const who = actor ?? refuse('not_signed_in')
    await useComputingLimits().compute(who.personId)
    return computeQuantity(params.quantityKey, body, { isStaff: await seesBands(read, who), isHeld: await isAskedNow(read, who, params.quantityKey, now) })
  },
})
