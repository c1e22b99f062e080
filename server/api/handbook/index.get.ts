import { handbookReply } from '#shared/schemas/handbook'
import { handbookList } from '../../domain/handbook/handbookList'
import { defineApiHandler } from '../../utils/defineApiHandler'

export default defineApiHandler({
  action: 'reference:read',
  summary: 'The contents of the handbook: quantities by group, and conventions',
  reply: handbookReply,
  handle: () => handbookList(),
})
