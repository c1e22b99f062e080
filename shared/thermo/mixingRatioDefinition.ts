/** Mixing ratios: from a vapor pressure, at the dewpoint, at saturation over water or ice; they differ in where e comes from. */
import type { InputDefinition, QuantityDefinition, TraceStep } from './definition'
import { mixingRatioFrom } from './humidity'
import { pressureInput } from './moistInputs'
import { moistQuantity, moistSlip, smallMoistSlip, type Hand, type MoistSlip } from './moistQuantity'
import { kilogramSlip } from './moistSlips'
import { inGrams, mixingRatioStep } from './moistTex'
import { glossary } from './sources'
import { OutOfRangeError } from './errors'
import { texNumber } from './tex'

export interface MixingRatioOf extends Pick<QuantityDefinition, 'key' | 'name' | 'symbol' | 'ask' | 'example'> {
  inputs: readonly InputDefinition[]
  vaporPressure: (hand: Hand) => number
  /** How e comes about; none where it is given. */
  step: ((hand: Hand, e: number) => TraceStep) | null
  temperatureName: 'temperature' | 'dewpoint' | null
  inside: readonly ('es' | 'ei')[]
  slips: readonly MoistSlip[]
}

/** @throws {OutOfRangeError} where the vapor pressure is not below the pressure */
function checkedVapor(hand: Hand, e: number): number {
  if (!(e < hand.given('pressure'))) throw new OutOfRangeError('pressure', hand.given('pressure'), `pressures above the vapor pressure of ${e.toPrecision(5)} Pa`)
  return e
}

export function mixingRatioDefinition({ vaporPressure, step, temperatureName, inside, slips, inputs, ...named }: MixingRatioOf): QuantityDefinition {
  const over = (hand: Hand, ratio: (e: number, p: number) => number) => ratio(vaporPressure(hand), hand.given('pressure'))
  const at = temperatureName
  return moistQuantity({
    ...named,
    unit: '1', shownUnit: 'g/kg', kind: 'ratio',
    inputs: [pressureInput, ...inputs],
    variants: [
      { key: 'exact', label: 'ε e/(p − e)', source: glossary('mixing ratio'), validity: 'e < p', knownError: 'below 0.5 %: the enhancement factor of moist air', value: hand => mixingRatioFrom(checkedVapor(hand, vaporPressure(hand)), hand.given('pressure'), hand.air.epsilon) },
      { key: 'approximate', label: 'ε e/p, as an approximation', source: { text: 'common practice: e neglected against p', status: 'common practice' }, validity: 'cold or dry air', knownError: '1 % at 10 hPa of vapor, 4 % at 40 hPa', value: hand => hand.air.epsilon * checkedVapor(hand, vaporPressure(hand)) / hand.given('pressure') },
    ],
    constants: ['R', 'Rv', ...inside.length > 0 ? ['enhancementFactor'] : []],
    inside,
    notedAt: at === null ? {} : inside.includes('ei') ? { ei: given => [given(at)] } : { es: given => [given(at)] },
    working: (hand, value) => {
      const e = vaporPressure(hand), p = hand.given('pressure'), { epsilon } = hand.air
      const last: TraceStep = hand.variant === 'approximate'
        ? { text: 'Mixing ratio, with e neglected against p', formula: `${named.symbol} = \\varepsilon\\,\\frac{e}{p}`, filled: `${named.symbol} = ${texNumber(epsilon)} \\cdot \\frac{${texNumber(e / 100)}}{${texNumber(p / 100, 6)}} = ${inGrams(value)}` }
        : mixingRatioStep(named.symbol, 'e', e, p, hand.air)
      return step ? [step(hand, e), last] : [last]
    },
    slips: [
      smallMoistSlip('without-e', 'e neglected against p', 'This is ε e/p: in the denominator stands p − e.', hand => hand.variant === 'approximate' ? null : over(hand, (e, p) => hand.air.epsilon * e / p)),
      smallMoistSlip('specific-humidity', 'specific humidity', 'This is the specific humidity, per kilogram of moist air; the mixing ratio is per kilogram of dry air.', hand => hand.right / (1 + hand.right)),
      smallMoistSlip('plus', 'p + e for p − e', 'This comes from p + e in the denominator: the pressure of the dry air is p − e.', hand => over(hand, (e, p) => hand.air.epsilon * e / (p + e))),
      moistSlip('inverted-epsilon', 'ε turned round', 'This comes from 1/ε, the ratio of the gas constants the other way round.', hand => over(hand, (e, p) => e / (hand.air.epsilon * (p - e)))),
      moistSlip('epsilon-left-out', 'ε left out', 'This is e/(p − e): the ratio of the molar masses, ε = 0.622, is missing.', hand => over(hand, (e, p) => e / (p - e))),
      kilogramSlip,
      ...slips,
    ],
  })
}
