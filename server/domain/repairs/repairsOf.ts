import type { RepairEntry } from '#shared/schemas/repairs'
import type { Read } from '../../db/writer'
import { actorName } from '../disputes/rulers'
import { erasedText, readPrivateTexts } from '../ledger/readPrivateTexts'

/** What staff did for a student, the newest first: when, who and why. The student reads the same as staff. */
export async function repairsOf(read: Read, membershipId: string): Promise<RepairEntry[]> {
  const rows = await read.selectFrom('repair').innerJoin('membership', 'membership.id', 'repair.membership_id').innerJoin('course', 'course.id', 'membership.course_id').innerJoin('term', 'term.id', 'course.term_id').leftJoin('lab', 'lab.id', 'repair.lab_id')
    .select(['repair.id', 'repair.at', 'repair.kind', 'repair.due_at', 'repair.extra_days', 'repair.late_units', 'repair.reason_digest', 'repair.by_actor_id', 'lab.title', 'term.zone'])
    .where('repair.membership_id', '=', membershipId).orderBy('repair.seq', 'desc').execute()
  const reasons = await readPrivateTexts(read, rows.flatMap(row => row.reason_digest ?? []))
  const names = new Map<string, string>()
  for (const { by_actor_id: actorId } of rows) if (!names.has(actorId)) names.set(actorId, await actorName(read, actorId))
  return rows.map(row => ({
    id: row.id, at: new Date(row.at).toISOString(), zone: row.zone, kind: row.kind, labTitle: row.title, dueAt: row.due_at === null ? null : new Date(row.due_at).toISOString(), extraDays: row.extra_days, lateDays: row.late_units,
    reason: row.reason_digest === null ? null : reasons.get(row.reason_digest) ?? erasedText, by: names.get(row.by_actor_id) ?? '',
  }))
}
