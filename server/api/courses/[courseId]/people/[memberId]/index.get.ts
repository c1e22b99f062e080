import { z } from 'zod'
import { refuse } from '#shared/errors'
import { memberPage } from '#shared/schemas/repairs'
import { describeMember } from '../../../../../domain/repairs/describeMember'
import { defineApiHandler } from '../../../../../utils/defineApiHandler'
import { useStores } from '../../../../../utils/useStores'

export default defineApiHandler({
  action: 'person:read',
  summary: 'One student of a course: due times and where they come from, attempts, standing, claims, and what staff did for them',
  params: z.object({ courseId: z.string(), memberId: z.string() }),
  reply: memberPage,
  handle: ({ acting, params, now }) => describeMember(useStores().read, { ...params, acting: acting ?? refuse('not_found') }, now),
})
