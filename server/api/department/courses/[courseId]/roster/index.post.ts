import { z } from 'zod'
import { rosterCarriedOut } from '#shared/schemas/department'
import { rosterDone } from '#shared/schemas/departmentReplies'
import { carryOutRoster } from '../../../../../domain/people/roster/carryOutRoster'
import { readRoster } from '../../../../../domain/people/roster/readRoster'
import { askedBy } from '../../../../../utils/askedBy'
import { defineApiHandler } from '../../../../../utils/defineApiHandler'
import { useStores } from '../../../../../utils/useStores'

export default defineApiHandler({
  action: 'department:roster',
  summary: 'Carry out a roster as its preview said: all of it or nothing',
  params: z.object({ courseId: z.string() }),
  body: rosterCarriedOut,
  reply: rosterDone,
  makes: true,
  status: 201,
  handle: asked => carryOutRoster(useStores(), { ...askedBy(asked), courseId: asked.params.courseId, roster: readRoster(asked.body), choices: asked.body.choices, digest: asked.body.digest }, asked.now),
})
