import { z } from 'zod'
import { handbookQuantityReply } from '#shared/schemas/handbook'
import { describeQuantity } from '../../../../domain/handbook/describeQuantity'
import { defineApiHandler } from '../../../../utils/defineApiHandler'

export default defineApiHandler({
  action: 'reference:read',
  summary: 'A quantity of the reference: what is asked, formulae with their sources and ranges, constants, known slips',
  params: z.object({ quantityKey: z.string().max(80) }),
  reply: handbookQuantityReply,
  handle: ({ params }) => describeQuantity(params.quantityKey),
})
