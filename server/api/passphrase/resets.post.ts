import { z } from 'zod'
import { resetBody } from '#shared/schemas/people'
import { resetPassphrase } from '../../domain/people/resetPassphrase'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useLimits } from '../../utils/useLimits'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'passphrase:reset',
  summary: 'Set a new passphrase with the token of a mailed link; good once, ends every session',
  body: resetBody,
  reply: z.object({ changed: z.literal(true) }),
  handle: async ({ body, now }) => {
    await resetPassphrase(useStores(), useLimits(), body, now)
    return { changed: true as const }
  },
})
