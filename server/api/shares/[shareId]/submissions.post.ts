import { z } from 'zod'
import { refuse } from '#shared/errors'
import { submissionBody, submissionReply } from '#shared/schemas/work'
import { submitLab } from '../../../domain/submissions/submitLab'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useJudging } from '../../../utils/useJudging'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'submission:create',
  summary: 'Hand in a share’s work; a repetition under the same key gets the same receipt',
  params: z.object({ shareId: z.string() }),
  body: submissionBody,
  reply: submissionReply,
  makes: true,
  status: 201,
  handle: async ({ actor, acting, params, body, request, receivedAt }) => {
    if (!actor || !acting || !request) return refuse('not_found')
    return submitLab(useStores(), await useJudging(), {
      personId: actor.personId, membershipId: acting.actorId, shareId: params.shareId, request, answers: body.answers,
      claimedSentAt: body.claimedSentAt === undefined ? null : Date.parse(body.claimedSentAt),
    }, receivedAt)
  },
})
