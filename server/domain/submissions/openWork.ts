import type { WorkListEntry } from '#shared/schemas/work'
import type { Stores } from '../../db/writer'
import { ensureShares } from '../shares/ensureShares'
import { workList } from './workList'

/** A student's labs. Whoever joined late has no share of an open lab yet and gets one here, at once. */
export async function openWork({ read, write }: Stores, who: { courseId: string, membershipId: string }, now: number): Promise<WorkListEntry[]> {
  const labs = await workList(read, who, now)
  if (labs.every(lab => lab.shareId !== null || lab.standing === 'withdrawn')) return labs
  const given = await write(trx => ensureShares(trx, who.membershipId, now))
  return given === 0 ? labs : workList(read, who, now)
}
