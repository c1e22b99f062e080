import { z } from 'zod'
import { termState } from '#shared/schemas/department'
import { listTerms } from '../../../domain/terms/describeTerm'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'department:terms',
  summary: 'Terms, the newest first',
  reply: z.object({ terms: z.array(z.object({ id: z.string(), name: z.string(), zone: z.string(), startsOn: z.string(), endsOn: z.string(), state: termState, weeks: z.number().int(), courses: z.number().int(), students: z.number().int(), fromTermId: z.string().nullable() })) }),
  handle: async () => ({ terms: await listTerms(useStores().read) }),
})
