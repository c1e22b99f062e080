import { z } from 'zod'
import { refuse } from '#shared/errors'
import { importBody } from '#shared/schemas/dataReplies'
import { startImport } from '../../../../../../domain/data/startImport'
import { defineApiHandler } from '../../../../../../utils/defineApiHandler'
import { useImports } from '../../../../../../utils/useImports'
import { useStores } from '../../../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:import',
  summary: 'Imports an uploaded file by a recipe, in the background',
  params: z.object({ courseId: z.string(), uploadId: z.string() }),
  body: importBody,
  reply: z.object({ jobId: z.string() }),
  makes: true,
  status: 202,
  handle: async ({ actor, acting, params, body, request, now }) => {
    const started = await startImport(useStores(), {
      acting: acting ?? refuse('not_signed_in'), personId: actor?.personId ?? refuse('not_signed_in'), courseId: params.courseId, uploadId: params.uploadId,
      recipe: body.recipe, forDepartment: body.forDepartment, request: request ?? refuse('request_key_missing'),
    }, now)
    void useImports().enqueue(started.jobId)
    return started
  },
})
