import { z } from 'zod'
import { refuse } from '#shared/errors'
import { compareBody, compareReply } from '#shared/schemas/handbook'
import { comparePasted } from '../../../domain/handbook/comparePasted'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useComputingLimits } from '../../../utils/useLimits'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'reference:compare',
  summary: 'A key column pasted from a sheet, beside the reference: where it departs, and by which cause; stores nothing',
  params: z.object({ courseId: z.string() }),
  body: compareBody,
  reply: compareReply,
  handle: async ({ params, body, actor }) => {
    await useComputingLimits().compare((actor ?? refuse('not_signed_in')).personId)
    return comparePasted(useStores().read, params.courseId, body)
  },
})
