import { z } from 'zod'
import { pageQuery, rowsReply } from '#shared/schemas/dataReplies'
import { versionTable } from '../../../../../../domain/data/versionTable'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useObservations } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:read',
  summary: 'Rows of a version, with the digits that are served',
  params: z.object({ courseId: z.string(), versionId: z.string() }),
  query: pageQuery,
  reply: rowsReply,
  handle: ({ params, query }) => versionTable(useStores().read, useObservations(), { versionId: params.versionId, ...query }),
})
