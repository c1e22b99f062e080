import { z } from 'zod'
import { inviteAgain } from '../../../../domain/people/invitePerson'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:invite',
  summary: 'Send an invited person a new link; earlier ones stop working',
  params: z.object({ personId: z.string() }),
  reply: z.object({ id: z.string() }),
  makes: true,
  handle: asked => inviteAgain(useStores(), { ...askedBy(asked), personId: asked.params.personId }, asked.now),
})
