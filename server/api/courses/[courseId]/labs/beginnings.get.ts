import { z } from 'zod'
import { refuse } from '#shared/errors'
import { labBeginningsReply } from '#shared/schemas/labBeginning'
import { listBeginnings } from '../../../../domain/labs/library/listBeginnings'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useObservations } from '../../../../utils/useImports'
import { useReadyLabs } from '../../../../utils/useReadyLabs'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:begin',
  summary: 'What a lab can begin from: ready labs with the shares that this course’s flights give them, and labs of one’s other courses',
  params: z.object({ courseId: z.string() }),
  reply: labBeginningsReply,
  handle: async ({ params, actor }) => listBeginnings(useStores().read, useObservations(), { courseId: params.courseId, memberships: actor?.memberships ?? refuse('not_signed_in'), texts: await useReadyLabs() }),
})
