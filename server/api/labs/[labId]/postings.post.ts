import { z } from 'zod'
import { refuse } from '#shared/errors'
import { postingBody } from '#shared/schemas/lab'
import { labPostedReply } from '#shared/schemas/labReplies'
import { postLab } from '../../../domain/labs/postLab'
import { askedBy } from '../../../utils/askedBy'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:post',
  summary: 'Give a lab to sections: every share is checked, the revision freezes, shares are drawn',
  params: z.object({ labId: z.string() }),
  body: postingBody,
  reply: labPostedReply,
  makes: true,
  guards: true,
  status: 201,
  handle: asked => postLab(useStores(), useObservations(), { ...askedBy(asked), labId: asked.params.labId, seenVersion: asked.seenVersion ?? refuse('version_missing'), posting: asked.body }, asked.now),
})
