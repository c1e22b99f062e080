/** The quantities of a lifted parcel: one definition for each origin, each result, with and without virtual correction. */
import type { Constants, Formulae, InputDefinition, Inputs, Outcome, QuantityDefinition, Slip, TraceStep, Variant } from './definition'
import { seriesOf } from './inputs'
import { ascentConstants, ascentUses, equivalentKey, origins, parcelContext, type Origin, type ParcelContext } from './parcelContext'
import type { Ascent } from './parcelAscent'
import { zeroCelsius } from './slips'
import { texNumber, texQuantity } from './tex'

/** Up to here the parcel may yet become warmer: data that end below say nothing of a level that they do not reach. */
export const searchedUpTo = 30_000

export interface ParcelResult {
  key: string
  name: string
  symbol: string
  unit: string
  shownUnit: string
  kind: QuantityDefinition['kind']
  nearZero?: number
  /** Whether it differs by virtual correction: the condensation level does not. */
  hasVirtual: boolean
  /** The quantity, its sign and its rules, before the parcel. */
  ask: string
  variants: readonly Pick<Variant, 'key' | 'label' | 'validity' | 'knownError' | 'source'>[]
  outcome: (context: ParcelContext, origin: Origin, isVirtual: boolean, variant: string) => Outcome
  trace: (context: ParcelContext, origin: Origin, isVirtual: boolean, value: number) => readonly TraceStep[]
  slips: (origin: Origin, isVirtual: boolean) => readonly Slip[]
  classLimits?: QuantityDefinition['classLimits']
}

/** The sounding of the examples: an invented warm afternoon. */
export const exampleSounding: Inputs = {
  pressure: [100_000, 92_500, 85_000, 70_000, 50_000, 40_000, 30_000, 25_000, 20_000, 15_000, 10_000],
  temperature: [301.15, 295.65, 290.65, 281.15, 264.15, 252.65, 237.15, 228.15, 218.15, 210.15, 207.15],
  dewpoint: [295.15, 292.65, 286.15, 268.15, 246.15, 232.15, 216.15, 208.15, 198.15, 190.15, 187.15],
}
const exampleMore: Readonly<Record<Origin, Inputs>> = { 'surface': {}, 'most-unstable': {}, 'mixed-layer': { mixedLayerDepth: 10_000 }, 'stated': { parcelPotentialTemperature: 300, parcelMixingRatio: 0.015 } }

/** No parcel, or an ascent whose data end too low: the same answer for every level looked for. */
export function endOfData(ascent: Ascent | null): Outcome | null {
  if (!ascent) return { is: 'not_reached', why: 'The data end within the layer that the parcel is the mean of.' }
  if (ascent.lfc === null && ascent.top > searchedUpTo) return { is: 'not_reached', why: `The data end at ${Math.round(ascent.top / 100)} hPa, and the parcel has not become warmer than its surroundings up to there.` }
  return null
}

export function parcelDefinition(origin: Origin, result: ParcelResult, isVirtual: boolean, example: { gives: number | string, within: number }): QuantityDefinition {
  const words = origins[origin]
  const inputs: readonly InputDefinition[] = words.inputs
  const correction = !result.hasVirtual ? '' : isVirtual ? ', with the virtual temperature for both' : ', with the temperature itself for both, no virtual correction'
  const outcomeOf = (given: Inputs, constants: Constants, formulae: Formulae, variant: string) => result.outcome(parcelContext(given, constants, formulae), origin, isVirtual, variant)
  return {
    key: `${origin}-parcel-${result.key}${isVirtual ? '-virtual' : ''}`,
    name: `${result.name} of the ${words.title}${isVirtual ? ', with virtual correction' : ''}`,
    symbol: result.symbol,
    unit: result.unit,
    shownUnit: result.shownUnit,
    kind: result.kind,
    nearZero: result.nearZero,
    inputs,
    variants: result.variants.map(variant => ({ ...variant, evaluate: (given, constants, formulae) => outcomeOf(given, constants, formulae, variant.key) })),
    constants: ascentConstants,
    uses: origin === 'most-unstable' ? [...ascentUses, equivalentKey] : ascentUses,
    notes: given => notesOf(given),
    classLimits: result.classLimits,
    ask: `${result.ask} The parcel is ${words.ask}, lifted dry to its condensation level and along the pseudoadiabat above${result.hasVirtual ? `; it is compared with its surroundings at one pressure${correction}` : ''}. Between rows temperature is linear in ln p.`,
    trace(given, constants, variant, formulae) {
      const context = parcelContext(given, constants, formulae), parcel = context.parcel(origin)
      if (!parcel) return [{ text: 'The data end within the layer of the parcel', formula: 'p_{top}', filled: 'p_{top}' }]
      const lcl = context.lcl(parcel), outcome = outcomeOf(given, constants, formulae, variant)
      const first: TraceStep[] = [
        { text: `The parcel: ${words.short}`, formula: 'p,\\,T,\\,T_d,\\,w', filled: `p = ${texQuantity(parcel.pressure / 100, 'hPa')},\\ T = ${texQuantity(parcel.temperature - zeroCelsius, 'Cel')},\\ T_d = ${texQuantity(parcel.dewpoint - zeroCelsius, 'Cel')},\\ w = ${texQuantity(parcel.mixingRatio * 1000, 'g/kg')}` },
        { text: 'Its condensation level', formula: 'p_{LCL},\\,T_{LCL}', filled: `p_{LCL} = ${texQuantity(lcl.pressure / 100, 'hPa')},\\ T_{LCL} = ${texQuantity(lcl.temperature - zeroCelsius, 'Cel')}` },
      ]
      return outcome.is === 'value' ? [...first, ...result.trace(context, origin, isVirtual, outcome.value)] : first
    },
    slips: result.slips(origin, isVirtual),
    example: { inputs: { ...exampleSounding, ...exampleMore[origin] }, ...example },
  }

  function notesOf(given: Inputs): readonly string[] {
    const supersaturated = seriesOf(given, 'dewpoint').some((Td, at) => Td > (seriesOf(given, 'temperature')[at] ?? Infinity))
    return supersaturated ? ['In some rows the dewpoint lies above the temperature; they are taken as they stand.'] : []
  }
}

export const levelStep = (text: string, symbol: string, pressure: number): TraceStep => ({ text, formula: symbol, filled: `${symbol} = ${texQuantity(pressure / 100, 'hPa')}`, value: pressure, unit: 'Pa' })
export const energyStep = (text: string, formula: string, symbol: string, value: number): TraceStep => ({ text, formula, filled: `${symbol} = ${texNumber(value)}\\,\\mathrm{J\\,kg^{-1}}`, value, unit: 'J/kg' })
