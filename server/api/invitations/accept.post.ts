import { z } from 'zod'
import { acceptInvitationBody } from '#shared/schemas/people'
import { acceptInvitation } from '../../domain/people/acceptInvitation'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'invitation:accept',
  summary: 'Take an invitation up: choose the first passphrase; good once',
  body: acceptInvitationBody,
  reply: z.object({ email: z.string() }),
  handle: ({ body, now }) => acceptInvitation(useStores(), body, now),
})
