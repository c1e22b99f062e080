import { z } from 'zod'
import { classView as reply } from '#shared/schemas/marks'
import { classView } from '../../../domain/marking/classView'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:class',
  summary: 'What a section did: values against their bands, slips by number, who handed in',
  params: z.object({ postingId: z.string() }),
  reply,
  handle: ({ params, now }) => classView(useStores().read, params.postingId, now),
})
