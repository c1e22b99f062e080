import { z } from 'zod'
import { termCalendar } from '#shared/schemas/calendar'
import { termState } from '#shared/schemas/department'
import { describeTerm } from '../../../../domain/terms/describeTerm'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:terms',
  summary: 'One term: its calendar and its courses',
  params: z.object({ termId: z.string() }),
  reply: z.object({
    id: z.string(), name: z.string(), zone: z.string(), startsOn: z.string(), endsOn: z.string(), state: termState, calendar: termCalendar,
    from: z.object({ id: z.string(), name: z.string() }).nullable(),
    courses: z.array(z.object({
      id: z.string(), code: z.string(), title: z.string(), state: z.enum(['draft', 'open', 'settled', 'closed']), alsoListedAs: z.array(z.string()), sections: z.array(z.string()),
      students: z.number().int(), staff: z.number().int(), labs: z.number().int(),
    })),
  }),
  handle: ({ params }) => describeTerm(useStores().read, params.termId),
})
