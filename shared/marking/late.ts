/**
 * The four late rules of a course. Days are local calendar days of the section: the caller hands in the due time moved by n local dates,
 * since this room knows neither clock nor time zone. Whole numbers throughout, half up.
 */
export type LateRule
  = | { kind: 'none' }
    | { kind: 'open', closesAfterDays: number }
    | { kind: 'of_earned', percent: number, closesAfterDays: number }
    | { kind: 'of_maximum', percent: number, closesAfterDays: number }

export interface Lateness {
  isLate: boolean
  /** Started days after due: 0 in time. */
  startedDays: number
  /** Past the closing day: nothing more can be handed in. Under the rule `none` late work is kept, whenever it comes. */
  isClosed: boolean
}

const mostDays = 400

/** A time given to the minute lasts through that minute: due 23:59 is through 23:59:59.999. */
const lastMoment = (at: number): number => at - (((at % 60_000) + 60_000) % 60_000) + 59_999

/** The personal due: the latest of section, extension and accommodation; the late rule applies once, from it. */
export function personalDue(sectionDueAt: number, ...laterDueAt: readonly (number | null)[]): number {
  return laterDueAt.reduce<number>((latest, at) => (at !== null && at > latest ? at : latest), sectionDueAt)
}

/**
 * How late a receipt is: the smallest n ≥ 1 with the receipt at or before due moved by n local dates at the same wall time.
 * @param dueMovedBy due moved by n local dates, as an instant
 */
export function latenessOf(rule: LateRule, receivedAt: number, dueAt: number, dueMovedBy: (days: number) => number): Lateness {
  if (receivedAt <= lastMoment(dueAt)) return { isLate: false, startedDays: 0, isClosed: false }
  const closesAfter = rule.kind === 'none' ? mostDays : rule.closesAfterDays
  for (let days = 1; days <= closesAfter; days++) {
    if (receivedAt <= lastMoment(dueMovedBy(days))) return { isLate: true, startedDays: days, isClosed: false }
  }
  return { isLate: true, startedDays: closesAfter + 1, isClosed: rule.kind !== 'none' }
}

/** What counts of what was earned. Staff may accept work under the rule `none`: they then pass the rule that they accept it under. */
export function countedMilli(rule: LateRule, startedDays: number, earnedMilli: number, maximumMilli: number): number {
  if (!Number.isSafeInteger(earnedMilli) || !Number.isSafeInteger(maximumMilli) || earnedMilli < 0 || maximumMilli < 0) throw new Error('marks are whole thousandths')
  if (!Number.isSafeInteger(startedDays) || startedDays < 0) throw new Error('started days are a whole number')
  if (startedDays === 0) return earnedMilli
  switch (rule.kind) {
    case 'none': return 0
    case 'open': return earnedMilli
    case 'of_earned': return Math.max(0, earnedMilli - shareOf(earnedMilli, rule.percent, startedDays))
    case 'of_maximum': return Math.max(0, earnedMilli - shareOf(maximumMilli, rule.percent, startedDays))
  }
}

/** percent · days of an amount in thousandths. */
function shareOf(milli: number, percent: number, days: number): number {
  const percentMilli = Math.round(percent * 1000)
  if (!(percentMilli >= 0 && percentMilli <= 100_000)) throw new Error(`a loss of ${percent} % cannot be`)
  const exact = BigInt(milli) * BigInt(percentMilli) * BigInt(days)
  // what remains is rounded half up, so the loss is rounded half down
  return Number((exact + 49_999n) / 100_000n)
}
