import { latenessOf, personalDue as latestOf } from '#shared/marking/late'
import type { LateRule } from '#shared/schemas/lab'
import { endOfMinute, movedByDays } from '../terms/wallClock'

export interface Terms {
  /** The section's due time. */
  dueAt: number
  /** The latest extension or accommodation; null where there is none. */
  allowedUntil: number | null
  zone: string
  lateRule: LateRule
}

export interface DecidedLateness {
  /** The person's own due time: the latest of section, extension and accommodation. */
  dueAt: number
  /** 0 when on time. */
  startedDays: number
  /** After this instant nothing is taken; null where the rule has no closing day. */
  closesAt: number | null
  isClosed: boolean
  /** Why it is so many days, to be stored with the submission. */
  reason: 'on_time' | 'on_time_by_allowance' | 'late' | 'late_after_allowance'
}

export const personalDue = (terms: Terms): number => latestOf(terms.dueAt, terms.allowedUntil)

/** The instant after which a lab takes nothing more from this person; null where late work is always kept. */
export function closingOf(terms: Terms): number | null {
  return terms.lateRule.kind === 'none' ? null : throughMinute(movedByDays(personalDue(terms), terms.lateRule.closesAfterDays, terms.zone))
}

/** A due minute lasts to its end, however finely the instant was given. */
const throughMinute = (at: number): number => endOfMinute(Math.floor(at / 60_000) * 60_000)

/**
 * Decides once, from the instant at which the whole request had arrived, whether it is late and by how many started days.
 * Days are dates of the section's calendar, not 24 hours.
 */
export function decideLateness(terms: Terms, receivedAt: number): DecidedLateness {
  const dueAt = personalDue(terms)
  const { isLate, startedDays, isClosed } = latenessOf(terms.lateRule, receivedAt, dueAt, days => movedByDays(dueAt, days, terms.zone))
  const hasAllowance = dueAt > terms.dueAt
  const reason = isLate ? hasAllowance ? 'late_after_allowance' : 'late' : hasAllowance && receivedAt > throughMinute(terms.dueAt) ? 'on_time_by_allowance' : 'on_time'
  return { dueAt, startedDays, closesAt: closingOf(terms), isClosed, reason }
}
