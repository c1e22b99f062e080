import { z } from 'zod'
import { refuse } from '#shared/errors'
import { describePlaces } from '../../../domain/people/describePlaces'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'course:read',
  summary: 'What waits at the places of a course, and its teaching week',
  params: z.object({ courseId: z.string() }),
  reply: z.object({ week: z.number().int().nullable(), counts: z.object({ due: z.number().int(), open: z.number().int(), fresh: z.number().int() }) }),
  handle: ({ acting, params, now }) => describePlaces(useStores().read, { acting: acting ?? refuse('not_found'), courseId: params.courseId }, now),
})
