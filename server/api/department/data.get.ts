import { z } from 'zod'
import { dataCourse } from '#shared/schemas/departmentReplies'
import { listDataCourses } from '../../domain/data/listDataCourses'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'department:data',
  summary: 'The courses to which a technician brings loggers\' files',
  reply: z.object({ courses: z.array(dataCourse) }),
  handle: async () => ({ courses: await listDataCourses(useStores().read) }),
})
