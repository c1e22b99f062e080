import { getHeader } from 'h3'
import { z } from 'zod'
import { refuse } from '#shared/errors'
import { uploadReply } from '#shared/schemas/dataReplies'
import { acceptUpload } from '../../../../../domain/data/acceptUpload'
import { givenFileName } from '../../../../../domain/data/fileName'
import { defineApiHandler } from '../../../../../utils/defineApiHandler'
import { requestBody } from '../../../../../utils/requestBody'
import { useFiles } from '../../../../../utils/useImports'
import { useStores } from '../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:upload',
  summary: 'Takes a logger\'s file. The body is the file\'s bytes; X-File-Name holds its name, percent-encoded',
  params: z.object({ courseId: z.string() }),
  reply: uploadReply,
  makes: true,
  raw: 'body',
  status: 201,
  handle: async ({ actor, acting, params, request, now, event }) => {
    const length = getHeader(event, 'content-length')
    const upload = await acceptUpload(useStores(), useFiles(), {
      courseId: params.courseId, actorId: acting?.actorId ?? refuse('not_signed_in'), personId: actor?.personId ?? refuse('not_signed_in'),
      name: givenFileName(getHeader(event, 'x-file-name')), body: requestBody(event), request: request ?? refuse('request_key_missing'),
      ...(length === undefined ? {} : { expectedBytes: Number(length) }),
    }, now)
    return { ...upload, at: new Date(upload.at).toISOString() }
  },
})
