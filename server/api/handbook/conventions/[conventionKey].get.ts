import { z } from 'zod'
import { handbookConventionReply } from '#shared/schemas/handbook'
import { describeConvention } from '../../../domain/handbook/describeConvention'
import { defineApiHandler } from '../../../utils/defineApiHandler'

export default defineApiHandler({
  action: 'reference:read',
  summary: 'A convention: constants, the formulae it teaches, and what it accepts beside them',
  params: z.object({ conventionKey: z.string().max(40) }),
  reply: handbookConventionReply,
  handle: ({ params }) => describeConvention(params.conventionKey),
})
