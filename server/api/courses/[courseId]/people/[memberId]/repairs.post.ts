import { z } from 'zod'
import { repairBody, repairTold } from '#shared/schemas/repairs'
import { repairMember } from '../../../../../domain/repairs/repairMember'
import { askedBy } from '../../../../../utils/askedBy'
import { defineApiHandler } from '../../../../../utils/defineApiHandler'
import { useStores } from '../../../../../utils/useStores'

export default defineApiHandler({
  action: 'person:repair',
  summary: 'Extend, accommodate, excuse, count again, grant an attempt or move section, for one student',
  params: z.object({ courseId: z.string(), memberId: z.string() }),
  body: repairBody,
  reply: repairTold,
  makes: true,
  status: 201,
  handle: asked => repairMember(useStores(), { ...askedBy(asked), ...asked.params, body: asked.body }, asked.now),
})
