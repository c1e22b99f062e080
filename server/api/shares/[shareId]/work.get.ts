import { z } from 'zod'
import { refuse } from '#shared/errors'
import { work } from '#shared/schemas/work'
import { readWork } from '../../../domain/submissions/readWork'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { loadShareHere } from '../../../utils/useJudging'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:work',
  summary: 'Everything on the work page of a share: text, asks, rows, saved texts, dates',
  params: z.object({ shareId: z.string() }),
  reply: work,
  handle: ({ acting, params, now }) => readWork(useStores().read, loadShareHere, { membershipId: acting?.actorId ?? refuse('not_found'), shareId: params.shareId }, now),
})
