import { z } from 'zod'
import { refuse } from '#shared/errors'
import { courseEdit } from '#shared/schemas/department'
import { editCourse } from '../../../../domain/terms/courses'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:courses',
  summary: 'Change a course’s codes, title and late rule',
  params: z.object({ courseId: z.string() }),
  body: courseEdit,
  reply: z.object({ version: z.number().int() }),
  guards: true,
  handle: asked => editCourse(useStores(), { ...askedBy(asked), courseId: asked.params.courseId, seenVersion: asked.seenVersion ?? refuse('version_missing'), course: asked.body }, asked.now),
})
