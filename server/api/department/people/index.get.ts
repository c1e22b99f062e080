import { z } from 'zod'
import { courseRole, departmentRoleName } from '#shared/schemas/department'
import { listPeople } from '../../../domain/people/listPeople'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'department:people',
  summary: 'People of the department, searched and paged',
  query: z.object({ search: z.string().max(120).default(''), page: z.coerce.number().int().min(1).max(10_000).default(1) }),
  reply: z.object({
    page: z.number().int(), pages: z.number().int(), count: z.number().int(),
    people: z.array(z.object({
      id: z.string(), name: z.string(), email: z.string(), state: z.enum(['invited', 'active', 'closed']), roles: z.array(departmentRoleName),
      courses: z.array(z.object({ code: z.string(), role: courseRole })),
    })),
  }),
  handle: ({ query }) => listPeople(useStores().read, query),
})
