import { z } from 'zod'
import { accessPage } from '#shared/schemas/departmentReplies'
import { listAccess } from '../../domain/records/listAccess'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'department:access',
  summary: 'Who looked at whose record, the newest first',
  query: z.object({ person: z.string().max(80).default(''), before: z.coerce.number().int().min(1).optional() }),
  reply: accessPage,
  handle: ({ query }) => listAccess(useStores().read, { personId: query.person === '' ? null : query.person, before: query.before ?? null }),
})
