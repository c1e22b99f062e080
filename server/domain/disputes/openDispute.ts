import { refuse } from '#shared/errors'
import type { OpenDisputeBody } from '#shared/schemas/disputes'
import { once, type Once } from '../../db/queries/requestKeys'
import type { Stores } from '../../db/writer'
import { newId } from '../ids'
import { appendEntry, courseChain, keepPrivateText } from '../ledger/appendEntry'
import { objectUntil } from '../marking/objectUntil'
import { queueNotice } from '../notices/queueNotice'
import { rulersOf } from './rulers'

export interface OpenDispute { membershipId: string, submissionId: string, body: OpenDisputeBody, request: Once }

/**
 * A student objects to the mark of one step. The mark is the one in force now: what is ruled on is what was seen.
 * @throws {DomainError} `not_found`, `not_released`, `dispute_window_over`, `dispute_exists`
 */
export async function openDispute({ write }: Stores, input: OpenDispute, now: number): Promise<{ disputeId: string, version: number }> {
  return write(trx => once(trx, input.request, async () => {
    const at = await trx.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('lab', 'lab.id', 'share.lab_id').innerJoin('course', 'course.id', 'lab.course_id')
      .innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').innerJoin('membership', 'membership.id', 'holder_member.membership_id')
      .innerJoin('posting', join => join.onRef('posting.lab_id', '=', 'lab.id').onRef('posting.section_id', '=', 'membership.section_id'))
      .select(['lab.id as labId', 'lab.title', 'course.id as courseId', 'course.code', 'posting.released_at', 'posting.zone', 'membership.section_id'])
      .where('submission.id', '=', input.submissionId).where('membership.id', '=', input.membershipId).executeTakeFirst()
    if (!at) return refuse('not_found')
    if (at.released_at === null) return refuse('not_released')
    if (now > objectUntil(at.released_at, at.zone)) return refuse('dispute_window_over')
    const mark = await trx.selectFrom('mark_current').select(['id', 'points_milli', 'version']).where('submission_id', '=', input.submissionId).where('step_key', '=', input.body.stepKey).executeTakeFirst()
    if (!mark) return refuse('not_found')
    const live = await trx.selectFrom('dispute').select('id').where('submission_id', '=', input.submissionId).where('step_key', '=', input.body.stepKey).where('state', 'in', ['open', 'taken', 'appealed']).executeTakeFirst()
    if (live) return refuse('dispute_exists')

    const disputeId = newId(now)
    await trx.insertInto('dispute').values({
      id: disputeId, submission_id: input.submissionId, step_key: input.body.stepKey, against_mark_id: mark.id, state: 'open', version: 1,
      opened_by_membership_id: input.membershipId, taken_by: null, taken_until: null, opened_at: now,
    }).execute()
    const privateDigest = await keepPrivateText(trx, input.membershipId, input.body.reason)
    await trx.insertInto('dispute_note').values({ id: newId(now), dispute_id: disputeId, by_actor_id: input.membershipId, audience: 'all', private_digest: privateDigest, file_digest: null, file_about_membership_id: null, at: now }).execute()
    await appendEntry(trx, {
      chain: courseChain(at.courseId), at: now, actor: input.membershipId, action: 'dispute.opened', privateDigest,
      facts: { dispute: disputeId, submission: input.submissionId, step: input.body.stepKey, mark: mark.id, markVersion: mark.version, points: mark.points_milli },
    })
    const path = `/c/${at.courseId}/disputes/${disputeId}`
    for (const ruler of await rulersOf(trx, at.courseId, at.section_id)) {
      await queueNotice(trx, { eventKey: `dispute_opened:${disputeId}:${ruler}`, template: 'dispute_opened', toMembershipId: ruler, now, facts: { course: at.code, lab: at.title, path } })
    }
    return { disputeId, version: 1 }
  }))
}
