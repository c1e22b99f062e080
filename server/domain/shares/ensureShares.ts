import type { Trx } from '../../db/writer'
import { currentDraw, giveShares } from './draws'

/**
 * Gives a student a share in every lab that is posted to their section and has none for them yet: called at enrolment, at a change of section,
 * and when a student opens a lab. A late one gets the next ordinal at once and moves nobody; a share once given stays.
 */
export async function ensureShares(trx: Trx, membershipId: string, now: number): Promise<number> {
  const labs = await trx.selectFrom('posting').innerJoin('membership', 'membership.section_id', 'posting.section_id').select('posting.lab_id as labId')
    .where('membership.id', '=', membershipId).where('membership.role', '=', 'student').where('membership.state', '=', 'active').where('posting.state', '=', 'posted')
    .where(eb => eb.not(eb.exists(eb.selectFrom('holder_member').select('holder_member.lab_id')
      .whereRef('holder_member.lab_id', '=', 'posting.lab_id').whereRef('holder_member.membership_id', '=', 'membership.id')))).orderBy('posting.lab_id').execute()
  let given = 0
  for (const { labId } of labs) {
    const draw = await currentDraw(trx, labId)
    if (draw) given += await giveShares(trx, draw, [membershipId], now)
  }
  return given
}
