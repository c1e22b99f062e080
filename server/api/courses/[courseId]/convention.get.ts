import { z } from 'zod'
import { courseConventionReply } from '#shared/schemas/convention'
import { readCourseConvention } from '../../../domain/terms/courseConvention'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'course:convention',
  summary: 'The convention that a course teaches with, and those that it could',
  params: z.object({ courseId: z.string() }),
  reply: courseConventionReply,
  handle: ({ params, acting }) => readCourseConvention(useStores().read, params.courseId, acting?.role === 'lead'),
})
