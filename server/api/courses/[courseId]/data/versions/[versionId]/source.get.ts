import { z } from 'zod'
import { sourceBytes } from '../../../../../../domain/data/sourceBytes'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { asDownload } from '../../../../../../utils/download'
import { useFiles } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:source',
  summary: 'The source file, byte for byte',
  params: z.object({ courseId: z.string(), versionId: z.string() }),
  query: z.object({ ordinal: z.coerce.number().int().min(1).max(1000).default(1) }),
  reply: z.unknown(),
  raw: 'answer',
  handle: async ({ params, query, event }) => {
    const source = await sourceBytes(useStores().read, useFiles(), { versionId: params.versionId, ordinal: query.ordinal })
    asDownload(event, { name: source.name, type: 'application/octet-stream', size: source.size })
    return source.stream
  },
})
