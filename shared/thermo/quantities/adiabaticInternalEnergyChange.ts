import { perKilogram } from '../firstLaw'

/** Change of internal energy, adiabatic: cv ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const adiabaticInternalEnergyChangeDefinition = perKilogram({
  key: 'adiabatic-internal-energy-change',
  name: 'change of internal energy, adiabatic',
  symbol: 'Δu',
  tex: '\\Delta u',
  process: 'adiabatic',
  coefficient: 'cv',
  sign: 1,
  ask: 'The change Δu of internal energy in a dry-adiabatic change of pressure, end less start, per kilogram of dry air.',
  signSentence: 'The change is counted end less start: air that expands adiabatically loses internal energy.',
  example: { inputs: { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: -20371, within: 5 },
})
