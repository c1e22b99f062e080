import { z } from 'zod'
import { refuse } from '#shared/errors'
import { courseMarks } from '#shared/schemas/courseMarks'
import { marksTable } from '../../../domain/marking/marksTable'
import { myCourseMarks } from '../../../domain/marking/myCourseMarks'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'marks:course',
  summary: 'A student’s own labs with their totals, or the marks table of a section for its staff',
  params: z.object({ courseId: z.string() }),
  query: z.object({ section: z.string().optional() }),
  reply: courseMarks,
  handle: async ({ acting, params, query, now }) => {
    if (!acting) return refuse('not_found')
    const { read } = useStores()
    if (acting.role === 'student') return { kind: 'own' as const, ...await myCourseMarks(read, { courseId: params.courseId, membershipId: acting.actorId }, now) }
    const allowedSectionIds = acting.role === 'ta' ? acting.sectionIds : null
    return { kind: 'table' as const, table: await marksTable(read, { courseId: params.courseId, sectionId: query.section ?? null, allowedSectionIds }, now) }
  },
})
