import { z } from 'zod'
import { submissionListEntry } from '#shared/schemas/work'
import { listSubmissions } from '../../../domain/submissions/listSubmissions'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'submission:list',
  summary: 'What was handed in for a share: attempts with receipts, no marks',
  params: z.object({ shareId: z.string() }),
  reply: z.object({ submissions: z.array(submissionListEntry) }),
  handle: async ({ params }) => ({ submissions: await listSubmissions(useStores().read, params.shareId) }),
})
