import { refuse } from '#shared/errors'
import { lateRule } from '#shared/schemas/lab'
import type { Trx } from '../../db/writer'
import { closingOf } from '../submissions/lateness'
import { labOfStudent, type Student } from './studentOf'
import { writeRepair } from './writeRepair'

/** One more attempt for one student. Whoever has seen the worked value of their own data gets none: other data must be drawn first. */
export async function grantAttempt(trx: Trx, student: Student, input: { actorId: string, labId: string, reason: string }, now: number): Promise<string[]> {
  const lab = await labOfStudent(trx, student, input.labId)
  const share = await trx.selectFrom('holder_member').innerJoin('share', 'share.holder_id', 'holder_member.holder_id').select('share.id').where('holder_member.membership_id', '=', student.membershipId).where('share.lab_id', '=', lab.labId).orderBy('share.redraw', 'desc').limit(1).executeTakeFirst()
  const handedIn = share && await trx.selectFrom('submission').select('id').where('share_id', '=', share.id).limit(1).executeTakeFirst()
  if (handedIn && lab.releasedAt !== null && lab.releasedAt <= now) refuse('invalid', {}, [{ path: 'kind', message: 'Marks are released, so the worked values of these data are known. Draw other data for this student first.' }])
  await writeRepair(trx, { student, effect: { kind: 'attempt', lab_id: lab.labId }, labTitle: lab.title, reason: input.reason, actorId: input.actorId, action: 'attempt.granted', facts: { labId: lab.labId }, zone: lab.zone }, now)
  const closesAt = closingOf({ dueAt: lab.dueAt, allowedUntil: lab.allowedUntil, zone: lab.zone, lateRule: lateRule.parse(JSON.parse(lab.lateRuleJson)) })
  return closesAt !== null && closesAt < now ? ['The lab is closed for this student: give a later due time as well.'] : []
}
