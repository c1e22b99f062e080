import { refuse } from '#shared/errors'
import { lateRule } from '#shared/schemas/lab'
import { nextNumber } from '../../db/queries/counters'
import type { Trx } from '../../db/writer'
import { newId } from '../ids'
import { endOfMinute, resolveWallTime, tellShift } from '../terms/wallClock'
import { acceptedAs } from './acceptedAs'
import { lateWorkOf } from './lateWorkOf'
import { labOfStudent, type Student } from './studentOf'
import { writeRepair } from './writeRepair'

/**
 * Gives a student a later due time for one lab. It never takes time away: the latest of section, extension and accommodation counts.
 * Work that is in already keeps the lateness decided at receipt until staff count it from the new due: whoever extends is told so.
 */
export async function extendDue(trx: Trx, student: Student, input: { actorId: string, labId: string, dueLocal: string, reason: string }, now: number): Promise<{ dueAt: number, told: string[] }> {
  const lab = await labOfStudent(trx, student, input.labId)
  const due = resolveWallTime(input.dueLocal, lab.zone)
  const dueAt = endOfMinute(due.at)
  if (dueAt <= Math.max(lab.dueAt, lab.allowedUntil ?? 0)) refuse('dates_invalid', { reason: 'An extension ends after the due time that the student has already.' }, [{ path: 'dueLocal', message: 'Choose a time after the one that they have already.' }])
  await trx.insertInto('allowance').values({ id: newId(now), posting_id: lab.postingId, membership_id: student.membershipId, due_at: dueAt, reason: 'extension', by_actor_id: input.actorId, seq: await nextNumber(trx, 'allowance') }).execute()
  await writeRepair(trx, {
    student, effect: { kind: 'extension', lab_id: lab.labId, due_at: dueAt }, labTitle: lab.title, reason: input.reason, actorId: input.actorId, action: 'allowance.granted',
    facts: { postingId: lab.postingId, labId: lab.labId, dueAt }, zone: lab.zone,
  }, now)
  const shift = tellShift(due, input.dueLocal)
  const keepsLateness = (await lateWorkOf(trx, student.membershipId, { labId: lab.labId })).some(late => !late.isAccepted && acceptedAs('due', late, lateRule.parse(JSON.parse(late.lateRuleJson)), late.zone) !== null)
  return { dueAt, told: [...shift === null ? [] : [shift], ...keepsLateness ? ['Work that is in already keeps its lateness until you count it from the new due, under Late work on the student’s page.'] : []] }
}
