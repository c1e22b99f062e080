import { firstLawQuantity } from '../energyBalance'

/** Heat taken up, from the change of temperature and the work. Formula, source and range: `energyBalance.ts`. */
export const heatFromInternalEnergyAndWorkDefinition = firstLawQuantity({
  key: 'heat-from-internal-energy-and-work',
  name: 'heat taken up, from the change of temperature and the work',
  symbol: 'q',
  form: 'internal-energy',
  unknown: 'heat',
  ask: 'The heat q = cv ΔT + w that the air takes up, positive when taken up, with w the work done by the air, per kilogram of dry air.',
  signSentence: 'The heat is counted positive when the air takes it up.',
  example: { inputs: { temperatureChange: 10, work: 2870 }, gives: 10040, within: 0.1 },
})
