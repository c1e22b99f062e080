import type { LateRule } from '#shared/schemas/lab'

/** What being late costs, in a few words under the closing day. */
export function lateRuleWords(rule: LateRule): string {
  if (rule.kind === 'none') return 'kept, earns nothing unless staff accept it'
  if (rule.kind === 'open') return 'no loss'
  return `${rule.percent}\u202f% of ${rule.kind === 'of_earned' ? 'what is earned' : 'the maximum'} a day`
}
