import { refuse } from '#shared/errors'
import type { Trx } from '../../db/writer'
import { accommodationsOf, applyAccommodations } from './applyAccommodations'
import type { Student } from './studentOf'
import { writeRepair } from './writeRepair'

/**
 * Sets how many days later a student's due times fall from now on. The effect is all that is stored: no ground is asked for. Fewer days take nothing away that
 * was given; they hold for what is posted later.
 */
export async function accommodate(trx: Trx, student: Student, input: { actorId: string, extraDays: number }, now: number): Promise<string[]> {
  const before = (await accommodationsOf(trx, [student.membershipId])).get(student.membershipId) ?? 0
  if (before === input.extraDays) refuse('invalid', {}, [{ path: 'extraDays', message: before === 0 ? 'There is no accommodation to end.' : `${before} days are in force already.` }])
  await writeRepair(trx, { student, effect: { kind: 'accommodation', extra_days: input.extraDays }, labTitle: null, reason: null, actorId: input.actorId, action: 'accommodation.set', facts: { before, after: input.extraDays }, zone: student.zone }, now)
  const moved = await applyAccommodations(trx, { membershipIds: [student.membershipId], actorId: input.actorId }, now)
  return moved.length === 0 ? ['No due time that is still to come has changed.'] : [`Later due times in: ${moved.map(lab => lab.title).join(', ')}.`]
}
