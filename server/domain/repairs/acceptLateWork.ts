import { refuse } from '#shared/errors'
import { countedMilli, latenessOf } from '#shared/marking/late'
import { lateRule, type LateRule } from '#shared/schemas/lab'
import type { LateWorkBody, RepairTold } from '#shared/schemas/repairs'
import type { Stores, Trx } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { attemptsOfShares } from '../marking/attemptsOf'
import { movedByDays } from '../terms/wallClock'
import { studentOf } from './studentOf'
import { writeRepair } from './writeRepair'

/**
 * Accepts work that came late. A claim: the late rule counts from the time that the device says it was sent, so that a dead line costs nothing. Work under the
 * rule "none": it counts without loss. What was decided at receipt stays stored; a total never falls by it.
 * @throws {DomainError} `not_found`, `already_exists`, `own_work`, `invalid` where there is nothing to accept
 */
export function acceptLateWork({ write }: Stores, input: Asked & { courseId: string, memberId: string, body: LateWorkBody }, now: number): Promise<RepairTold> {
  return write(trx => doOnce(trx, input, async () => {
    const student = await studentOf(trx, input.courseId, input.memberId)
    const late = await lateSubmission(trx, student.membershipId, input.body.submissionId)
    const conflict = await trx.selectFrom('conflict_of_interest').select('membership_id').where('membership_id', '=', input.actorId).where('other_id', '=', student.membershipId).executeTakeFirst()
    if (conflict) refuse('own_work')
    const earlier = await trx.selectFrom('repair').select('id').where('submission_id', '=', late.id).executeTakeFirst()
    if (earlier) refuse('already_exists', { what: 'An acceptance of this work' })
    const rule = lateRule.parse(JSON.parse(late.lateRuleJson))
    const accepted = acceptedAs(input.body.accepts, late, rule, late.zone)
    if (accepted === null) return refuse('invalid', {}, [{ path: 'submissionId', message: 'There is nothing to accept here: the work was in time, or what would be accepted changes nothing.' }])
    const [earnedMilli, maxMilli] = await earnedOf(trx, late.shareId, late.id)
    const before = countedMilli(rule, late.lateUnits, earnedMilli, maxMilli)
    const after = countedMilli(accepted.rule, accepted.days, earnedMilli, maxMilli)
    if (after < before) throw new Error('accepting late work lowered a total')
    await writeRepair(trx, {
      student, effect: { kind: 'lateness', lab_id: late.labId, submission_id: late.id, late_units: accepted.days, late_rule_json: JSON.stringify(accepted.rule) }, labTitle: late.title, reason: input.body.reason, actorId: input.actorId, action: 'lateness.accepted',
      facts: { submission: late.id, labId: late.labId, accepts: input.body.accepts, before: { lateDays: late.lateUnits, totalMilli: before }, after: { lateDays: accepted.days, totalMilli: after } }, zone: late.zone,
    }, now)
    return { told: [accepted.days === 0 ? 'The work counts as in time.' : `The work counts as ${accepted.days === 1 ? '1 day' : `${accepted.days} days`} late${accepted.rule.kind === 'open' ? ', without loss' : ''}.`] }
  }))
}

interface Late { id: string, shareId: string, labId: string, title: string, zone: string, receivedAt: number, dueAt: number, lateUnits: number, lateRuleJson: string, claimedSentAt: number | null }

async function lateSubmission(trx: Trx, membershipId: string, submissionId: string): Promise<Late> {
  const row = await trx.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').innerJoin('lab', 'lab.id', 'share.lab_id')
    .innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
    .select(['submission.id', 'share.id as shareId', 'lab.id as labId', 'lab.title', 'term.zone', 'submission.received_at as receivedAt', 'submission.due_at_applied as dueAt', 'submission.late_units as lateUnits', 'submission.late_rule_json as lateRuleJson', 'submission.claimed_sent_at as claimedSentAt'])
    .where('submission.id', '=', submissionId).where('holder_member.membership_id', '=', membershipId).executeTakeFirst()
  return row ?? refuse('not_found')
}

async function earnedOf(trx: Trx, shareId: string, submissionId: string): Promise<[earnedMilli: number, maxMilli: number]> {
  const marks = (await attemptsOfShares(trx, [shareId])).get(shareId)?.find(attempt => attempt.submissionId === submissionId)?.marks ?? []
  return [marks.reduce((sum, mark) => sum + mark.pointsMilli, 0), marks.reduce((sum, mark) => sum + mark.maxMilli, 0)]
}

/** What late work becomes when it is accepted; null where that would change nothing. */
export function acceptedAs(accepts: LateWorkBody['accepts'], late: Pick<Late, 'receivedAt' | 'dueAt' | 'lateUnits' | 'claimedSentAt'>, rule: LateRule, zone: string): { days: number, rule: LateRule } | null {
  if (late.lateUnits === 0) return null
  if (accepts === 'work') return rule.kind === 'none' ? { days: late.lateUnits, rule: { kind: 'open', closesAfterDays: Math.min(400, late.lateUnits) } } : null
  if (late.claimedSentAt === null || late.claimedSentAt >= late.receivedAt) return null
  const { startedDays } = latenessOf(rule, late.claimedSentAt, late.dueAt, days => movedByDays(late.dueAt, days, zone))
  if (startedDays >= late.lateUnits || (rule.kind === 'none' && startedDays > 0)) return null
  return { days: startedDays, rule }
}
