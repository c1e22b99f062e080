import { z } from 'zod'
import { askResetBody } from '#shared/schemas/people'
import { askReset } from '../../domain/people/askReset'
import { addressOf } from '../../utils/address'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useLimits } from '../../utils/useLimits'
import { wakeMachinery } from '../../utils/useMachinery'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'passphrase:askReset',
  summary: 'Ask for a link to a new passphrase by mail; answers alike whether there is such an account or not',
  body: askResetBody,
  reply: z.object({ asked: z.literal(true) }),
  status: 202,
  handle: async ({ body, event, now }) => {
    await askReset(useStores(), useLimits(), { email: body.email, address: addressOf(event) }, now)
    wakeMachinery()
    return { asked: true as const }
  },
})
