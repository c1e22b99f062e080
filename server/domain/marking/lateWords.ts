import type { LateRule } from '#shared/schemas/lab'

const days = (n: number) => n === 1 ? '1 day' : `${n} days`
const percent = (p: number) => `${p}\u202f%`

/** What lateness did to a total, in a sentence. */
export function lateWords(rule: LateRule, startedDays: number): string {
  if (startedDays === 0) return 'on time'
  if (rule.kind === 'none') return `${days(startedDays)} late: kept, and earns nothing unless staff accept it`
  if (rule.kind === 'open') return `${days(startedDays)} late, without loss`
  return `${days(startedDays)} late: ${percent(rule.percent * startedDays)} of ${rule.kind === 'of_earned' ? 'what was earned' : 'the maximum'} off`
}
