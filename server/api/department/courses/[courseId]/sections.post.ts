import { z } from 'zod'
import { sectionName } from '#shared/schemas/department'
import { createSection } from '../../../../domain/terms/courses'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:courses',
  summary: 'Add a section to a course',
  params: z.object({ courseId: z.string() }),
  body: z.object({ name: sectionName }),
  reply: z.object({ id: z.string() }),
  makes: true,
  status: 201,
  handle: asked => createSection(useStores(), { ...askedBy(asked), courseId: asked.params.courseId, name: asked.body.name }, asked.now),
})
