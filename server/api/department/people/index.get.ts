import { z } from 'zod'
import { peoplePage } from '#shared/schemas/departmentReplies'
import { listPeople } from '../../../domain/people/listPeople'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'department:people',
  summary: 'People of the department, searched and paged',
  query: z.object({ search: z.string().max(120).default(''), page: z.coerce.number().int().min(1).max(10_000).default(1) }),
  reply: peoplePage,
  handle: ({ query }) => listPeople(useStores().read, query),
})
