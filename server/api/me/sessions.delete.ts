import { z } from 'zod'
import { refuse } from '#shared/errors'
import { endAllSessions } from '../../domain/people/endSessions'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'self:endSessions',
  summary: 'Sign out everywhere, this browser included',
  reply: z.object({ ended: z.literal(true) }),
  handle: async ({ actor, now }) => {
    await endAllSessions(useStores(), (actor ?? refuse('not_signed_in')).personId, 'signed out everywhere', now)
    return { ended: true as const }
  },
})
