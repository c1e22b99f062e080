import { z } from 'zod'
import { allowanceGrant } from '#shared/schemas/department'
import { allowanceTold } from '#shared/schemas/departmentReplies'
import { grantAllowance } from '../../../domain/terms/grantAllowance'
import { askedBy } from '../../../utils/askedBy'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'allowance:grant',
  summary: 'Give a student a later due in one posting',
  params: z.object({ postingId: z.string() }),
  body: allowanceGrant,
  reply: allowanceTold,
  makes: true,
  status: 201,
  handle: asked => grantAllowance(useStores(), { ...askedBy(asked), postingId: asked.params.postingId, ...asked.body }, asked.now),
})
