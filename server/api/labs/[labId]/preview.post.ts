import { z } from 'zod'
import { labPreviewBody, labPreviewReply } from '#shared/schemas/labReplies'
import { previewLab } from '../../../domain/labs/previewLab'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:preview',
  summary: 'What is being written, as a student would see it, with the worked values beside it. Writes nothing',
  params: z.object({ labId: z.string() }),
  body: labPreviewBody,
  reply: labPreviewReply,
  handle: ({ params, body }) => previewLab(useStores().read, useObservations(), { labId: params.labId, ...body }),
})
