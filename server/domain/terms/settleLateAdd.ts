import { nextNumber } from '../../db/queries/counters'
import type { Trx } from '../../db/writer'
import { newId } from '../ids'
import { appendEntry, courseChain } from '../ledger/appendEntry'
import { applyAccommodations } from '../repairs/applyAccommodations'
import { movedByDays } from './wallClock'

/** What a late start meant: labs that are over and do not count until staff decide, and labs that run and got a personal due. */
export interface LateAdd {
  notCounted: { labId: string, title: string }[]
  personalDue: { labId: string, title: string, dueAt: number }[]
}

const dayLength = 86_400_000

/**
 * Settles a student's start in a section: labs past their due are not counted until staff decide, never a zero; for a lab that
 * runs, the due moves by as many days as the student missed of it, at the same time of day.
 */
export async function settleLateAdd(trx: Trx, { membershipId, courseId, sectionId, actorId }: { membershipId: string, courseId: string, sectionId: string, actorId: string }, now: number): Promise<LateAdd> {
  const open = await trx.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id')
    .select(['posting.id', 'posting.opens_at as opensAt', 'posting.due_at as dueAt', 'posting.zone', 'lab.id as labId', 'lab.title'])
    .where('posting.section_id', '=', sectionId).where('posting.state', '=', 'posted').where('lab.state', '=', 'posted').where('posting.opens_at', '<=', now).orderBy('posting.due_at').execute()
  const late: LateAdd = { notCounted: [], personalDue: [] }
  for (const posting of open) {
    if (posting.dueAt <= now) {
      if (await hasStandingOrWork(trx, membershipId, posting.labId)) continue
      await trx.insertInto('standing').values({ id: newId(now), membership_id: membershipId, lab_id: posting.labId, kind: 'not_counted', reason: 'late_add', by_actor_id: actorId, seq: await nextNumber(trx, 'standing') }).execute()
      late.notCounted.push({ labId: posting.labId, title: posting.title })
      continue
    }
    const missedDays = Math.floor((now - posting.opensAt) / dayLength)
    const allowed = await trx.selectFrom('allowance').select('id').where('posting_id', '=', posting.id).where('membership_id', '=', membershipId).executeTakeFirst()
    if (missedDays === 0 || allowed) continue
    const dueAt = movedByDays(posting.dueAt, missedDays, posting.zone)
    await trx.insertInto('allowance').values({ id: newId(now), posting_id: posting.id, membership_id: membershipId, due_at: dueAt, reason: 'late_add', by_actor_id: actorId, seq: await nextNumber(trx, 'allowance') }).execute()
    late.personalDue.push({ labId: posting.labId, title: posting.title, dueAt })
  }
  // Whoever comes back keeps the accommodation that they had.
  await applyAccommodations(trx, { membershipIds: [membershipId], actorId }, now)
  if (late.notCounted.length + late.personalDue.length > 0) {
    await appendEntry(trx, {
      chain: courseChain(courseId), at: now, actor: actorId, action: 'membership.late_add',
      facts: { membershipId, notCounted: late.notCounted.map(lab => lab.labId), personalDue: late.personalDue.map(({ labId, dueAt }) => ({ labId, dueAt })) },
    })
  }
  return late
}

async function hasStandingOrWork(trx: Trx, membershipId: string, labId: string): Promise<boolean> {
  const standing = await trx.selectFrom('standing').select('id').where('membership_id', '=', membershipId).where('lab_id', '=', labId).executeTakeFirst()
  if (standing) return true
  const handedIn = await trx.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id')
    .select('submission.id').where('holder_member.membership_id', '=', membershipId).where('share.lab_id', '=', labId).executeTakeFirst()
  return handedIn !== undefined
}
