import { mixingRatioDefinition } from '../mixingRatioDefinition'
import { temperatureInput } from '../moistInputs'
import { fineMoistSlip } from '../moistQuantity'
import { overIce } from '../moistSlips'
import { saturationStep } from '../moistTex'

/** Mixing ratio of air saturated over liquid water: wₛ = ε eₛ/(p − eₛ). Source and range: `mixingRatioDefinition.ts`. */
export const saturationMixingRatioDefinition = mixingRatioDefinition({
  key: 'saturation-mixing-ratio',
  name: 'saturation mixing ratio over liquid water',
  symbol: 'w_s',
  inputs: [temperatureInput],
  vaporPressure: ({ given, air }) => air.es(given('temperature')),
  step: ({ given }, e) => saturationStep('e', 'T', given('temperature'), e),
  temperatureName: 'temperature',
  inside: ['es'],
  ask: 'The mixing ratio of air that is saturated over liquid water at the temperature and the pressure.',
  slips: [
    fineMoistSlip('ice-for-water', 'over ice for over water', 'This comes from the vapor pressure over ice; asked is saturation over liquid water, also below 0 °C.', (hand) => {
      const e = overIce(hand, hand.given('temperature'))
      return e === null ? null : hand.air.epsilon * e / (hand.given('pressure') - e)
    }),
  ],
  example: { inputs: { pressure: 101_325, temperature: 298.15 }, gives: 0.02006750, within: 1e-8 },
})
