import { z } from 'zod'
import { moveTold } from '#shared/schemas/departmentReplies'
import { moveSection } from '../../../../domain/terms/memberships'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:memberships',
  summary: 'Move a student to another section; the share stays and the later due counts',
  params: z.object({ membershipId: z.string() }),
  body: z.object({ sectionId: z.string() }),
  reply: moveTold,
  makes: true,
  handle: asked => moveSection(useStores(), { ...askedBy(asked), membershipId: asked.params.membershipId, sectionId: asked.body.sectionId }, asked.now),
})
