import { latenessOf, type LateRule } from '#shared/marking/late'
import type { LateWorkBody } from '#shared/schemas/repairs'
import { movedByDays } from '../terms/wallClock'
import type { LateWork } from './lateWorkOf'

/**
 * What late work becomes when it is accepted; null where that would change nothing. A claim counts from the student's present due too: an extension
 * that came after the work holds for it whichever time of sending is taken.
 */
export function acceptedAs(accepts: LateWorkBody['accepts'], late: Pick<LateWork, 'receivedAt' | 'dueAt' | 'presentDueAt' | 'lateUnits' | 'claimedSentAt'>, rule: LateRule, zone: string): { days: number, rule: LateRule } | null {
  if (late.lateUnits === 0) return null
  if (accepts === 'work') return rule.kind === 'none' ? { days: late.lateUnits, rule: { kind: 'open', closesAfterDays: Math.min(400, late.lateUnits) } } : null
  const dueAt = Math.max(late.dueAt, late.presentDueAt)
  if (accepts === 'due' && dueAt === late.dueAt) return null
  if (accepts === 'claim' && (late.claimedSentAt === null || late.claimedSentAt >= late.receivedAt)) return null
  const at = accepts === 'claim' ? late.claimedSentAt ?? late.receivedAt : late.receivedAt
  const { startedDays } = latenessOf(rule, at, dueAt, days => movedByDays(dueAt, days, zone))
  if (startedDays >= late.lateUnits || (rule.kind === 'none' && startedDays > 0)) return null
  return { days: startedDays, rule }
}
