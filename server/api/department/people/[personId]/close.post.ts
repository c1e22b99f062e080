import { z } from 'zod'
import { closeAccount } from '../../../../domain/people/closeAccount'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:closeAccount',
  summary: 'Close an account: its sessions end at once, what the person did stays',
  params: z.object({ personId: z.string() }),
  reply: z.object({ state: z.literal('closed') }),
  makes: true,
  handle: asked => closeAccount(useStores(), { ...askedBy(asked), personId: asked.params.personId }, asked.now),
})
