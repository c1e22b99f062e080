import { z } from 'zod'
import { personDescription } from '#shared/schemas/departmentReplies'
import { describePerson } from '../../../../domain/people/listPeople'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:people',
  summary: 'One person: roles in the department, and courses of all terms',
  params: z.object({ personId: z.string() }),
  reply: personDescription,
  handle: ({ params }) => describePerson(useStores().read, params.personId),
})
