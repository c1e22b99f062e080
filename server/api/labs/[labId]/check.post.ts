import { z } from 'zod'
import { labCheckReply } from '#shared/schemas/labReplies'
import { checkLab } from '../../../domain/labs/checkLab'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:preview',
  summary: 'Work every share of a lab: reference, band, slips, and what stops the posting. Writes nothing',
  params: z.object({ labId: z.string() }),
  reply: labCheckReply,
  handle: ({ params }) => checkLab(useStores().read, useObservations(), params.labId),
})
