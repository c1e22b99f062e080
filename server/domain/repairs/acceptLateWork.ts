import { refuse } from '#shared/errors'
import { countedMilli } from '#shared/marking/late'
import { lateRule } from '#shared/schemas/lab'
import type { LateWorkBody, RepairTold } from '#shared/schemas/repairs'
import type { Stores, Trx } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { attemptsOfShares } from '../marking/attemptsOf'
import { acceptedAs } from './acceptedAs'
import { lateWorkOf } from './lateWorkOf'
import { studentOf } from './studentOf'
import { writeRepair } from './writeRepair'

/**
 * Accepts work that came late. A claim: the late rule counts from the time that the device says it was sent, so that a dead line costs nothing. Work under the
 * rule "none": it counts without loss. A due that moved since the work came, as by an extension: lateness counts from it, by a claim too. What was decided at receipt stays stored; a total never falls by it.
 * @throws {DomainError} `not_found`, `already_exists`, `own_work`, `invalid` where there is nothing to accept
 */
export function acceptLateWork({ write }: Stores, input: Asked & { courseId: string, memberId: string, body: LateWorkBody }, now: number): Promise<RepairTold> {
  return write(trx => doOnce(trx, input, async () => {
    const student = await studentOf(trx, input.courseId, input.memberId)
    const [late] = await lateWorkOf(trx, student.membershipId, { submissionId: input.body.submissionId })
    if (!late) return refuse('not_found')
    if (late.isAccepted) refuse('already_exists', { what: 'An acceptance of this work' })
    const rule = lateRule.parse(JSON.parse(late.lateRuleJson))
    const accepted = acceptedAs(input.body.accepts, late, rule, late.zone)
    if (accepted === null) return refuse('invalid', {}, [{ path: 'submissionId', message: 'There is nothing to accept here: the work was in time, or what would be accepted changes nothing.' }])
    const [earnedMilli, maxMilli] = await earnedOf(trx, late.shareId, late.id)
    const before = countedMilli(rule, late.lateUnits, earnedMilli, maxMilli)
    const after = countedMilli(accepted.rule, accepted.days, earnedMilli, maxMilli)
    if (after < before) throw new Error('accepting late work lowered a total')
    await writeRepair(trx, {
      student, effect: { kind: 'lateness', lab_id: late.labId, submission_id: late.id, late_units: accepted.days, late_rule_json: JSON.stringify(accepted.rule) }, labTitle: late.title, reason: input.body.reason, actorId: input.actorId, action: 'lateness.accepted',
      facts: { submission: late.id, labId: late.labId, accepts: input.body.accepts, before: { dueAt: late.dueAt, lateDays: late.lateUnits, totalMilli: before }, after: { dueAt: input.body.accepts === 'work' ? late.dueAt : late.presentDueAt, lateDays: accepted.days, totalMilli: after } }, zone: late.zone,
    }, now)
    return { told: [accepted.days === 0 ? 'The work counts as in time.' : `The work counts as ${accepted.days === 1 ? '1 day' : `${accepted.days} days`} late${accepted.rule.kind === 'open' ? ', without loss' : ''}.`] }
  }))
}

async function earnedOf(trx: Trx, shareId: string, submissionId: string): Promise<[earnedMilli: number, maxMilli: number]> {
  const marks = (await attemptsOfShares(trx, [shareId])).get(shareId)?.find(attempt => attempt.submissionId === submissionId)?.marks ?? []
  return [marks.reduce((sum, mark) => sum + mark.pointsMilli, 0), marks.reduce((sum, mark) => sum + mark.maxMilli, 0)]
}
