import { termList } from '#shared/schemas/departmentReplies'
import { listTerms } from '../../../domain/terms/describeTerm'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'department:terms',
  summary: 'Terms, the newest first',
  reply: termList,
  handle: async () => ({ terms: await listTerms(useStores().read) }),
})
