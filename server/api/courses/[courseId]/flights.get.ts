import { z } from 'zod'
import { flightListReply } from '#shared/schemas/labReplies'
import { listFlights } from '../../../domain/shares/listFlights'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:flights',
  summary: 'Flights that a lab of this course may draw shares from, with their profiles',
  params: z.object({ courseId: z.string() }),
  reply: flightListReply,
  handle: async ({ params }) => ({ flights: await listFlights(useStores().read, useObservations(), params.courseId) }),
})
