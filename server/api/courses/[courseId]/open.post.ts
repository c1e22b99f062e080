import { z } from 'zod'
import { openCourse } from '../../../domain/terms/openCourse'
import { askedBy } from '../../../utils/askedBy'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'course:open',
  summary: 'Open a course to its students: until then a course that came along from an earlier term is a draft that only staff see',
  params: z.object({ courseId: z.string() }),
  body: z.object({}),
  reply: z.object({ state: z.literal('open') }),
  makes: true,
  handle: asked => openCourse(useStores(), { ...askedBy(asked), courseId: asked.params.courseId }, asked.now),
})
