import { z } from 'zod'
import { refuse } from '#shared/errors'
import { setTaSections } from '../../../../domain/terms/memberships'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:memberships',
  summary: 'Say which sections a TA has',
  params: z.object({ membershipId: z.string() }),
  body: z.object({ sectionIds: z.array(z.string()).max(40) }),
  reply: z.object({ sectionIds: z.array(z.string()), version: z.number().int() }),
  guards: true,
  handle: asked => setTaSections(useStores(), { ...askedBy(asked), membershipId: asked.params.membershipId, seenVersion: asked.seenVersion ?? refuse('version_missing'), sectionIds: asked.body.sectionIds }, asked.now),
})
