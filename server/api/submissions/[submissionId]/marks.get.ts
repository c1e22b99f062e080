import { z } from 'zod'
import { refuse } from '#shared/errors'
import { submissionMarks as reply } from '#shared/schemas/marks'
import { submissionMarks } from '../../../domain/marking/submissionMarks'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'marks:read',
  summary: 'The marks of a submission with bands, worked values, slips and history; for its student once they are released',
  params: z.object({ submissionId: z.string() }),
  reply,
  handle: ({ acting, params }) => {
    if (!acting) return refuse('not_found')
    return submissionMarks(useStores().read, { isStaff: acting.role !== 'student', membershipId: acting.actorId }, params.submissionId)
  },
})
