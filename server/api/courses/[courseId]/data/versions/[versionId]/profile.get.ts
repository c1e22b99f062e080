import { z } from 'zod'
import { profileReply } from '#shared/schemas/dataReplies'
import { profileOf } from '../../../../../../domain/data/profileOf'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useObservations } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:read',
  summary: 'A flight as a profile',
  params: z.object({ courseId: z.string(), versionId: z.string() }),
  reply: profileReply,
  handle: ({ params }) => profileOf(useStores().read, useObservations(), params.versionId),
})
