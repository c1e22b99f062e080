import { perKilogram } from '../firstLaw'

/** Change of enthalpy, isobaric: cp ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const isobaricEnthalpyChangeDefinition = perKilogram({
  key: 'isobaric-enthalpy-change',
  name: 'change of enthalpy, isobaric',
  symbol: 'Δh',
  tex: '\\Delta h',
  process: 'isobaric',
  coefficient: 'cp',
  sign: 1,
  ask: 'The change Δh of enthalpy at constant pressure, end less start, per kilogram of dry air.',
  signSentence: 'The change is counted end less start.',
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 25100, within: 1 },
})
