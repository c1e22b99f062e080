import { z } from 'zod'
import { refuse } from '#shared/errors'
import { courseRole } from '#shared/schemas/department'
import { listCoursePeople } from '../../../domain/terms/listCoursePeople'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'course:people',
  summary: 'Who is in a course, by section; a TA sees the students of their own sections',
  params: z.object({ courseId: z.string() }),
  reply: z.object({
    course: z.object({ code: z.string(), title: z.string(), alsoListedAs: z.array(z.string()), term: z.string(), zone: z.string() }),
    mayGrant: z.boolean(),
    staff: z.array(z.object({ id: z.string(), name: z.string(), email: z.string(), role: courseRole, sections: z.array(z.string()) })),
    sections: z.array(z.object({
      id: z.string(), name: z.string(),
      students: z.array(z.object({ id: z.string(), name: z.string(), email: z.string(), accountState: z.enum(['invited', 'active', 'closed', 'erased']), notCounted: z.number().int() })),
      postings: z.array(z.object({ id: z.string(), title: z.string(), dueLocal: z.string() })),
    })),
    allowances: z.array(z.object({ membershipId: z.string(), postingId: z.string(), title: z.string(), dueLocal: z.string(), kind: z.string() })),
  }),
  handle: ({ acting, params, now }) => listCoursePeople(useStores().read, { courseId: params.courseId, acting: acting ?? refuse('not_found') }, now),
})
