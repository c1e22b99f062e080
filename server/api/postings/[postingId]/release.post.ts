import { z } from 'zod'
import { refuse } from '#shared/errors'
import { releaseMarks } from '../../../domain/marking/releaseMarks'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:release',
  summary: 'Show a section its marks',
  params: z.object({ postingId: z.string() }),
  body: z.object({}),
  reply: z.object({ releasedAt: z.iso.datetime(), version: z.number().int(), told: z.number().int() }),
  guards: true,
  handle: ({ acting, params, seenVersion, now }) => {
    if (!acting || seenVersion === null) return refuse('not_found')
    return releaseMarks(useStores(), { actorId: acting.actorId, postingId: params.postingId, seenVersion }, now)
  },
})
