import type { Judgement, StepQuestion } from '#shared/marking/types'
import { findQuantity } from '#shared/thermo/registry'

/**
 * Why a student's own earlier value did not count here. The judge says so for a value that it does not carry, unphysical or trivial; a value that it
 * carried and that led to nothing to compare with leaves no band and no word, and is explained here. Null where there is nothing to say.
 */
export function carriedNoteOf(question: StepQuestion, judgement: Judgement): string | null {
  const definition = findQuantity(question.quantity)
  const carried = Object.entries(question.carried ?? {}).filter(([, value]) => 'valueSi' in value)
  const leadsNowhere = judgement.carriedBand === null && judgement.outcome !== 'class' && judgement.outcome !== 'refused' && judgement.carriedNote === null && carried.length > 0
  if (!leadsNowhere) return judgement.carriedNote
  const labels = carried.map(([name]) => definition?.inputs.find(input => input.name === name)?.label ?? name)
  return `Not carried: with your earlier value of the ${labels.join(' and the ')} there is no ${definition?.name ?? 'value'} to compare with, so this step was judged by the true one alone.`
}
