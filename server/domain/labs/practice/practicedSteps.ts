import { askedSteps, isNumber, type AskedNumber, type AskedStep } from '#shared/schemas/askedSteps'
import type { LabBody } from '#shared/schemas/lab'
import { findQuantity } from '#shared/thermo/registry'

/**
 * The steps whose worked answers a practice may show: numbers that depend on the data. What is the same for every share, a choice, a class that nearly
 * all layers of a lab share, or a number from the text alone, would be the answer to the student's own lab. Decided from the lab alone, never from
 * a share, so that what is held back tells nothing.
 */
export function practicedSteps(body: LabBody): AskedNumber[] {
  const known = new Map(askedSteps(body).map(step => [step.key, step]))
  return askedSteps(body).filter(isNumber).filter(step => findQuantity(step.quantity)?.kind !== 'class' && restsOnShare(step, known))
}

function restsOnShare(step: AskedNumber, known: ReadonlyMap<string, AskedStep>): boolean {
  return Object.values(step.inputs).some((source) => {
    if (source.from === 'share') return true
    const earlier = source.from === 'step' ? known.get(source.key) : undefined
    return earlier !== undefined && isNumber(earlier) && restsOnShare(earlier, known)
  })
}
