import { z } from 'zod'
import { invitationBody } from '#shared/schemas/people'
import { readInvitation } from '../../domain/people/readInvitation'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'invitation:accept',
  summary: 'Whom an invitation is for',
  body: invitationBody,
  reply: z.object({ name: z.string(), email: z.string() }),
  handle: ({ body, now }) => readInvitation(useStores().read, body.token, now),
})
