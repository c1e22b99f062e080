import { perKilogram } from '../firstLaw'

/** Change of enthalpy, adiabatic: cp ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const adiabaticEnthalpyChangeDefinition = perKilogram({
  key: 'adiabatic-enthalpy-change',
  name: 'change of enthalpy, adiabatic',
  symbol: 'Δh',
  tex: '\\Delta h',
  process: 'adiabatic',
  coefficient: 'cp',
  sign: 1,
  ask: 'The change Δh of enthalpy in a dry-adiabatic change of pressure, end less start, per kilogram of dry air.',
  signSentence: 'The change is counted end less start: air that expands adiabatically loses enthalpy.',
  example: { inputs: { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: -28525, within: 5 },
})
