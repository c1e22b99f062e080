import type { MyLabMarks } from '#shared/schemas/marks'
import type { Read } from '../../db/writer'
import { workList } from '../submissions/workList'
import { attemptsOfShares } from './attemptsOf'
import { labTotal } from './labTotal'

/** A student's labs with their totals; a total is null until marks are released, and where nothing counts. */
export async function myMarks(read: Read, who: { courseId: string, membershipId: string }, now: number): Promise<MyLabMarks[]> {
  const labs = await workList(read, who, now)
  const released = new Map((await read.selectFrom('posting').select(['id', 'released_at']).where('id', 'in', [...labs.map(lab => lab.postingId), '']).execute()).map(row => [row.id, row.released_at]))
  const attempts = await attemptsOfShares(read, labs.flatMap(lab => lab.shareId ?? []))
  return labs.map((lab) => {
    const made = lab.shareId === null ? [] : attempts.get(lab.shareId) ?? []
    const releasedAt = released.get(lab.postingId) ?? null
    const counts = labTotal(made, lab.keep)
    const shown = releasedAt === null ? made.at(-1) : made.find(attempt => attempt.submissionId === counts?.submissionId)
    const isShown = releasedAt !== null && counts !== null && lab.standing === 'released'
    return {
      labId: lab.labId, title: lab.title, standing: lab.standing, dueAt: lab.dueAt, zone: lab.zone, releasedAt: releasedAt === null ? null : new Date(releasedAt).toISOString(),
      submissionId: shown?.submissionId ?? null, attempt: shown?.attempt ?? null, submittedAt: shown ? new Date(shown.receivedAt).toISOString() : null, lateDays: shown?.lateUnits ?? null,
      totalMilli: isShown ? counts.totalMilli : null, earnedMilli: isShown ? counts.earnedMilli : null, maxMilli: lab.maxMilli,
    }
  })
}
