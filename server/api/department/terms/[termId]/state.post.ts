import { z } from 'zod'
import { termState } from '#shared/schemas/department'
import { setTermState } from '../../../../domain/terms/setTermState'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:terms',
  summary: 'Open a planned term, close a running one, or open a closed one again',
  params: z.object({ termId: z.string() }),
  body: z.object({ state: z.enum(['running', 'closed']) }),
  reply: z.object({ state: termState }),
  makes: true,
  handle: asked => setTermState(useStores(), { ...askedBy(asked), termId: asked.params.termId, state: asked.body.state }, asked.now),
})
