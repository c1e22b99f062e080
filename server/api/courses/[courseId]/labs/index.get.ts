import { z } from 'zod'
import { refuse } from '#shared/errors'
import { labListReply } from '#shared/schemas/labReplies'
import { listLabs } from '../../../../domain/labs/listLabs'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:list',
  summary: 'Labs of a course: all of them for staff, the open ones of the own section for a student',
  params: z.object({ courseId: z.string() }),
  reply: labListReply,
  handle: async ({ params, acting, now }) => ({ labs: await listLabs(useStores().read, { courseId: params.courseId, acting: acting ?? refuse('not_found') }, now) }),
})
