import { refuse } from '#shared/errors'
import { nextNumber } from '../../db/queries/counters'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { newId } from '../ids'
import { appendEntry, courseChain, keepPrivateText } from '../ledger/appendEntry'
import { endOfMinute, resolveWallTime, tellShift } from './wallClock'

/**
 * Gives one student a later due in one posting. It never takes time away: the latest of section, extension and accommodation counts.
 * The reason is about a person, so the ledger keeps its digest and the text stands where it can be erased.
 */
export function grantAllowance({ write }: Stores, input: Asked & { postingId: string, membershipId: string, dueLocal: string, reason: string }, now: number): Promise<{ dueAt: number, told: string | null }> {
  return write(trx => doOnce(trx, input, async () => {
    const posting = await trx.selectFrom('posting').innerJoin('section', 'section.id', 'posting.section_id').select(['posting.id', 'posting.section_id', 'posting.zone', 'posting.due_at', 'posting.lab_id', 'section.course_id']).where('posting.id', '=', input.postingId).executeTakeFirst()
    if (!posting) return refuse('not_found')
    const member = await trx.selectFrom('membership').select(['id', 'section_id']).where('id', '=', input.membershipId).where('course_id', '=', posting.course_id).where('state', '=', 'active').executeTakeFirst()
    if (!member || member.section_id !== posting.section_id) return refuse('invalid', {}, [{ path: 'membershipId', message: 'Not a student of this section.' }])
    const due = resolveWallTime(input.dueLocal, posting.zone)
    const dueAt = endOfMinute(due.at)
    if (dueAt <= posting.due_at) refuse('dates_invalid', { reason: 'An extension ends after the section’s own due.' }, [{ path: 'dueLocal', message: 'Choose a time after the section’s own due.' }])
    const privateDigest = await keepPrivateText(trx, member.id, input.reason)
    await trx.insertInto('allowance').values({ id: newId(now), posting_id: posting.id, membership_id: member.id, due_at: dueAt, reason: 'extension', by_actor_id: input.actorId, seq: await nextNumber(trx, 'allowance') }).execute()
    await appendEntry(trx, {
      chain: courseChain(posting.course_id), at: now, actor: input.actorId, action: 'allowance.granted',
      facts: { postingId: posting.id, labId: posting.lab_id, membershipId: member.id, dueAt }, privateDigest,
    })
    return { dueAt, told: tellShift(due, input.dueLocal) }
  }))
}
