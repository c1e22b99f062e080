import { z } from 'zod'
import { refuse } from '#shared/errors'
import { termDates } from '#shared/schemas/department'
import { editTerm } from '../../../../domain/terms/editTerm'
import { askedBy } from '../../../../utils/askedBy'
import { defineApiHandler } from '../../../../utils/defineApiHandler'
import { useStores } from '../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:terms',
  summary: 'Change a term’s name, dates and teaching weeks',
  params: z.object({ termId: z.string() }),
  body: termDates,
  reply: z.object({ id: z.string(), version: z.number().int() }),
  guards: true,
  handle: asked => editTerm(useStores(), { ...askedBy(asked), termId: asked.params.termId, seenVersion: asked.seenVersion ?? refuse('version_missing'), term: asked.body }, asked.now),
})
