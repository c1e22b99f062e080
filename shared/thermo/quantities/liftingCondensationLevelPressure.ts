import { pow } from '../../numerics/elementary'
import { lclDefinition, lclOf } from '../lclDefinition'
import { fineMoistSlip, moistSlip } from '../moistQuantity'
import { kilopascalSlip, pascalSlip } from '../moistSlips'
import { zeroCelsius } from '../slips'

/** Pressure at the lifting condensation level. Formulae and sources: `liftingCondensation.ts`. */
export const liftingCondensationLevelPressureDefinition = lclDefinition({
  key: 'lifting-condensation-level-pressure',
  name: 'pressure at the lifting condensation level',
  symbol: 'p_L',
  unit: 'Pa', shownUnit: 'hPa', kind: 'ratio',
  part: 'pressure',
  ask: 'The pressure at the lifting condensation level of a parcel lifted dry-adiabatically from the start.',
  slips: [
    fineMoistSlip('from-1000', '1000 hPa for the start', 'This starts from 1000 hPa: the parcel starts at the pressure given.', ({ given, right }) => given('pressure') === 100_000 ? null : right * 100_000 / given('pressure')),
    fineMoistSlip('dewpoint', 'dewpoint for the temperature at the level', 'This comes from the dewpoint at the start in place of the temperature at the level.', ({ given, air }) => given('dewpoint') >= given('temperature') ? null : given('pressure') * pow(given('dewpoint') / given('temperature'), 1 / air.kappa)),
    moistSlip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This comes from temperatures in °C: Poisson’s relation takes kelvin.', (hand) => {
      const T = hand.given('temperature') - zeroCelsius, TL = lclOf(hand).temperature - zeroCelsius
      return T > 0 && TL > 0 && TL < T ? hand.given('pressure') * pow(TL / T, 1 / hand.air.kappa) : null
    }),
    moistSlip('inverted-exponent', 'exponent turned round', 'This comes from the exponent κ in place of 1/κ.', hand => hand.given('dewpoint') >= hand.given('temperature') ? null : hand.given('pressure') * pow(lclOf(hand).temperature / hand.given('temperature'), hand.air.kappa)),
    moistSlip('inverted-ratio', 'ratio turned round', 'This lies below the start: the ratio of the temperatures is turned round.', ({ given, right }) => given('dewpoint') >= given('temperature') ? null : given('pressure') * given('pressure') / right),
    pascalSlip, kilopascalSlip,
  ],
  example: { inputs: { pressure: 94_300, temperature: 306.15, dewpoint: 301.15 }, gives: 87_755, within: 1 },
})
