import { perKilogram } from '../firstLaw'

/** Change of enthalpy, isochoric: cp ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const isochoricEnthalpyChangeDefinition = perKilogram({
  key: 'isochoric-enthalpy-change',
  name: 'change of enthalpy, isochoric',
  symbol: 'Δh',
  tex: '\\Delta h',
  process: 'isochoric',
  coefficient: 'cp',
  sign: 1,
  ask: 'The change of enthalpy Δh at constant volume, end less start, per kilogram of dry air.',
  signSentence: 'A change is the end less the start.',
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 20080.0, within: 0.1 },
})
