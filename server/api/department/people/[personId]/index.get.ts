import { z } from 'zod'
import { courseRole, departmentRoleName } from '#shared/schemas/department'
import { describePerson } from '../../../../domain/people/listPeople'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:people',
  summary: 'One person: roles in the department, and courses of all terms',
  params: z.object({ personId: z.string() }),
  reply: z.object({
    id: z.string(), name: z.string(), email: z.string(), state: z.enum(['invited', 'active', 'closed']), createdAt: z.string(), openSessions: z.number().int(),
    roles: z.array(z.object({ id: z.string(), role: departmentRoleName, until: z.string().nullable() })),
    memberships: z.array(z.object({
      id: z.string(), role: courseRole, state: z.enum(['active', 'dropped', 'ended']), courseId: z.string(), code: z.string(), title: z.string(), term: z.string(), section: z.string().nullable(),
    })),
  }),
  handle: ({ params }) => describePerson(useStores().read, params.personId),
})
