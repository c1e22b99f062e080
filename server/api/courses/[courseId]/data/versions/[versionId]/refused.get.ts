import { z } from 'zod'
import { pageQuery, refusedReply } from '#shared/schemas/dataReplies'
import { refusedRows } from '../../../../../../domain/data/refusedRows'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useObservations } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:read',
  summary: 'Rows of the source file that were not taken, each with its reason',
  params: z.object({ courseId: z.string(), versionId: z.string() }),
  query: pageQuery,
  reply: refusedReply,
  handle: ({ params, query }) => refusedRows(useStores().read, useObservations(), { versionId: params.versionId, ...query }),
})
