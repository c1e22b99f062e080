import { perKilogram } from '../firstLaw'

/** Change of internal energy, isochoric: cv ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const isochoricInternalEnergyChangeDefinition = perKilogram({
  key: 'isochoric-internal-energy-change',
  name: 'change of internal energy, isochoric',
  symbol: 'Δu',
  tex: '\\Delta u',
  process: 'isochoric',
  coefficient: 'cv',
  sign: 1,
  ask: 'The change of internal energy Δu at constant volume, end less start, per kilogram of dry air.',
  signSentence: 'A change is the end less the start.',
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 14340.0, within: 0.1 },
})
