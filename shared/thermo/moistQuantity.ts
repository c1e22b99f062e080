/** How a definition of moist air is written: formulas take the numbers and the resolved air; evaluation, notes and the last step of the working are made here. */
import type { Constants, Formulae, Inputs, NumberKind, Outcome, QuantityDefinition, Slip, TraceStep, Variant } from './definition'
import { OutOfRangeError } from './errors'
import { variantOf } from './evaluate'
import { numberOf } from './inputs'
import { moistAir, type MoistAir } from './moistAir'
import { iceSaturationNotes, latentHeatNotes, overIceKey, overWaterKey, saturationNotes, sublimationKey, vaporizationKey } from './saturationFunction'

/** An input by its name. */
export type Given = (name: string) => number

/** What a formula has in hand. `ei` and the rest of the formulae are looked up from `constants` and `formulae` by those few that need them. */
export interface Hand { given: Given, air: MoistAir, constants: Constants, formulae: Formulae, variant: string }

type Value = (hand: Hand) => number | Exclude<Outcome, { is: 'class' }>

export interface MoistVariant extends Omit<Variant, 'evaluate'> { value: Value }

/** A slip's hand: the right value, and the formula again with some inputs changed. */
export interface SlipHand extends Hand { right: number, again: (changes: Readonly<Record<string, number>>) => number }
export type MoistSlip = Omit<Slip, 'apply'> & { apply: (hand: SlipHand) => number | null }

export interface MoistQuantity extends Pick<QuantityDefinition, 'key' | 'name' | 'symbol' | 'unit' | 'shownUnit' | 'inputs' | 'constants' | 'nearZero' | 'ask' | 'example'> {
  kind: NumberKind
  variants: readonly MoistVariant[]
  /** Which quantities of this kind stand inside: e over water, e over ice, L; other keys as they are. */
  inside?: readonly ('es' | 'ei' | 'L' | 'Ls' | (string & {}))[]
  /** Temperatures at which the saturation vapor pressure over water (over ice, the latent heat) is taken: beyond its formula's range that is noted. */
  notedAt?: { es?: (given: Given) => readonly number[], ei?: (given: Given) => readonly number[], L?: (given: Given) => readonly number[] }
  /** Other things to be said beside the value. */
  remarks?: (hand: Hand, value: number) => readonly (string | null)[]
  /** The steps; the last one's value is put in here. */
  working: (hand: Hand, value: number) => readonly TraceStep[]
  slips: readonly MoistSlip[]
}

const keys: Readonly<Record<string, string>> = { es: overWaterKey, ei: overIceKey, L: vaporizationKey, Ls: sublimationKey }

export const moistSlip = (key: string, label: string, sentence: string, apply: MoistSlip['apply']): MoistSlip => ({ key, weight: 'gross', label, sentence, apply })
export const fineMoistSlip = (key: string, label: string, sentence: string, apply: MoistSlip['apply']): MoistSlip => ({ key, weight: 'fine', label, sentence, apply })

/** As small as the spread of accepted constants by its nature: named where it alone explains a value, and no reason to refuse a share. */
export const smallMoistSlip = (key: string, label: string, sentence: string, apply: MoistSlip['apply']): MoistSlip => ({ key, weight: 'constant', label, sentence, apply })

export function moistQuantity({ inside = [], notedAt, remarks, working, slips, variants, ...rest }: MoistQuantity): QuantityDefinition {
  const handOf = (inputs: Inputs, constants: Constants, formulae: Formulae, variant: string): Hand => ({ given: name => numberOf(inputs, name), air: moistAir(constants, formulae), constants, formulae, variant })
  const outcomeOf = (variant: MoistVariant, hand: Hand): Exclude<Outcome, { is: 'class' }> => {
    const found = variant.value(hand)
    return typeof found === 'number' ? { is: 'value', value: found } : found
  }
  const find = (key: string): MoistVariant => {
    const variant = variants.find(one => one.key === key) ?? variants[0]
    if (!variant) throw new Error(`${rest.key} has no variant`)
    return variant
  }
  const definition: QuantityDefinition = {
    ...rest,
    variants: variants.map(({ value, ...about }) => ({
      ...about,
      evaluate: (inputs, constants, formulae) => {
        const hand = handOf(inputs, constants, formulae, about.key)
        checkNoneBoils(inputs, hand.air)
        const outcome = outcomeOf({ ...about, value }, hand)
        if (outcome.is !== 'value' || !remarks) return outcome
        const said = remarks(hand, outcome.value).filter(one => one !== null)
        return said.length === 0 ? outcome : { ...outcome, notes: said }
      },
    })),
    uses: inside.map(one => keys[one] ?? one),
    notes: (inputs, _constants, formulae) => {
      const given: Given = name => numberOf(inputs, name)
      return [...saturationNotes(notedAt?.es?.(given) ?? [], formulae), ...iceSaturationNotes(notedAt?.ei?.(given) ?? [], formulae), ...latentHeatNotes(notedAt?.L?.(given) ?? [], formulae)]
    },
    trace(inputs, constants, key, formulae) {
      const hand = handOf(inputs, constants, formulae, find(key).key)
      const outcome = outcomeOf(find(key), hand)
      if (outcome.is !== 'value') return [{ text: outcome.why, formula: rest.symbol, filled: `\\text{${outcome.is === 'none' ? 'none' : outcome.is === 'not_reached' ? 'not reached' : 'not defined'}}` }]
      const steps = working(hand, outcome.value)
      return steps.map((step, at) => (at === steps.length - 1 ? { ...step, value: outcome.value, unit: rest.unit } : step))
    },
    slips: slips.map(one => ({
      ...one,
      apply: (inputs, constants, right, formulae) => {
        const { key } = variantOf(definition, formulae.variants[rest.key])
        const hand = handOf(inputs, constants, formulae, key)
        const again = (changes: Readonly<Record<string, number>>): number => {
          const outcome = outcomeOf(find(key), { ...hand, given: name => changes[name] ?? hand.given(name) })
          return outcome.is === 'value' ? outcome.value : NaN
        }
        const found = one.apply({ ...hand, right, again })
        return found === null || !Number.isFinite(found) ? null : found
      },
    })),
  }
  return definition
}

/** Temperatures at which water would boil at the pressure have no mixing ratio. @throws {OutOfRangeError} */
function checkNoneBoils({ pressure, ...inputs }: Inputs, air: MoistAir): void {
  if (typeof pressure !== 'number') return
  for (const name of ['temperature', 'dewpoint', 'wetBulb']) {
    const temperature = inputs[name]
    if (typeof temperature === 'number' && !(air.es(temperature) < pressure)) throw new OutOfRangeError(name, temperature, `temperatures whose saturation vapor pressure is below ${pressure} Pa`)
  }
}

/** An input that may be absent: one that is there for slips alone. */
export function optionally(hand: Hand, name: string): number | null {
  try {
    return hand.given(name)
  }
  catch {
    return null
  }
}

export const supersaturated = (relativeHumidity: number): string | null => relativeHumidity > 1 + 1e-12 ? `Supersaturated: the vapor pressure is ${(100 * relativeHumidity).toFixed(1)} % of that of saturation over liquid water.` : null
/** The declared rule for fog: a dewpoint above the temperature is kept and noted; what asks for the level of condensation takes it as saturation at the start. */
export const foggy = (temperature: number, dewpoint: number): string | null => dewpoint > temperature ? 'The dewpoint lies above the temperature, as sensors in fog show it: the air is taken as saturated where it is.' : null
