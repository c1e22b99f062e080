import { z } from 'zod'
import { layoutQuery, uploadReply } from '#shared/schemas/dataReplies'
import { describeUpload } from '../../../../../../domain/data/describeUpload'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useFiles } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:upload',
  summary: 'An uploaded file with a guess at its layout',
  params: z.object({ courseId: z.string(), uploadId: z.string() }),
  query: layoutQuery,
  reply: uploadReply,
  handle: async ({ params, query }) => {
    const upload = await describeUpload(useStores().read, useFiles(), params.uploadId, query)
    return { ...upload, at: new Date(upload.at).toISOString() }
  },
})
