import { withAlternative } from '../thermo/conventions/closes'
import type { Convention } from '../thermo/convention'
import type { Constants, QuantityDefinition } from '../thermo/definition'

/** One way to compute a quantity that earns the marks: constants and variant. */
export interface Way { label: string, constants: Constants, variant: string }

/** The variant that a question pins, else the convention's, else the definition's first. */
export function taughtVariant(definition: QuantityDefinition, convention: Convention, pinned: string | undefined): string {
  return pinned ?? convention.variants[definition.key] ?? definition.variants[0]?.key ?? ''
}

/**
 * The convention's own way first, then every accepted one that can make a difference to this quantity. A pinned variant is a definition
 * and stays; constants may still differ.
 */
export function acceptedWays(definition: QuantityDefinition, convention: Convention, pinned: string | undefined): readonly Way[] {
  // a judgement asks for them several times, with one convention in hand
  const last = lastFound
  if (last && last.definition === definition && last.convention === convention && last.pinned === pinned) return last.ways
  const ways = findWays(definition, convention, pinned)
  lastFound = { definition, convention, pinned, ways }
  return ways
}

let lastFound: { definition: QuantityDefinition, convention: Convention, pinned: string | undefined, ways: readonly Way[] } | null = null

function findWays(definition: QuantityDefinition, convention: Convention, pinned: string | undefined): readonly Way[] {
  const own: Way = { label: convention.title, constants: convention.constants, variant: taughtVariant(definition, convention, pinned) }
  const seen = new Set([fingerprint(definition, own)])
  const ways = [own]
  for (const alternative of convention.accepted) {
    const way: Way = {
      label: alternative.label,
      constants: withAlternative(convention.constants, alternative.constants),
      variant: pinned ?? alternative.variants?.[definition.key] ?? own.variant,
    }
    const mark = fingerprint(definition, way)
    if (seen.has(mark)) continue
    seen.add(mark)
    ways.push(way)
  }
  return ways
}

const fingerprint = (definition: QuantityDefinition, way: Way): string => `${way.variant}|${definition.constants.map(name => String(way.constants[name])).join('|')}`
