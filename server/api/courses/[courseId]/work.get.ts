import { z } from 'zod'
import { refuse } from '#shared/errors'
import { workListEntry } from '#shared/schemas/work'
import { openWork } from '../../../domain/submissions/openWork'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'work:list',
  summary: 'The labs that are open to a student, with what is due and what is handed in',
  params: z.object({ courseId: z.string() }),
  reply: z.object({ now: z.iso.datetime(), labs: z.array(workListEntry) }),
  handle: async ({ acting, params, now }) => ({ now: new Date(now).toISOString(), labs: await openWork(useStores(), { courseId: params.courseId, membershipId: acting?.actorId ?? refuse('not_found') }, now) }),
})
