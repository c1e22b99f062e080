import { z } from 'zod'
import { disputeFile } from '../../../../domain/disputes/attachFile'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { asDownload } from '../../../../utils/download'
import { useFiles } from '../../../../utils/useImports'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'dispute:file',
  summary: 'A file of a dispute, for download only',
  params: z.object({ disputeId: z.string(), digest: z.string().regex(/^[0-9a-f]{64}$/) }),
  reply: z.unknown(),
  raw: 'answer',
  handle: async ({ params, event }) => {
    const file = await disputeFile(useStores(), params)
    asDownload(event, { name: file.name, type: 'application/octet-stream', size: file.size })
    return useFiles().read(file.sha256)
  },
})
