import { z } from 'zod'
import { refuse } from '#shared/errors'
import { placesReply } from '#shared/schemas/runningHead'
import { describePlaces } from '../../../domain/people/describePlaces'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'course:read',
  summary: 'What waits at the places of a course, and its teaching week',
  params: z.object({ courseId: z.string() }),
  reply: placesReply,
  handle: ({ acting, params, now }) => describePlaces(useStores().read, { acting: acting ?? refuse('not_found'), courseId: params.courseId }, now),
})
