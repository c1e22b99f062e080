import { refuse } from '#shared/errors'
import { visit } from '#shared/schemas/visit'
import { readVisit } from '../../domain/records/readVisit'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'visit:read',
  summary: 'What a visitor may read: the stated courses, what their classes reached, and a sample of work under pseudonyms. Every look is logged',
  reply: visit,
  handle: ({ actor, acting, now }) => readVisit(useStores(), { roleId: acting?.actorId ?? refuse('not_signed_in'), personId: actor?.personId ?? refuse('not_signed_in') }, now),
})
