import { refuse } from '#shared/errors'
import type { RosterChoices } from '#shared/schemas/department'
import type { Stores } from '../../../db/writer'
import { doOnce, type Asked } from '../../asked'
import { appendEntry, courseChain } from '../../ledger/appendEntry'
import { insertSection } from '../../terms/courses'
import { startMembership } from '../../terms/enrol'
import { leaveCourse, moveStudent } from '../../terms/memberships'
import { addInvited } from '../invitePerson'
import { planRoster } from './planRoster'
import type { ReadRoster } from './readRoster'

export interface CarriedOutRoster { added: number, invited: number, moved: number, ended: number, same: number, left: number, refused: number }

/**
 * Does what a plan that was read says, all of it or nothing. The plan is made anew inside the unit of work:
 * if it comes out otherwise than the one that was read, nothing is done.
 * @throws {DomainError} `plan_changed`
 */
export function carryOutRoster({ write }: Stores, input: Asked & { courseId: string, roster: ReadRoster, choices: RosterChoices, digest: string }, now: number): Promise<CarriedOutRoster> {
  return write(trx => doOnce(trx, input, async () => {
    const plan = await planRoster(trx, input)
    if (plan.digest !== input.digest) refuse('plan_changed')
    for (const name of plan.newSections) await insertSection(trx, input.courseId, name, now)
    const sections = await trx.selectFrom('section').select(['id', 'name']).where('course_id', '=', input.courseId).execute()
    const idOf = (name: string) => sections.find(section => section.name === name)?.id ?? refuse('plan_changed')
    const added: string[] = []
    for (const add of plan.adds) {
      const known = await trx.selectFrom('person').select('id').where('email_norm', '=', add.email).executeTakeFirst()
      const personId = known?.id ?? await addInvited(trx, add, now)
      const { id } = await startMembership(trx, { courseId: input.courseId, personId, role: 'student', sectionId: idOf(add.section), sectionIds: [] }, input.actorId, now)
      added.push(id)
    }
    for (const move of plan.moves) await moveStudent(trx, { membershipId: move.membershipId, sectionId: idOf(move.to), actorId: input.actorId }, now)
    const ending = plan.absent.filter(member => member.ends)
    for (const member of ending) await leaveCourse(trx, { membershipId: member.membershipId, actorId: input.actorId }, now)
    const done = {
      added: plan.adds.length, invited: plan.adds.filter(add => add.isNew).length, moved: plan.moves.length, ended: ending.length,
      same: plan.same, left: plan.absent.length - ending.length, refused: plan.refused.length,
    }
    await appendEntry(trx, {
      chain: courseChain(input.courseId), at: now, actor: input.actorId, action: 'roster.carried_out',
      facts: { plan: plan.digest, ...done, addedIds: added, movedIds: plan.moves.map(move => move.membershipId), endedIds: ending.map(member => member.membershipId), newSections: plan.newSections.map(idOf) },
    })
    return done
  }))
}
