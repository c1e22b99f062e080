import { z } from 'zod'
import { courseDraft } from '#shared/schemas/department'
import { createCourse } from '../../../domain/terms/courses'
import { askedBy } from '../../../utils/askedBy'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'department:courses',
  summary: 'Add a course with its codes, sections and first lead',
  body: courseDraft,
  reply: z.object({ id: z.string(), sections: z.array(z.object({ id: z.string(), name: z.string() })) }),
  makes: true,
  status: 201,
  handle: asked => createCourse(useStores(), { ...askedBy(asked), course: asked.body }, asked.now),
})
