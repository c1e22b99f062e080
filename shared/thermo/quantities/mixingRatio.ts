import { mixingRatioDefinition as mixingRatioBy } from '../mixingRatioDefinition'
import { dewpointInput, temperatureForSlips } from '../moistInputs'
import { fineMoistSlip } from '../moistQuantity'
import { atTemperatureSlip, overIce } from '../moistSlips'
import { saturationStep } from '../moistTex'

/** Mixing ratio of air with a dewpoint: w = ε e/(p − e) with e = eₛ(T_d). Source and range: `mixingRatioDefinition.ts`. */
export const mixingRatioDefinition = mixingRatioBy({
  key: 'mixing-ratio',
  name: 'mixing ratio',
  symbol: 'w',
  inputs: [dewpointInput, temperatureForSlips],
  vaporPressure: ({ given, air }) => air.es(given('dewpoint')),
  step: ({ given }, e) => saturationStep('e', 'T_d', given('dewpoint'), e, 'Vapor pressure: that of saturation at the dewpoint'),
  temperatureName: 'dewpoint',
  inside: ['es'],
  ask: 'The mixing ratio w of the air, mass of vapor per mass of dry air, from its dewpoint over liquid water.',
  slips: [
    atTemperatureSlip('the mixing ratio'),
    fineMoistSlip('ice-for-water', 'over ice for over water', 'This comes from the vapor pressure over ice; a dewpoint refers to liquid water, also below 0 °C.', (hand) => {
      const e = overIce(hand, hand.given('dewpoint'))
      return e === null ? null : hand.air.epsilon * e / (hand.given('pressure') - e)
    }),
  ],
  example: { inputs: { pressure: 95_900, dewpoint: 292.15 }, gives: 0.01457423, within: 1e-8 },
})
