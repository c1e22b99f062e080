import { refuse } from '#shared/errors'
import { nextNumber } from '../../db/queries/counters'
import type { Trx } from '../../db/writer'
import { newId } from '../ids'
import { labOfStudent, type Student } from './studentOf'
import { writeRepair } from './writeRepair'

/** Says whether a lab counts for a student: excused leaves it out of what counts, not counted waits for staff, counted is as for everybody. */
export async function setStanding(trx: Trx, student: Student, input: { actorId: string, labId: string, kind: 'excused' | 'counted' | 'not_counted', reason: string }, now: number): Promise<string[]> {
  const lab = await labOfStudent(trx, student, input.labId)
  const before = await trx.selectFrom('standing').select('kind').where('membership_id', '=', student.membershipId).where('lab_id', '=', lab.labId).orderBy('seq', 'desc').limit(1).executeTakeFirst()
  if ((before?.kind ?? 'counted') === input.kind) refuse('invalid', {}, [{ path: 'kind', message: 'It stands so already.' }])
  await trx.insertInto('standing').values({ id: newId(now), membership_id: student.membershipId, lab_id: lab.labId, kind: input.kind, reason: 'decided', by_actor_id: input.actorId, seq: await nextNumber(trx, 'standing') }).execute()
  await writeRepair(trx, { student, effect: { kind: input.kind, lab_id: lab.labId }, labTitle: lab.title, reason: input.reason, actorId: input.actorId, action: 'standing.set', facts: { labId: lab.labId, before: before?.kind ?? 'counted', after: input.kind }, zone: lab.zone }, now)
  return []
}
