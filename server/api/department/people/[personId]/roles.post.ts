import { z } from 'zod'
import { departmentRoleGrant } from '#shared/schemas/department'
import { setDepartmentRole } from '../../../../domain/people/departmentRoles'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:role',
  summary: 'Give a person a role in the department',
  params: z.object({ personId: z.string() }),
  body: departmentRoleGrant,
  reply: z.object({ id: z.string() }),
  makes: true,
  status: 201,
  handle: asked => setDepartmentRole(useStores(), { ...askedBy(asked), ...asked.body, personId: asked.params.personId }, asked.now),
})
