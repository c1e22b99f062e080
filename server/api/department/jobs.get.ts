import { jobPage } from '#shared/schemas/machinery'
import { listJobs } from '../../domain/jobs/listJobs'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'department:jobs',
  summary: 'Background work: what runs, waits and failed',
  reply: jobPage,
  handle: () => listJobs(useStores().read),
})
