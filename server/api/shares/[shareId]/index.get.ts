import { z } from 'zod'
import { servedReply } from '#shared/schemas/labReplies'
import { servedData } from '../../../domain/shares/servedShare'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'share:data',
  summary: 'The served rows of a share, with the digits as they stand in its file',
  params: z.object({ shareId: z.string() }),
  reply: servedReply,
  handle: ({ params }) => servedData(useStores().read, useObservations(), params.shareId),
})
