import { polytropicQuantity } from '../polytropic'

/** Heat taken up, polytropic, J kg⁻¹. Formula, source and range: `polytropic.ts`. */
export const polytropicHeatDefinition = polytropicQuantity({
  key: 'polytropic-heat',
  name: 'heat taken up, polytropic',
  symbol: 'q',
  of: 'heat',
  ask: 'The heat q that the air takes up in a polytropic change of pressure (p αⁿ constant), positive when taken up, per kilogram of dry air.',
  signSentence: 'The heat is counted positive when the air takes it up.',
  example: { inputs: { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000, polytropicExponent: 1.2 }, gives: 12147.6, within: 0.1 },
})
