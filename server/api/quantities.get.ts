import { quantityListReply } from '#shared/schemas/labReplies'
import { listQuantities } from '../domain/labs/listQuantities'
import { defineApiHandler } from '../utils/defineApiHandler'

export default defineApiHandler({
  action: 'reference:read',
  summary: 'The quantities that the reference computes: inputs, units, formulae with their sources',
  reply: quantityListReply,
  handle: () => ({ quantities: listQuantities() }),
})
