import { z } from 'zod'
import { refuse } from '#shared/errors'
import { practice } from '#shared/schemas/practice'
import { readPractice } from '../../../../domain/labs/practice/readPractice'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { loadShareHere } from '../../../../utils/useJudging'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:practice',
  summary: 'The practice of the lab that a share is of: readings that come with the lab, and the steps that can be tried on them',
  params: z.object({ shareId: z.string() }),
  reply: practice,
  handle: ({ acting, params, now }) => readPractice(useStores().read, loadShareHere, { membershipId: acting?.actorId ?? refuse('not_found'), shareId: params.shareId }, now),
})
