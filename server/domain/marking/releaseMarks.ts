import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { appendEntry, courseChain } from '../ledger/appendEntry'
import { queueNotice } from '../notices/queueNotice'

export interface ReleaseMarks { actorId: string, postingId: string, seenVersion: number }

/**
 * Shows a section its marks. What was hidden until now (marks, accepted ranges, worked values) its students see from here on.
 * @throws {DomainError} `already_released`, `changed_meanwhile`, `lab_withdrawn`, `not_found`
 */
export async function releaseMarks({ write }: Stores, input: ReleaseMarks, now: number): Promise<{ releasedAt: string, version: number, told: number }> {
  return write(async (trx) => {
    const posting = await trx.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id').innerJoin('course', 'course.id', 'lab.course_id')
      .select(['posting.id', 'posting.lab_id', 'posting.section_id', 'posting.state', 'posting.released_at', 'posting.version', 'lab.title', 'lab.course_id', 'course.code'])
      .where('posting.id', '=', input.postingId).executeTakeFirst()
    if (!posting) return refuse('not_found')
    if (posting.released_at !== null) return refuse('already_released')
    if (posting.version !== input.seenVersion) return refuse('changed_meanwhile', { by: 'Somebody' })
    if (posting.state !== 'posted') return refuse(posting.state === 'withdrawn' ? 'lab_withdrawn' : 'lab_not_open')
    const version = posting.version + 1
    await trx.updateTable('posting').set({ released_at: now, version }).where('id', '=', posting.id).execute()
    const handedIn = await trx.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id')
      .innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').innerJoin('membership', 'membership.id', 'holder_member.membership_id')
      .select(['membership.id']).distinct().where('share.lab_id', '=', posting.lab_id).where('membership.section_id', '=', posting.section_id).where('membership.state', '=', 'active').execute()
    await appendEntry(trx, {
      chain: courseChain(posting.course_id), at: now, actor: input.actorId, action: 'marks.released',
      facts: { posting: posting.id, lab: posting.lab_id, section: posting.section_id, version, students: handedIn.length },
    })
    for (const member of handedIn) {
      await queueNotice(trx, {
        eventKey: `marks_released:${posting.id}:${member.id}`, template: 'marks_released', toMembershipId: member.id, now,
        facts: { course: posting.code, lab: posting.title, path: `/c/${posting.course_id}/marks` },
      })
    }
    return { releasedAt: new Date(now).toISOString(), version, told: handedIn.length }
  })
}
