import { z } from 'zod'
import { labEditReply } from '#shared/schemas/labReplies'
import { describeLab } from '../../../domain/labs/describeLab'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:edit',
  summary: 'A lab as its authors see it: body, asks, what is not bound yet, postings',
  params: z.object({ labId: z.string() }),
  reply: labEditReply,
  handle: ({ params }) => describeLab(useStores().read, useObservations(), params.labId),
})
