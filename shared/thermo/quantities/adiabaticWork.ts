import { perKilogram } from '../firstLaw'

/** Work done by the air, adiabatic: −cv ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const adiabaticWorkDefinition = perKilogram({
  key: 'adiabatic-work',
  name: 'work done by the air, adiabatic',
  symbol: 'w',
  tex: 'w',
  process: 'adiabatic',
  coefficient: 'cv',
  sign: -1,
  ask: 'The work w done by the air in a dry-adiabatic change of pressure, positive when the air expands, per kilogram of dry air.',
  signSentence: 'The work is counted positive when the air does it, by expanding.',
  example: { inputs: { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 20371, within: 5 },
})
