import { rollOverAsked, termPlan } from '#shared/schemas/rollOver'
import { planTerm } from '../../../../domain/terms/rollOver/planTerm'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:rollover',
  summary: 'What the next term would be, made from one that is there; writes nothing',
  body: rollOverAsked,
  reply: termPlan,
  handle: ({ body }) => planTerm(useStores().read, body),
})
