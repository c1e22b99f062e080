import { z } from 'zod'
import { refuse } from '#shared/errors'
import { practiceTry, triedStep } from '#shared/schemas/practice'
import { tryPractice } from '../../../../domain/labs/practice/tryPractice'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { loadShareHere } from '../../../../utils/useJudging'
import { useComputingLimits } from '../../../../utils/useLimits'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:practice',
  summary: 'A try at one step of the practice: how it was read and, once it can be read, the worked answer. Nothing is kept',
  params: z.object({ shareId: z.string() }),
  body: practiceTry,
  reply: triedStep,
  handle: async ({ actor, acting, params, body, now }) => {
    await useComputingLimits().compute((actor ?? refuse('not_signed_in')).personId)
    return tryPractice(useStores().read, loadShareHere, { membershipId: acting?.actorId ?? refuse('not_found'), shareId: params.shareId }, body, now)
  },
})
