import { soFarOf } from '#shared/marking/soFar'
import type { MyLabMarks } from '#shared/schemas/marks'
import type { RepairEntry, SoFar } from '#shared/schemas/repairs'
import type { Read } from '../../db/writer'
import { repairsOf } from '../repairs/repairsOf'
import { myMarks } from './myMarks'

/** A student's marks of a course: their labs, what counts so far, and what staff did for them and why. */
export async function myCourseMarks(read: Read, who: { courseId: string, membershipId: string }, now: number): Promise<{ labs: MyLabMarks[], repairs: RepairEntry[], soFar: SoFar }> {
  const labs = await myMarks(read, who, now)
  return { labs, repairs: await repairsOf(read, who.membershipId), soFar: soFarOf(labs) }
}
