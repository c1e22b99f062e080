import { createHash } from 'node:crypto'
import type { RulingBody } from '#shared/schemas/disputes'
import type { Stores } from '../server/db/writer'
import { openDispute } from '../server/domain/disputes/openDispute'
import { ruleDispute } from '../server/domain/disputes/ruleDispute'
import { takeDispute } from '../server/domain/disputes/takeDispute'
import type { Reference } from '../server/domain/marking/reference'
import type { Department, Member } from './department'
import type { Objection } from './stories'
import type { Timeline } from './timeline'

const hour = 3_600_000

/** Tells an objection to a released mark: opened, and where the story has it, taken or ruled on. A mark that turned out full has nothing to object to. */
export function tellObjection(timeline: Timeline, with_: { stores: Stores, reference: Reference, department: Department, until: number }, objection: Objection, member: Member, at: { courseId: string, labId: string, releasedAt: number }): void {
  const { stores, reference, department } = with_
  const request = (what: string, personId: string, now: number) => ({
    personId, key: createHash('sha256').update(`${what} ${objection.lab} ${member.key} ${objection.step}`).digest('hex').slice(0, 32), route: `POST ${what}`,
    bodySha256: createHash('sha256').update(objection.words).digest(), now,
  })
  timeline.at(at.releasedAt + objection.after * hour, async (now) => {
    const submission = await stores.read.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id')
      .select('submission.id').where('share.lab_id', '=', at.labId).where('holder_member.membership_id', '=', member.membershipId).orderBy('submission.seq', 'desc').executeTakeFirst()
    if (!submission) return
    const { disputeId } = await openDispute(stores, { membershipId: member.membershipId, submissionId: submission.id, body: { stepKey: objection.step, reason: objection.words }, request: request('object', member.personId, now) }, now)
    const { taken, ruled } = objection
    const versionOf = async () => (await stores.read.selectFrom('dispute').select('version').where('id', '=', disputeId).executeTakeFirstOrThrow()).version
    if (taken) {
      timeline.at(Math.max(now, with_.until - hour / 4), async (then) => {
        const ruler = { actorId: await department.membershipId(at.courseId, taken), personId: department.personId(taken), role: 'ta' as const }
        await takeDispute(stores, { disputeId, ruler, seenVersion: await versionOf(), giveBack: false }, then)
      })
    }
    if (ruled) {
      timeline.at(at.releasedAt + ruled.after * hour, async (then) => {
        const personId = department.personId(ruled.by)
        const ruler = { actorId: await department.membershipId(at.courseId, ruled.by), personId, role: ruled.role }
        const seenVersion = (await takeDispute(stores, { disputeId, ruler, seenVersion: await versionOf(), giveBack: false }, then - hour / 3)).version
        await ruleDispute(stores, reference, { disputeId, ruler, seenVersion, body: await bodyOf(stores, ruled, submission.id, objection.step), request: request('rule', personId, then) }, then)
      })
    }
  })
}

async function bodyOf(stores: Stores, ruled: NonNullable<Objection['ruled']>, submissionId: string, step: string): Promise<RulingBody> {
  const { reason } = ruled
  if (ruled.kind === 'uphold') return { kind: 'uphold', reason }
  if (ruled.kind === 'accept') return { kind: 'accept', reason, accept: { kind: 'slip', key: ruled.slip } }
  const mark = await stores.read.selectFrom('mark_current').select(['points_milli', 'max_milli']).where('submission_id', '=', submissionId).where('step_key', '=', step).executeTakeFirstOrThrow()
  return { kind: 'change', reason, pointsMilli: Math.max(mark.points_milli, Math.round(mark.max_milli * ruled.part)) }
}
