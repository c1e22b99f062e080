import { askedSteps, isNumber, type AskedNumber } from '#shared/schemas/askedSteps'
import type { LabBody } from '#shared/schemas/lab'
import { findQuantity } from '#shared/thermo/registry'

/** The layer's own bounds are read off the ask and no data: a value that rests on them alone is the lab's and not a student's. */
const bounds: readonly string[] = ['lowBound', 'highBound']

/**
 * The steps whose worked answers a practice may show: numbers that depend on the data, and on no earlier step whose answer is held back, for the working
 * has that one's value put in. What is the same for every share, a choice, a class that nearly all layers of a lab share, or a number from the text alone,
 * would be the answer to the student's own lab. Decided from the lab alone, never from a share, so that what is held back tells nothing.
 */
export function practicedSteps(body: LabBody): AskedNumber[] {
  const shown = new Set<string>()
  // inputs come from earlier steps only, so that those are decided already
  return askedSteps(body).filter(isNumber).filter((step) => {
    const isShown = findQuantity(step.quantity)?.kind !== 'class' && restsOnData(step, shown)
    if (isShown) shown.add(step.key)
    return isShown
  })
}

function restsOnData(step: AskedNumber, shown: ReadonlySet<string>): boolean {
  const sources = Object.values(step.inputs)
  if (sources.some(source => source.from === 'step' && !shown.has(source.key))) return false
  return sources.some(source => source.from === 'step' || (source.from === 'share' && !bounds.includes(source.read)))
}
