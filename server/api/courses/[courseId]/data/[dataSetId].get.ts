import { z } from 'zod'
import { dataSetReply } from '#shared/schemas/dataReplies'
import { describeDataSet } from '../../../../domain/data/describeDataSet'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useObservations } from '../../../../utils/useImports'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:read',
  summary: 'A data set with its versions',
  params: z.object({ courseId: z.string(), dataSetId: z.string() }),
  reply: dataSetReply,
  handle: ({ params }) => describeDataSet(useStores().read, useObservations(), params.dataSetId),
})
