import { z } from 'zod'
import { refuse } from '#shared/errors'
import { coursePeople } from '#shared/schemas/departmentReplies'
import { listCoursePeople } from '../../../../domain/terms/listCoursePeople'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'course:people',
  summary: 'Who is in a course, by section; a TA sees the students of their own sections',
  params: z.object({ courseId: z.string() }),
  reply: coursePeople,
  handle: ({ acting, params, now }) => listCoursePeople(useStores().read, { courseId: params.courseId, acting: acting ?? refuse('not_found') }, now),
})
