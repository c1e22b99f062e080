import { z } from 'zod'
import { termDates } from '#shared/schemas/department'
import { createTerm } from '../../../domain/terms/createTerm'
import { askedBy } from '../../../utils/askedBy'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'department:terms',
  summary: 'Add a term with its zone, dates and teaching weeks',
  body: termDates,
  reply: z.object({ id: z.string() }),
  makes: true,
  status: 201,
  handle: asked => createTerm(useStores(), { ...askedBy(asked), term: asked.body }, asked.now),
})
