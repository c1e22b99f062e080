import { withAlternative } from '../thermo/conventions/closes'
import type { Alternative, Convention } from '../thermo/convention'
import type { Constants, Formulae, Inputs, QuantityDefinition } from '../thermo/definition'
import { evaluateQuantity } from '../thermo/evaluate'

/** One way to compute a quantity that earns the marks: constants, variant, and the formulae inside it. The convention's own has no alternative. */
export interface Way { label: string, constants: Constants, variant: string, formulae: Formulae, alternative: Alternative | null }

/** How a convention computes the quantities inside others. */
export const formulaeOf = (convention: Convention): Formulae => ({ variants: convention.variants, beyond: convention.beyond ?? 'compute' })

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
  const own = wayOf(definition, convention, pinned, null)
  const seen = new Set([fingerprint(definition, own)])
  const ways = [own]
  for (const alternative of convention.accepted) {
    const way = wayOf(definition, convention, pinned, alternative)
    const mark = fingerprint(definition, way)
    if (seen.has(mark)) continue
    seen.add(mark)
    ways.push(way)
  }
  return ways
}

function wayOf(definition: QuantityDefinition, convention: Convention, pinned: string | undefined, alternative: Alternative | null): Way {
  const variants = alternative?.variants ? { ...convention.variants, ...alternative.variants } : convention.variants
  return {
    label: alternative?.label ?? convention.title,
    constants: withAlternative(convention.constants, alternative?.constants),
    variant: pinned ?? alternative?.variants?.[definition.key] ?? taughtVariant(definition, convention, pinned),
    formulae: { variants, beyond: convention.beyond ?? 'compute' },
    alternative,
  }
}

/** What a way depends on here: two that agree in it give one value. */
function fingerprint(definition: QuantityDefinition, way: Way): string {
  const constants = definition.constants.map(name => String(way.constants[name]))
  const formulae = (definition.uses ?? []).map(key => way.formulae.variants[key] ?? '')
  return [way.variant, ...constants, ...formulae].join('|')
}

export interface WayValue { way: Way, value: number }

/**
 * The value of every accepted way, the convention's own first, and of the two ways that take from each group of alternatives the one that
 * raises (lowers) the value most: constants and formulae are chosen freely of each other, so the hull reaches their sum. Ways without a value are left out.
 * @throws what `evaluateQuantity` throws
 */
export function valuesOfWays(definition: QuantityDefinition, convention: Convention, pinned: string | undefined, inputs: Inputs): readonly WayValue[] {
  const last = lastValues
  if (last && last.definition === definition && last.convention === convention && last.pinned === pinned && last.inputs === inputs) return last.values
  const values: WayValue[] = []
  const add = (way: Way): void => {
    const outcome = evaluateQuantity(definition, inputs, way.constants, way.variant, way.formulae)
    if (outcome.is === 'value') values.push({ way, value: outcome.value })
  }
  acceptedWays(definition, convention, pinned).forEach(add)
  const own = values[0]
  if (own && own.way.alternative === null) for (const direction of [1, -1] as const) farthest(definition, convention, pinned, values, own.value, direction).forEach(add)
  lastValues = { definition, convention, pinned, inputs, values }
  return values
}

let lastValues: { definition: QuantityDefinition, convention: Convention, pinned: string | undefined, inputs: Inputs, values: readonly WayValue[] } | null = null

/** The one way, if any, that joins what moves the value farthest in a direction, one alternative of each group. */
function farthest(definition: QuantityDefinition, convention: Convention, pinned: string | undefined, values: readonly WayValue[], own: number, direction: 1 | -1): readonly Way[] {
  const best = new Map<string, WayValue>()
  for (const one of values) {
    const group = one.way.alternative?.group
    if (group === undefined || !(direction * (one.value - own) > 0)) continue
    const before = best.get(group)
    if (!before || direction * (one.value - before.value) > 0) best.set(group, one)
  }
  if (best.size < 2) return []
  const joined: Alternative = { label: [...best.values()].map(one => one.way.label).join('; '), constants: {}, variants: {} }
  let constants = {}, variants = {}
  for (const { way } of best.values()) {
    constants = { ...constants, ...way.alternative?.constants }
    variants = { ...variants, ...way.alternative?.variants }
  }
  return [wayOf(definition, convention, pinned, { ...joined, constants, variants })]
}
