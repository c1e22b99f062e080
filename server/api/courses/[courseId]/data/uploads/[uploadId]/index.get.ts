import { z } from 'zod'
import { uploadReply } from '#shared/schemas/dataReplies'
import { describeUpload } from '../../../../../../domain/data/describeUpload'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useFiles } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:upload',
  summary: 'An uploaded file with a guess at its layout',
  params: z.object({ courseId: z.string(), uploadId: z.string() }),
  reply: uploadReply,
  handle: async ({ params }) => {
    const upload = await describeUpload(useStores().read, useFiles(), params.uploadId)
    return { ...upload, at: new Date(upload.at).toISOString() }
  },
})
