import { nextNumber } from '../../db/queries/counters'
import type { Trx } from '../../db/writer'
import { newId } from '../ids'
import { movedByDays } from '../terms/wallClock'

/**
 * Gives students with an accommodation their due times in the postings of their section that are not over: the section's due moved by their days, at the same
 * time on the wall. Called when an accommodation is set, when a lab is posted and when a student comes into a section; what they have already is not given twice.
 */
export async function applyAccommodations(trx: Trx, { membershipIds, actorId }: { membershipIds: readonly string[], actorId: string }, now: number): Promise<{ labId: string, title: string, dueAt: number }[]> {
  const days = await accommodationsOf(trx, membershipIds)
  const given: { labId: string, title: string, dueAt: number }[] = []
  for (const [membershipId, extraDays] of days) {
    if (extraDays === 0) continue
    const postings = await trx.selectFrom('membership').innerJoin('posting', 'posting.section_id', 'membership.section_id').innerJoin('lab', 'lab.id', 'posting.lab_id')
      .select(eb => ['posting.id', 'posting.due_at as dueAt', 'posting.zone', 'lab.id as labId', 'lab.title',
        eb.selectFrom('allowance').select(inner => inner.fn.max('allowance.due_at').as('until')).whereRef('allowance.posting_id', '=', 'posting.id').whereRef('allowance.membership_id', '=', 'membership.id').as('allowedUntil')])
      .where('membership.id', '=', membershipId).where('membership.state', '=', 'active').where('posting.state', '=', 'posted').where('lab.state', '=', 'posted').orderBy('posting.due_at').execute()
    for (const posting of postings) {
      const own = Math.max(posting.dueAt, posting.allowedUntil ?? 0)
      const dueAt = movedByDays(posting.dueAt, extraDays, posting.zone)
      if (own < now || dueAt <= own) continue
      await trx.insertInto('allowance').values({ id: newId(now), posting_id: posting.id, membership_id: membershipId, due_at: dueAt, reason: 'accommodation', by_actor_id: actorId, seq: await nextNumber(trx, 'allowance') }).execute()
      given.push({ labId: posting.labId, title: posting.title, dueAt })
    }
  }
  return given
}

/** Days that are in force for each student who has an accommodation: those set last. */
export async function accommodationsOf(trx: Pick<Trx, 'selectFrom'>, membershipIds: readonly string[]): Promise<Map<string, number>> {
  if (membershipIds.length === 0) return new Map()
  const rows = await trx.selectFrom('repair').select(['membership_id', 'extra_days']).where('kind', '=', 'accommodation').where('membership_id', 'in', [...membershipIds]).orderBy('seq').execute()
  return new Map(rows.map(row => [row.membership_id, row.extra_days ?? 0]))
}
