import { z } from 'zod'
import { roofReply } from '#shared/schemas/runningHead'
import { describeRoof } from '../../../domain/data/describeRoof'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'course:roof',
  summary: 'The roof’s last reading; never for flight decisions',
  params: z.object({ courseId: z.string() }),
  reply: roofReply,
  handle: ({ params }) => describeRoof(useStores().read, useObservations(), params.courseId),
})
