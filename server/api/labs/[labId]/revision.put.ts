import { z } from 'zod'
import { refuse } from '#shared/errors'
import { labBody } from '#shared/schemas/lab'
import { labSavedReply } from '#shared/schemas/labReplies'
import { saveRevision } from '../../../domain/labs/saveRevision'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:write',
  summary: 'Keep what was written in a draft',
  params: z.object({ labId: z.string() }),
  body: labBody,
  reply: labSavedReply,
  guards: true,
  handle: ({ params, body, seenVersion, acting, now }) => saveRevision(useStores(), { labId: params.labId, actorId: acting?.actorId ?? refuse('not_found'), seenVersion: seenVersion ?? refuse('version_missing'), body }, now),
})
