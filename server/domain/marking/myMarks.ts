import type { MyLabMarks } from '#shared/schemas/marks'
import type { Read } from '../../db/writer'
import { workList } from '../submissions/workList'
import { attemptsOfShares } from './attemptsOf'
import { labTotal } from './labTotal'

/** A student's labs with their totals; a total is null until marks are released (or told at once), and where nothing counts. */
export async function myMarks(read: Read, who: { courseId: string, membershipId: string }, now: number): Promise<MyLabMarks[]> {
  const labs = await workList(read, who, now)
  const postings = new Map((await read.selectFrom('posting').select(['id', 'released_at', 'feedback']).where('id', 'in', [...labs.map(lab => lab.postingId), '']).execute()).map(row => [row.id, row]))
  const attempts = await attemptsOfShares(read, labs.flatMap(lab => lab.shareId ?? []))
  return labs.map((lab) => {
    const made = lab.shareId === null ? [] : attempts.get(lab.shareId) ?? []
    const posting = postings.get(lab.postingId)
    const releasedAt = posting?.released_at ?? null
    const counts = labTotal(made, lab.keep)
    const shown = releasedAt === null && posting?.feedback !== 'at_once' ? made.at(-1) : made.find(attempt => attempt.submissionId === counts?.submissionId)
    const isShown = counts !== null && (lab.standing === 'released' || (lab.standing === 'submitted' && posting?.feedback === 'at_once'))
    return {
      labId: lab.labId, title: lab.title, standing: lab.standing, dueAt: lab.dueAt, zone: lab.zone, releasedAt: releasedAt === null ? null : new Date(releasedAt).toISOString(),
      submissionId: shown?.submissionId ?? null, attempt: shown?.attempt ?? null, submittedAt: shown ? new Date(shown.receivedAt).toISOString() : null, lateDays: shown?.lateUnits ?? null,
      totalMilli: isShown ? counts.totalMilli : null, earnedMilli: isShown ? counts.earnedMilli : null, maxMilli: lab.maxMilli,
    }
  })
}
