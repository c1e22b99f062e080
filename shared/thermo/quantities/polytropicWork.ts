import { polytropicQuantity } from '../polytropic'

/** Work done by the air, polytropic, J kg⁻¹. Formula, source and range: `polytropic.ts`. */
export const polytropicWorkDefinition = polytropicQuantity({
  key: 'polytropic-work',
  name: 'work done by the air, polytropic',
  symbol: 'w',
  of: 'work',
  ask: 'The work w done by the air in a polytropic change of pressure (p αⁿ constant), positive when the air expands, per kilogram of dry air.',
  signSentence: 'The work is counted positive when the air does it, by expanding.',
  example: { inputs: { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000, polytropicExponent: 1.2 }, gives: 24278.3, within: 0.1 },
})
