import { firstLawQuantity } from '../energyBalance'

/** Change of temperature, from the heat and the work. Formula, source and range: `energyBalance.ts`. */
export const temperatureChangeFromHeatAndWorkDefinition = firstLawQuantity({
  key: 'temperature-change-from-heat-and-work',
  name: 'change of temperature, from the heat and the work',
  symbol: 'ΔT',
  form: 'internal-energy',
  unknown: 'temperatureChange',
  ask: 'The change of temperature ΔT = (q − w)/cv of the air, end less start, with q the heat taken up and w the work done by the air.',
  signSentence: 'A change of temperature is the end less the start.',
  example: { inputs: { heat: 10_040, work: 2870 }, gives: 10, within: 0.0001 },
})
