import { z } from 'zod'
import { refuse } from '#shared/errors'
import { disputeLine } from '#shared/schemas/disputes'
import { listDisputes } from '../../../domain/disputes/listDisputes'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'dispute:list',
  summary: 'Disputes of a course: a student’s own, a TA’s sections’, all for who teaches',
  params: z.object({ courseId: z.string() }),
  reply: z.object({ disputes: z.array(disputeLine) }),
  handle: async ({ acting, params }) => ({ disputes: await listDisputes(useStores().read, acting ?? refuse('not_found'), params.courseId) }),
})
