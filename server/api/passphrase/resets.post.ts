import { z } from 'zod'
import { resetBody } from '#shared/schemas/people'
import { resetPassphrase } from '../../domain/people/resetPassphrase'
import { addressOf } from '../../utils/address'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { knownBrowser } from '../../utils/knownBrowser'
import { useLimits } from '../../utils/useLimits'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'passphrase:reset',
  summary: 'Set a new passphrase with the token of a mailed link; good once, ends every session',
  body: resetBody,
  reply: z.object({ changed: z.literal(true) }),
  handle: async ({ body, event, now }) => {
    await resetPassphrase(useStores(), useLimits(), { ...body, address: addressOf(event), browserOf: email => knownBrowser(event, email) }, now)
    return { changed: true as const }
  },
})
