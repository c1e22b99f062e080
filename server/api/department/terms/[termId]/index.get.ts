import { z } from 'zod'
import { termDescription } from '#shared/schemas/departmentReplies'
import { describeTerm } from '../../../../domain/terms/describeTerm'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:terms',
  summary: 'One term: its calendar and its courses',
  params: z.object({ termId: z.string() }),
  reply: termDescription,
  handle: ({ params }) => describeTerm(useStores().read, params.termId),
})
