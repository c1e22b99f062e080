import { z } from 'zod'
import { proofReply } from '#shared/schemas/labReplies'
import { proofRun } from '../../../domain/labs/proof/proofRun'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:preview',
  summary: 'Prove a lab: every share by every accepted way and every slip, and worked by six played students. Writes nothing',
  params: z.object({ labId: z.string() }),
  reply: proofReply,
  handle: ({ params }) => proofRun(useStores().read, useObservations(), params.labId),
})
