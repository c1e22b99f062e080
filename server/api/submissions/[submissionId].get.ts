import { z } from 'zod'
import { submissionSent } from '#shared/schemas/work'
import { readSubmission } from '../../domain/submissions/readSubmission'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'submission:read',
  summary: 'What was handed in, as it was typed and as it was read, with its receipt',
  params: z.object({ submissionId: z.string() }),
  reply: submissionSent,
  handle: ({ params }) => readSubmission(useStores().read, { submissionId: params.submissionId }),
})
