import { z } from 'zod'
import { seriesQuery, seriesReply } from '#shared/schemas/dataReplies'
import { seriesWindow } from '../../../../../../domain/data/seriesWindow'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useObservations } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:read',
  summary: 'Columns of a version in a window of time, thinned for a plot without losing its extremes',
  params: z.object({ courseId: z.string(), versionId: z.string() }),
  query: seriesQuery,
  reply: seriesReply,
  handle: ({ params, query }) => seriesWindow(useStores().read, useObservations(), { versionId: params.versionId, ...query }),
})
