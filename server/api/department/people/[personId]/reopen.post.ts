import { z } from 'zod'
import { reopenAccount } from '../../../../domain/people/closeAccount'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:closeAccount',
  summary: 'Open a closed account again',
  params: z.object({ personId: z.string() }),
  reply: z.object({ state: z.enum(['active', 'invited']) }),
  makes: true,
  handle: asked => reopenAccount(useStores(), { ...askedBy(asked), personId: asked.params.personId }, asked.now),
})
