import { getHeader } from 'h3'
import { z } from 'zod'
import { refuse } from '#shared/errors'
import { givenFileName } from '../../../../domain/data/fileName'
import { attachFile } from '../../../../domain/disputes/attachFile'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { requestBody } from '../../../../utils/requestBody'
import { useFiles } from '../../../../utils/useImports'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'dispute:file',
  summary: 'Adds a file to a dispute. The body is the file\'s bytes; X-File-Name holds its name, percent-encoded',
  params: z.object({ disputeId: z.string() }),
  reply: z.object({ digest: z.string(), size: z.number().int() }),
  makes: true,
  raw: 'body',
  status: 201,
  handle: ({ actor, acting, params, request, now, event }) => {
    if (!actor || !acting || !request) return refuse('not_found')
    const length = getHeader(event, 'content-length')
    return attachFile(useStores(), useFiles(), {
      disputeId: params.disputeId, actorId: acting.actorId, name: givenFileName(getHeader(event, 'x-file-name')), body: requestBody(event),
      request: { key: request.key, route: request.route, personId: actor.personId, now }, ...(length === undefined ? {} : { expectedBytes: Number(length) }),
    }, now)
  },
})
