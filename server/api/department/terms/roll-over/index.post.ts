import { z } from 'zod'
import { rollOverStarted } from '#shared/schemas/rollOver'
import { startTerm } from '../../../../domain/terms/rollOver/startTerm'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:rollover',
  summary: 'Start the term that a plan which was read describes: all of it or nothing, and once',
  body: rollOverStarted,
  reply: z.object({ termId: z.string(), courses: z.number().int(), labs: z.number().int(), dates: z.number().int() }),
  makes: true,
  status: 201,
  handle: asked => startTerm(useStores(), { ...askedBy(asked), ...asked.body }, asked.now),
})
