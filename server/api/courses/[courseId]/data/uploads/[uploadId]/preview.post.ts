import { z } from 'zod'
import { previewBody, previewReply } from '#shared/schemas/dataReplies'
import { previewImport } from '../../../../../../domain/data/previewImport'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useFiles } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:import',
  summary: 'The first rows as a recipe would store them; nothing is stored',
  params: z.object({ courseId: z.string(), uploadId: z.string() }),
  body: previewBody,
  reply: previewReply,
  handle: ({ params, body }) => previewImport(useStores().read, useFiles(), { uploadId: params.uploadId, recipe: body.recipe }),
})
