import { perKilogram } from '../firstLaw'

/** Heat taken up, isochoric: cv ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const isochoricHeatDefinition = perKilogram({
  key: 'isochoric-heat',
  name: 'heat taken up, isochoric',
  symbol: 'q',
  tex: 'q',
  process: 'isochoric',
  coefficient: 'cv',
  sign: 1,
  ask: 'The heat q that the air takes up at constant volume, positive when taken up, per kilogram of dry air.',
  signSentence: 'The heat is counted positive when the air takes it up.',
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 14340.0, within: 0.1 },
})
