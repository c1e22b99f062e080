import { z } from 'zod'
import { redraw } from '../../../domain/shares/redraw'
import { askedBy } from '../../../utils/askedBy'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'share:redraw',
  summary: 'Give the holder of a share other data, openly and with a reason',
  params: z.object({ shareId: z.string() }),
  body: z.object({ reason: z.string().trim().min(1, 'Say why.').max(400) }),
  reply: z.object({ shareId: z.string() }),
  makes: true,
  status: 201,
  handle: asked => redraw(useStores(), { ...askedBy(asked), shareId: asked.params.shareId, reason: asked.body.reason }, asked.now),
})
