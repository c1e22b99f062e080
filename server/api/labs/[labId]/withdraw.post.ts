import { z } from 'zod'
import { refuse } from '#shared/errors'
import { labSavedReply } from '#shared/schemas/labReplies'
import { withdrawLab } from '../../../domain/labs/withdrawLab'
import { askedBy } from '../../../utils/askedBy'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:post',
  summary: 'Take a posted lab back; what was handed in stays',
  params: z.object({ labId: z.string() }),
  reply: labSavedReply,
  makes: true,
  guards: true,
  handle: asked => withdrawLab(useStores(), { ...askedBy(asked), labId: asked.params.labId, seenVersion: asked.seenVersion ?? refuse('version_missing') }, asked.now),
})
