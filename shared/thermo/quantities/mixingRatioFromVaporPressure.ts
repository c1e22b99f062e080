import { mixingRatioDefinition } from '../mixingRatioDefinition'
import { vaporPressureInput } from '../moistInputs'

/** Mixing ratio from a vapor pressure: w = ε e/(p − e). Source and range: `mixingRatioDefinition.ts`. */
export const mixingRatioFromVaporPressureDefinition = mixingRatioDefinition({
  key: 'mixing-ratio-from-vapor-pressure',
  name: 'mixing ratio from the vapor pressure',
  symbol: 'w',
  inputs: [vaporPressureInput],
  vaporPressure: ({ given }) => given('vaporPressure'),
  step: null,
  temperatureName: null,
  inside: [],
  ask: 'The mixing ratio w of the air, mass of vapor per mass of dry air, from its vapor pressure.',
  slips: [],
  example: { inputs: { pressure: 95_461, vaporPressure: 3169.7 }, gives: 0.02135834, within: 1e-8 },
})
