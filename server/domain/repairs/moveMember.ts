import { refuse } from '#shared/errors'
import type { Trx } from '../../db/writer'
import { moveStudent } from '../terms/memberships'
import { wallTimeAt } from '../terms/wallClock'
import type { Student } from './studentOf'
import { writeRepair } from './writeRepair'

/** Moves a student to another section of the course, with a reason. Their data stay, and of both due times the later counts. */
export async function moveMember(trx: Trx, student: Student, input: { actorId: string, sectionId: string, reason: string }, now: number): Promise<string[]> {
  if (input.sectionId === student.sectionId) refuse('invalid', {}, [{ path: 'sectionId', message: 'They are in this section.' }])
  const moved = await moveStudent(trx, { membershipId: student.membershipId, sectionId: input.sectionId, actorId: input.actorId }, now)
  await writeRepair(trx, { student, effect: { kind: 'moved' }, labTitle: null, reason: input.reason, actorId: input.actorId, action: 'membership.moved_by_course', facts: { before: { sectionId: student.sectionId }, after: { sectionId: input.sectionId } }, zone: student.zone }, now)
  return [
    ...moved.keptDue.map(lab => `${lab.title} stays due ${wallTimeAt(lab.dueAt, student.zone).replace('T', ', ')}.`),
    ...moved.notPosted.map(lab => `${lab.title} is not posted to the new section.`),
  ]
}
