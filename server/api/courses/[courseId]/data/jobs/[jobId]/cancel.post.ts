import { z } from 'zod'
import { jobReply } from '#shared/schemas/dataReplies'
import { cancelImport } from '../../../../../../domain/data/cancelImport'
import { describeJob } from '../../../../../../domain/data/describeJob'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useImports } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:cancel',
  summary: 'Cancels an import that waits or runs; nothing of it stays',
  params: z.object({ courseId: z.string(), jobId: z.string() }),
  reply: jobReply,
  handle: async ({ params, now }) => {
    await cancelImport(useStores(), useImports(), { jobId: params.jobId })
    return describeJob(useStores().read, useImports(), params.jobId, now)
  },
})
