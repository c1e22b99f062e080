import { z } from 'zod'
import { enrolment } from '#shared/schemas/department'
import { lateAddTold } from '#shared/schemas/departmentReplies'
import { enrol } from '../../../../domain/terms/enrol'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:memberships',
  summary: 'Take a person into a course in a role',
  params: z.object({ courseId: z.string() }),
  body: enrolment,
  reply: lateAddTold,
  makes: true,
  status: 201,
  handle: asked => enrol(useStores(), { ...askedBy(asked), courseId: asked.params.courseId, enrolment: asked.body }, asked.now),
})
