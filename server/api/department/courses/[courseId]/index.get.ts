import { z } from 'zod'
import { courseRole, termState } from '#shared/schemas/department'
import { lateRule } from '#shared/schemas/lab'
import { describeCourse } from '../../../../domain/terms/describeCourse'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:courses',
  summary: 'One course: codes, late rule, sections, staff and students',
  params: z.object({ courseId: z.string() }),
  reply: z.object({
    id: z.string(), code: z.string(), title: z.string(), alsoListedAs: z.array(z.string()), lateRule, convention: z.string(), version: z.number().int(),
    term: z.object({ id: z.string(), name: z.string(), state: termState }),
    ancestor: z.object({ id: z.string(), term: z.string() }).nullable(),
    sections: z.array(z.object({ id: z.string(), name: z.string(), students: z.number().int() })),
    members: z.array(z.object({
      id: z.string(), personId: z.string().nullable(), name: z.string(), email: z.string(), role: courseRole, state: z.enum(['active', 'dropped', 'ended']), accountState: z.enum(['invited', 'active', 'closed', 'erased']),
      sectionIds: z.array(z.string()),
    })),
  }),
  handle: ({ params }) => describeCourse(useStores().read, params.courseId),
})
