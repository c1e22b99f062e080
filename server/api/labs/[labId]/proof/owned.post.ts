import { z } from 'zod'
import { ownedBody, ownedReply } from '#shared/schemas/labReplies'
import { ownReds } from '../../../../domain/labs/proof/ownRed'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:own-finding',
  summary: 'Answer by name for findings of the proof run',
  params: z.object({ labId: z.string() }),
  body: ownedBody,
  reply: ownedReply,
  makes: true,
  handle: asked => ownReds(useStores(), { ...askedBy(asked), labId: asked.params.labId, ...asked.body }, asked.now),
})
