import { perKilogram } from '../firstLaw'

/** Change of internal energy, isobaric: cv ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const isobaricInternalEnergyChangeDefinition = perKilogram({
  key: 'isobaric-internal-energy-change',
  name: 'change of internal energy, isobaric',
  symbol: 'Δu',
  tex: '\\Delta u',
  process: 'isobaric',
  coefficient: 'cv',
  sign: 1,
  ask: 'The change Δu of internal energy at constant pressure, end less start, per kilogram of dry air.',
  signSentence: 'The change is counted end less start.',
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 17925, within: 1 },
})
