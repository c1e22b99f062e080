import { z } from 'zod'
import { endMembership } from '../../../../domain/terms/memberships'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:memberships',
  summary: 'End a membership; a course keeps its last lead',
  params: z.object({ membershipId: z.string() }),
  reply: z.object({ state: z.enum(['dropped', 'ended']) }),
  makes: true,
  handle: asked => endMembership(useStores(), { ...askedBy(asked), membershipId: asked.params.membershipId }, asked.now),
})
