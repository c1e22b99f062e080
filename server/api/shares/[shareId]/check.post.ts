import { z } from 'zod'
import { refuse } from '#shared/errors'
import { checkBody, readBack } from '#shared/schemas/work'
import { checkTyped } from '../../../domain/submissions/checkTyped'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'draft:check',
  summary: 'How a typed value is read, with its unit; says nothing of what is right',
  params: z.object({ shareId: z.string() }),
  body: checkBody,
  reply: readBack,
  handle: ({ acting, params, body, now }) => checkTyped(useStores().read, { membershipId: acting?.actorId ?? refuse('not_found'), shareId: params.shareId }, body, now),
})
