import { z } from 'zod'
import { refuse } from '#shared/errors'
import { openDisputeBody } from '#shared/schemas/disputes'
import { openDispute } from '../../../domain/disputes/openDispute'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'dispute:open',
  summary: 'Object to the mark of one step',
  params: z.object({ submissionId: z.string() }),
  body: openDisputeBody,
  reply: z.object({ disputeId: z.string(), version: z.number().int() }),
  makes: true,
  status: 201,
  handle: ({ actor, acting, params, body, request, now }) => {
    if (!actor || !acting || !request) return refuse('not_found')
    return openDispute(useStores(), { membershipId: acting.actorId, submissionId: params.submissionId, body, request: { ...request, personId: actor.personId, now } }, now)
  },
})
