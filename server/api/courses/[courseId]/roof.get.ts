import { z } from 'zod'
import { describeRoof } from '../../../domain/data/describeRoof'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'course:roof',
  summary: 'The roof’s last reading; never for flight decisions',
  params: z.object({ courseId: z.string() }),
  reply: z.object({ reading: z.object({ at: z.string(), wall: z.string(), values: z.array(z.object({ quantity: z.string(), value: z.number(), unit: z.string(), digits: z.number().int() })) }).nullable() }),
  handle: ({ params }) => describeRoof(useStores().read, useObservations(), params.courseId),
})
