import { refuse } from '#shared/errors'
import type { ReadBack } from '#shared/schemas/work'
import { stepsOfBody } from '../marking/markedStep'
import { readTyped } from '../marking/readTyped'
import type { Read } from '../../db/writer'
import { postedGround, readGround } from './ground'

/**
 * How a typed value is read, told while typing: "read as −9.6 K km⁻¹", or what is wrong and what is asked.
 * It rests on the step's unit alone and says nothing of what is right.
 */
export async function checkTyped(read: Read, who: { membershipId: string, shareId: string }, given: { stepKey: string, typed: string }, now: number): Promise<ReadBack> {
  const ground = postedGround(await readGround(read, who.shareId, who.membershipId), now)
  const revision = await read.selectFrom('lab_revision').select('body_json').where('id', '=', ground.labRevisionId).executeTakeFirstOrThrow()
  const step = stepsOfBody(revision.body_json).find(each => each.key === given.stepKey)
  if (!step) return refuse('not_found')
  const { reading, message } = readTyped(step, given.typed)
  return { reading, message }
}
