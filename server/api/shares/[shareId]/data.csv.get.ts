import { setResponseHeader } from 'h3'
import { z } from 'zod'
import { loadShare } from '../../../domain/shares/loadShare'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { asDownload } from '../../../utils/download'
import { useObservations } from '../../../utils/useImports'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'share:data',
  summary: 'A share as a CSV file: a head of comment lines, names with units, the rows and which of them to use',
  params: z.object({ shareId: z.string() }),
  reply: z.string(),
  raw: 'answer',
  handle: async ({ params, event }) => {
    const { csv, share } = await loadShare(useStores().read, useObservations(), params.shareId)
    asDownload(event, { name: `share-${share.ordinal + 1}.csv`, type: 'text/csv; charset=utf-8' })
    setResponseHeader(event, 'X-Served-SHA256', share.servedSha256)
    return csv
  },
})
