import { z } from 'zod'
import { courseDescription } from '#shared/schemas/departmentReplies'
import { describeCourse } from '../../../../domain/terms/describeCourse'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:courses',
  summary: 'One course: codes, late rule, sections, staff and students',
  params: z.object({ courseId: z.string() }),
  reply: courseDescription,
  handle: ({ params }) => describeCourse(useStores().read, params.courseId),
})
