import type { LateRule } from '#shared/schemas/lab'
import type { ShapeName, Tone } from '~/components/sheet/shapes'

interface Shown { shape: ShapeName, tone: Tone, word: string }

export const termStates: Record<'planned' | 'running' | 'closed', Shown> = {
  planned: { shape: 'ring', tone: 'pencil', word: 'planned' },
  running: { shape: 'disk', tone: 'moss', word: 'running' },
  closed: { shape: 'box', tone: 'pencil', word: 'closed' },
}

export const accountStates: Record<'invited' | 'active' | 'closed' | 'erased', Shown> = {
  invited: { shape: 'ring', tone: 'brass', word: 'invited' },
  active: { shape: 'disk', tone: 'moss', word: 'active' },
  closed: { shape: 'box', tone: 'pencil', word: 'closed' },
  erased: { shape: 'cross', tone: 'pencil', word: 'erased' },
}

export function lateRuleText(rule: LateRule): string {
  if (rule.kind === 'none') return 'Late work is kept and earns nothing unless staff accept it'
  const until = `until ${rule.closesAfterDays} ${rule.closesAfterDays === 1 ? 'day' : 'days'} after the due`
  if (rule.kind === 'open') return `No loss ${until}`
  return `${rule.percent} % of ${rule.kind === 'of_earned' ? 'what was earned' : 'the maximum'} for each started day, ${until}`
}

/** "2 sections", "1 section" */
export const countText = (count: number, one: string, many = `${one}s`): string => `${count} ${count === 1 ? one : many}`
