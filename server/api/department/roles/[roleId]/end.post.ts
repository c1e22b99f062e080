import { z } from 'zod'
import { endDepartmentRole } from '../../../../domain/people/departmentRoles'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:role',
  summary: 'End a role in the department; the last admin stays',
  params: z.object({ roleId: z.string() }),
  reply: z.object({ id: z.string() }),
  makes: true,
  handle: asked => endDepartmentRole(useStores(), { ...askedBy(asked), roleId: asked.params.roleId }, asked.now),
})
