import { z } from 'zod'
import { labBody } from '#shared/schemas/lab'
import { labMadeReply } from '#shared/schemas/labReplies'
import { createLab } from '../../../../domain/labs/createLab'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:write',
  summary: 'Begin a lab, on its own or as a copy of another of the course: a draft that only staff see',
  params: z.object({ courseId: z.string() }),
  query: z.object({ copyOf: z.string().max(80).default('') }),
  body: labBody,
  reply: labMadeReply,
  makes: true,
  status: 201,
  handle: asked => createLab(useStores(), { ...askedBy(asked), courseId: asked.params.courseId, body: asked.body, ancestorId: asked.query.copyOf === '' ? null : asked.query.copyOf }, asked.now),
})
