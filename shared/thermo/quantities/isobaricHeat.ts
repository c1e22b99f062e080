import { perKilogram } from '../firstLaw'

/** Heat taken up, isobaric: cp ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const isobaricHeatDefinition = perKilogram({
  key: 'isobaric-heat',
  name: 'heat taken up, isobaric',
  symbol: 'q',
  tex: 'q',
  process: 'isobaric',
  coefficient: 'cp',
  sign: 1,
  ask: 'The heat q that the air takes up at constant pressure, positive when taken up, per kilogram of dry air.',
  signSentence: 'The heat is counted positive when the air takes it up.',
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 25100, within: 1 },
})
