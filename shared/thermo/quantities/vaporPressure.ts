import { dewpointInput, temperatureForSlips } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { atTemperatureSlip, kilopascalSlip, overIce, pascalSlip } from '../moistSlips'
import { saturationStep } from '../moistTex'
import { glossary } from '../sources'
import { zeroCelsius } from '../slips'

/** Vapor pressure of air with a dewpoint: e = eₛ(T_d), by the definition of the dewpoint. Formulae of eₛ: `saturation.ts`. */
export const vaporPressureDefinition = moistQuantity({
  key: 'vapor-pressure',
  name: 'vapor pressure',
  symbol: 'e',
  unit: 'Pa', shownUnit: 'hPa', kind: 'ratio',
  inputs: [dewpointInput, temperatureForSlips],
  variants: [{ key: 'at-dewpoint', label: 'that of saturation at the dewpoint', source: glossary('dewpoint'), validity: 'as of the formula of eₛ', knownError: '0.1 to 0.3 % by the formula of eₛ', value: ({ given, air }) => air.es(given('dewpoint')) }],
  constants: ['enhancementFactor'],
  inside: ['es'],
  notedAt: { es: given => [given('dewpoint')] },
  ask: 'The vapor pressure e of the air from its dewpoint over liquid water.',
  working: ({ given }, value) => [saturationStep('e', 'T_d', given('dewpoint'), value, 'By the definition of the dewpoint')],
  slips: [
    atTemperatureSlip('the vapor pressure'),
    fineMoistSlip('ice-for-water', 'over ice for over water', 'This is the vapor pressure over ice at the dewpoint; a dewpoint refers to liquid water, also below 0 °C.', hand => overIce(hand, hand.given('dewpoint'))),
    moistSlip('sign', 'sign of the dewpoint lost', 'This comes from the dewpoint with its sign turned round.', ({ given, again }) => given('dewpoint') > 220 && given('dewpoint') < 330 && given('dewpoint') !== zeroCelsius ? again({ dewpoint: 2 * zeroCelsius - given('dewpoint') }) : null),
    pascalSlip, kilopascalSlip,
  ],
  example: { inputs: { dewpoint: 285.15 }, gives: 1401.539, within: 0.001 },
})
