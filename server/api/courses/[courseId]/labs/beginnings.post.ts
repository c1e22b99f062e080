import { z } from 'zod'
import { refuse } from '#shared/errors'
import { labBeginning, labBegunReply } from '#shared/schemas/labBeginning'
import { beginLab } from '../../../../domain/labs/library/beginLab'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useObservations } from '../../../../utils/useImports'
import { useReadyLabs } from '../../../../utils/useReadyLabs'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:write',
  summary: 'Begin a lab from the library, from a lab of another course of one’s own, or from its text; its supply is drawn from the course’s newest flights',
  params: z.object({ courseId: z.string() }),
  body: labBeginning,
  reply: labBegunReply,
  makes: true,
  status: 201,
  handle: async asked => beginLab(useStores(), useObservations(), {
    ...askedBy(asked), courseId: asked.params.courseId, memberships: asked.actor?.memberships ?? refuse('not_signed_in'), texts: await useReadyLabs(), beginning: asked.body,
  }, asked.now),
})
