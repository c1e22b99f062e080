import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { extendDue } from '../repairs/extendDue'
import { studentOf } from '../repairs/studentOf'

/** Gives one student of a posting's section a later due time in it, with a reason. */
export function grantAllowance({ write }: Stores, input: Asked & { postingId: string, membershipId: string, dueLocal: string, reason: string }, now: number): Promise<{ dueAt: number, told: string | null }> {
  return write(trx => doOnce(trx, input, async () => {
    const posting = await trx.selectFrom('posting').innerJoin('section', 'section.id', 'posting.section_id').select(['posting.section_id as sectionId', 'posting.lab_id as labId', 'section.course_id as courseId']).where('posting.id', '=', input.postingId).executeTakeFirst()
    if (!posting) return refuse('not_found')
    const member = await trx.selectFrom('membership').select('id').where('id', '=', input.membershipId).where('course_id', '=', posting.courseId).where('section_id', '=', posting.sectionId).where('state', '=', 'active').executeTakeFirst()
    if (!member) return refuse('invalid', {}, [{ path: 'membershipId', message: 'Not a student of this section.' }])
    const { dueAt, told } = await extendDue(trx, await studentOf(trx, posting.courseId, member.id), { actorId: input.actorId, labId: posting.labId, dueLocal: input.dueLocal, reason: input.reason }, now)
    return { dueAt, told: told.length === 0 ? null : told.join(' ') }
  }))
}
