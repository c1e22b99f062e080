import { z } from 'zod'
import { dataSetLine } from '#shared/schemas/dataReplies'
import { listDataSets } from '../../../../domain/data/listDataSets'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'data:list',
  summary: 'Data sets that this course can use: its own and the department\'s',
  params: z.object({ courseId: z.string() }),
  reply: z.object({ dataSets: z.array(dataSetLine) }),
  handle: async ({ params }) => ({ dataSets: await listDataSets(useStores().read, params.courseId) }),
})
