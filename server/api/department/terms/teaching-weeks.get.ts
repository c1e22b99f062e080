import { z } from 'zod'
import { localDate } from '#shared/schemas/calendar'
import { teachingWeeksBetween } from '../../../domain/terms/calendar'
import { defineApiHandler } from '../../../utils/defineApiHandler'

export default defineApiHandler({
  action: 'department:terms',
  summary: 'Teaching weeks between two dates, before holidays are taken out',
  query: z.object({ startsOn: localDate, endsOn: localDate }).refine(dates => Date.parse(dates.endsOn) - Date.parse(dates.startsOn) < 400 * 86_400_000, { path: ['endsOn'], message: 'A term is shorter than 400 days.' }),
  reply: z.object({ weeks: z.array(z.string()) }),
  handle: ({ query }) => ({ weeks: teachingWeeksBetween(query.startsOn, query.endsOn, []) }),
})
