import type { DisputeDetail, DisputeLine, RulingBody } from '#shared/schemas/disputes'
import type { ShapeName, Tone } from '../sheet/shapes'

export const kindWords: Record<RulingBody['kind'], string> = {
  uphold: 'the mark stands', change: 'marks changed', accept: 'reading or method accepted', fault: 'to the instructor: the reference may be wrong',
}

/** Where a dispute stands, as a shape and words. */
export function stateTag(line: Pick<DisputeLine, 'state' | 'takenBy' | 'kind' | 'ruledBy'>): { shape: ShapeName, tone: Tone, word: string } {
  switch (line.state) {
    case 'open': return { shape: 'diamond', tone: 'brass', word: 'open' }
    case 'taken': return { shape: 'diamond', tone: 'brass', word: `open, with ${line.takenBy ?? 'a TA'}` }
    case 'appealed': return { shape: 'triangle', tone: 'brass', word: 'with the instructor' }
    case 'withdrawn': return { shape: 'ring', tone: 'pencil', word: 'withdrawn' }
    default: return { shape: 'ruled', tone: 'moss', word: line.kind ? `${kindWords[line.kind]}${line.ruledBy ? ` (${line.ruledBy})` : ''}` : 'settled with a like case' }
  }
}

export const whyNotWords: Record<NonNullable<DisputeDetail['mayNotRule']>, string> = {
  own_work: 'This is your own work, or somebody’s with whom you declared a conflict. Another TA or the instructor rules on it.',
  goes_to_instructor: 'You gave this mark by hand, or a TA passed it on: the instructor rules on it.',
  dispute_closed: 'This dispute is settled.',
  not_allowed: 'Your role does not rule on disputes.',
  term_closed: 'The term is closed.',
}
