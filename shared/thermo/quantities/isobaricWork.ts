import { perKilogram } from '../firstLaw'

/** Work done by the air, isobaric: R ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const isobaricWorkDefinition = perKilogram({
  key: 'isobaric-work',
  name: 'work done by the air, isobaric',
  symbol: 'w',
  tex: 'w',
  process: 'isobaric',
  coefficient: 'R',
  sign: 1,
  ask: 'The work w done by the air at constant pressure, positive when the air expands, per kilogram of dry air.',
  signSentence: 'The work is counted positive when the air does it, by expanding.',
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 7175, within: 1 },
})
