import { firstLawQuantity } from '../energyBalance'

/** Work done by the air, from the heat and the change of temperature. Formula, source and range: `energyBalance.ts`. */
export const workFromHeatAndInternalEnergyDefinition = firstLawQuantity({
  key: 'work-from-heat-and-internal-energy',
  name: 'work done by the air, from the heat and the change of temperature',
  symbol: 'w',
  form: 'internal-energy',
  unknown: 'other',
  ask: 'The work w = q − cv ΔT done by the air, positive when the air expands, with q the heat taken up, per kilogram of dry air.',
  signSentence: 'The work is counted positive when the air does it, by expanding.',
  example: { inputs: { heat: 10_040, temperatureChange: 10 }, gives: 2870, within: 0.1 },
})
