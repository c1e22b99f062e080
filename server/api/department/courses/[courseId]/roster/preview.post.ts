import { z } from 'zod'
import { rosterAsked, rosterPreview } from '#shared/schemas/department'
import { previewRoster } from '../../../../../domain/people/roster/previewRoster'
import { defineApiHandler } from '../../../../../utils/defineApiHandler'
import { useStores } from '../../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:roster',
  summary: 'What a roster file would add, change and leave in a course; writes nothing',
  params: z.object({ courseId: z.string() }),
  body: rosterAsked,
  reply: rosterPreview,
  handle: ({ params, body }) => previewRoster(useStores().read, { courseId: params.courseId, ...body }),
})
