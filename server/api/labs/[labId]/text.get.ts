import { z } from 'zod'
import { takeLabText } from '../../../domain/labs/labFile/takeLabText'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { asDownload } from '../../../utils/download'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'lab:edit',
  summary: 'A lab as one readable text file, to be changed in any editor and taken in again',
  params: z.object({ labId: z.string() }),
  reply: z.string(),
  raw: 'answer',
  handle: async ({ params, event }) => {
    const { name, text } = await takeLabText(useStores().read, params.labId)
    asDownload(event, { name, type: 'text/markdown; charset=utf-8' })
    return text
  },
})
