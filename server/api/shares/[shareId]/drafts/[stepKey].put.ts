import { z } from 'zod'
import { refuse } from '#shared/errors'
import { stepKey } from '#shared/schemas/steps'
import { draftBody, savedDraft } from '#shared/schemas/work'
import { saveDraft } from '../../../../domain/submissions/saveDraft'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'draft:save',
  summary: 'Save what stands in one field; refused with the other text where it was saved elsewhere meanwhile',
  params: z.object({ shareId: z.string(), stepKey }),
  body: draftBody,
  reply: savedDraft,
  handle: ({ acting, params, body, now }) => saveDraft(useStores(), { membershipId: acting?.actorId ?? refuse('not_found'), ...params, ...body }, now),
})
