import { mixingRatioDefinition } from '../mixingRatioDefinition'
import { temperatureInput } from '../moistInputs'
import { fineMoistSlip } from '../moistQuantity'
import { saturationStep } from '../moistTex'
import { iceSaturationPressureFunction } from '../saturationFunction'

/** Mixing ratio of air saturated over ice: wᵢ = ε eᵢ/(p − eᵢ). Source and range: `mixingRatioDefinition.ts`. */
export const saturationMixingRatioOverIceDefinition = mixingRatioDefinition({
  key: 'saturation-mixing-ratio-over-ice',
  name: 'saturation mixing ratio over ice',
  symbol: 'w_i',
  inputs: [{ ...temperatureInput, range: [160, 273.16] }],
  vaporPressure: ({ given, constants, formulae }) => iceSaturationPressureFunction(constants, formulae)(given('temperature')),
  step: ({ given }, e) => ({ ...saturationStep('e', 'T', given('temperature'), e, 'Saturation vapor pressure over ice'), formula: 'e = e_i(T)' }),
  temperatureName: 'temperature',
  inside: ['ei'],
  ask: 'The mixing ratio of air that is saturated over ice at the temperature and the pressure.',
  slips: [
    fineMoistSlip('water-for-ice', 'over water for over ice', 'This comes from the vapor pressure over liquid water; asked is saturation over ice.', ({ given, air }) => {
      const e = air.es(given('temperature'))
      return air.epsilon * e / (given('pressure') - e)
    }),
  ],
  example: { inputs: { pressure: 70_000, temperature: 258.15 }, gives: 0.001471929, within: 1e-9 },
})
