import { z } from 'zod'
import { lateWorkBody, repairTold } from '#shared/schemas/repairs'
import { acceptLateWork } from '../../../../../domain/repairs/acceptLateWork'
import { askedBy } from '../../../../../utils/askedBy'
import { defineApiHandler } from '../../../../../utils/defineApiHandler'
import { useStores } from '../../../../../utils/useStores'

export default defineApiHandler({
  action: 'person:acceptLate',
  summary: 'Accept late work: from a due that moved since, the device’s own time, or the work itself where the rule gives it nothing',
  params: z.object({ courseId: z.string(), memberId: z.string() }),
  body: lateWorkBody,
  reply: repairTold,
  makes: true,
  status: 201,
  handle: asked => acceptLateWork(useStores(), { ...askedBy(asked), ...asked.params, body: asked.body }, asked.now),
})
