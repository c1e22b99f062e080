import { z } from 'zod'
import { dataSetLine } from '#shared/schemas/dataReplies'
import { dataCourse } from '#shared/schemas/departmentReplies'
import { listDataCourses } from '../../domain/data/listDataCourses'
import { listDataSets } from '../../domain/data/listDataSets'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'department:data',
  summary: 'The department\'s data sets, and the courses to which a technician brings loggers\' files',
  reply: z.object({ dataSets: z.array(dataSetLine), courses: z.array(dataCourse) }),
  handle: async () => ({ dataSets: await listDataSets(useStores().read, null), courses: await listDataCourses(useStores().read) }),
})
