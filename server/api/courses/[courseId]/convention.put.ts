import { z } from 'zod'
import { refuse } from '#shared/errors'
import { conventionChoice } from '#shared/schemas/convention'
import { chooseConvention } from '../../../domain/terms/courseConvention'
import { askedBy } from '../../../utils/askedBy'
import { defineApiHandler } from '../../../utils/defineApiHandler'
import { useStores } from '../../../utils/useStores'

export default defineApiHandler({
  action: 'course:chooseConvention',
  summary: 'Choose the convention of a course, or make its own; labs that are posted keep theirs',
  params: z.object({ courseId: z.string() }),
  body: conventionChoice,
  reply: z.object({ version: z.number().int() }),
  guards: true,
  handle: asked => chooseConvention(useStores(), { ...askedBy(asked), courseId: asked.params.courseId, seenVersion: asked.seenVersion ?? refuse('version_missing'), choice: asked.body }, asked.now),
})
