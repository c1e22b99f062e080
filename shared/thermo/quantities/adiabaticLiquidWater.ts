import { OutOfRangeError } from '../errors'
import { mixingRatioFrom } from '../humidity'
import { lclFunction, lclTemperatureKey } from '../liftingCondensation'
import { dewpointInput, pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, foggy, moistQuantity, moistSlip, type Hand } from '../moistQuantity'
import { kilogramSlip } from '../moistSlips'
import { inCelsius, inGrams, inHectopascal } from '../moistTex'
import { pseudoadiabaticTemperature } from '../pseudoadiabat'
import { reversibleTemperature } from '../reversiblePath'
import { pow } from '../../numerics/elementary'

const lclOf = ({ given, constants, formulae }: Hand) => lclFunction(constants, formulae)(given('temperature'), given('dewpoint'), given('pressureStart'))
const waterOf = ({ given, air }: Hand) => mixingRatioFrom(air.es(Math.min(given('dewpoint'), given('temperature'))), given('pressureStart'), air.epsilon)

/** Temperature at the end: dry up to the level, saturated above. */
function endTemperature(hand: Hand): number {
  const { given, air, variant } = hand
  const lcl = lclOf(hand), end = given('pressureEnd')
  if (end >= lcl.pressure) return given('temperature') * pow(end / given('pressureStart'), air.kappa)
  return variant === 'reversible' ? reversibleTemperature(lcl.temperature, lcl.pressure, end, waterOf(hand), air) : pseudoadiabaticTemperature(lcl.temperature, lcl.pressure, end, air)
}

/** @throws {OutOfRangeError} where the end lies below the start */
function liquid(hand: Hand): number {
  const { given, air } = hand
  if (given('pressureEnd') > given('pressureStart')) throw new OutOfRangeError('pressureEnd', given('pressureEnd'), `pressures up to ${given('pressureStart')} Pa, that of the start`)
  if (given('pressureEnd') >= lclOf(hand).pressure) return 0
  return waterOf(hand) - mixingRatioFrom(air.es(endTemperature(hand)), given('pressureEnd'), air.epsilon)
}

/**
 * Adiabatic liquid water: what has condensed out of a parcel that is lifted without mixing, w_l = w − wₛ(T, p), along the saturated adiabat from its
 * condensation level. Source: AMS Glossary of Meteorology, "adiabatic liquid water content". Zero below the level.
 */
export const adiabaticLiquidWaterDefinition = moistQuantity({
  key: 'adiabatic-liquid-water',
  name: 'adiabatic liquid water mixing ratio',
  symbol: 'w_l',
  unit: '1', shownUnit: 'g/kg', kind: 'ratio',
  nearZero: 0.0001,
  inputs: [
    { ...pressureInput, name: 'pressureStart', label: 'pressure at the start', symbol: 'p₁' },
    { ...temperatureInput, label: 'temperature at the start' },
    { ...dewpointInput, label: 'dewpoint at the start' },
    { ...pressureInput, name: 'pressureEnd', label: 'pressure at the end', symbol: 'p₂' },
  ],
  variants: [
    { key: 'pseudoadiabat', label: 'with the temperature of the pseudoadiabat', source: { text: 'AMS Glossary of Meteorology, "adiabatic liquid water content"', status: 'common practice' }, validity: 'over liquid water', knownError: '1 % against the reversible path', value: liquid },
    { key: 'reversible', label: 'with the temperature of the reversible path', source: { text: 'AMS Glossary of Meteorology, "adiabatic liquid water content"; Emanuel (1994), Eq. 4.5.9', status: 'common practice' }, validity: 'over liquid water', knownError: '0.5 %', value: liquid },
  ],
  constants: ['R', 'Rv', 'cp', 'kappa', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  inside: ['es', 'L', lclTemperatureKey],
  notedAt: { es: given => [given('dewpoint')] },
  remarks: (hand, value) => [foggy(hand.given('temperature'), hand.given('dewpoint')), value === 0 ? 'The end lies below the condensation level: nothing has condensed.' : null],
  ask: 'The liquid water that has condensed per kilogram of dry air in a parcel lifted adiabatically, without mixing and without fallout, over liquid water.',
  working: (hand, value) => {
    const { given, air } = hand, lcl = lclOf(hand), T = endTemperature(hand), ws = mixingRatioFrom(air.es(T), given('pressureEnd'), air.epsilon)
    if (value === 0) return [{ text: 'The end lies below the condensation level: nothing has condensed', formula: 'w_l = 0', filled: `p_L = ${inHectopascal(lcl.pressure)},\\ w_l = 0` }]
    return [
      { text: 'Mixing ratio at the start', formula: 'w = w_s(T_d)', filled: `w = ${inGrams(waterOf(hand))}`, value: waterOf(hand), unit: '1' },
      { text: 'Lifting condensation level', formula: 'T_L,\\ p_L', filled: `T_L = ${inCelsius(lcl.temperature)},\\ p_L = ${inHectopascal(lcl.pressure)}`, value: lcl.temperature, unit: 'K' },
      { text: 'Temperature at the end, along the saturated adiabat', formula: 'T_2', filled: `T_2 = ${inCelsius(T)}`, value: T, unit: 'K' },
      { text: 'What no longer stays vapor', formula: 'w_l = w - w_s(T_2, p_2)', filled: `w_l = ${inGrams(waterOf(hand))} - ${inGrams(ws)} = ${inGrams(value)}` },
    ]
  },
  slips: [
    moistSlip('vapor', 'vapor that is left', 'This is the vapor that is left at the end: asked is what has condensed.', (hand) => hand.right === 0 ? null : waterOf(hand) - hand.right),
    fineMoistSlip('dry', 'dry adiabat above the level', 'This takes the temperature of the dry adiabat above the condensation level: it is too cold, and too much condenses.', (hand) => {
      const T = hand.given('temperature') * pow(hand.given('pressureEnd') / hand.given('pressureStart'), hand.air.kappa)
      return hand.right === 0 ? null : waterOf(hand) - mixingRatioFrom(hand.air.es(T), hand.given('pressureEnd'), hand.air.epsilon)
    }),
    moistSlip('all', 'all of its vapor', 'This is the mixing ratio at the start: not all of it has condensed.', hand => waterOf(hand)),
    kilogramSlip,
  ],
  example: { inputs: { pressureStart: 95_000, temperature: 293.15, dewpoint: 288.15, pressureEnd: 80_000 }, gives: 0.001689933, within: 1e-8 },
})
