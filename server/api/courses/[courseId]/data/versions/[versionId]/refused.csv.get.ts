import { Readable } from 'node:stream'
import { z } from 'zod'
import { refusedRowsCsv } from '../../../../../../domain/data/refusedRows'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { asDownload } from '../../../../../../utils/download'
import { useObservations } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:read',
  summary: 'All rows that were not taken, as CSV',
  params: z.object({ courseId: z.string(), versionId: z.string() }),
  reply: z.unknown(),
  raw: 'answer',
  handle: ({ params, event }) => {
    asDownload(event, { name: 'refused-rows.csv', type: 'text/csv; charset=utf-8' })
    return Readable.from(refusedRowsCsv(useStores().read, useObservations(), params.versionId))
  },
})
