import { z } from 'zod'
import { refuse } from '#shared/errors'
import { changePassphraseBody } from '#shared/schemas/people'
import { changePassphrase } from '../../domain/people/changePassphrase'
import { addressOf } from '../../utils/address'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useLimits } from '../../utils/useLimits'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'self:changePassphrase',
  summary: 'Change one’s own passphrase by giving the present one; every other session ends',
  body: changePassphraseBody,
  reply: z.object({ changed: z.literal(true) }),
  handle: async ({ actor, body, event, now }) => {
    await changePassphrase(useStores(), useLimits(), { actor: actor ?? refuse('not_signed_in'), ...body, address: addressOf(event) }, now)
    return { changed: true as const }
  },
})
