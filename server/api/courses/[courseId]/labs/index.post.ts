import { z } from 'zod'
import { labBody } from '#shared/schemas/lab'
import { labMadeReply } from '#shared/schemas/labReplies'
import { createLab } from '../../../../domain/labs/createLab'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:write',
  summary: 'Begin a lab: a draft that only staff see',
  params: z.object({ courseId: z.string() }),
  body: labBody,
  reply: labMadeReply,
  makes: true,
  status: 201,
  handle: asked => createLab(useStores(), { ...askedBy(asked), courseId: asked.params.courseId, body: asked.body }, asked.now),
})
