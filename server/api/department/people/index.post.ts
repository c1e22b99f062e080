import { z } from 'zod'
import { invitation } from '#shared/schemas/department'
import { invitePerson } from '../../../domain/people/invitePerson'
import { askedBy } from '../../../utils/askedBy'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'department:invite',
  summary: 'Invite a person, who gets a mail with a link to choose a passphrase',
  body: invitation,
  reply: z.object({ id: z.string() }),
  makes: true,
  status: 201,
  handle: asked => invitePerson(useStores(), { ...askedBy(asked), ...asked.body }, asked.now),
})
