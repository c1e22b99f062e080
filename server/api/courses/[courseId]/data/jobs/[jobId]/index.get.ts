import { z } from 'zod'
import { jobReply } from '#shared/schemas/dataReplies'
import { describeJob } from '../../../../../../domain/data/describeJob'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useImports } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:job',
  summary: 'Where an import is',
  params: z.object({ courseId: z.string(), jobId: z.string() }),
  reply: jobReply,
  handle: ({ params, now }) => describeJob(useStores().read, useImports(), params.jobId, now),
})
