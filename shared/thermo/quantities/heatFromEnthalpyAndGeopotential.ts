import { firstLawQuantity } from '../energyBalance'

/** Heat taken up, from the changes of temperature and height. Formula, source and range: `energyBalance.ts`. */
export const heatFromEnthalpyAndGeopotentialDefinition = firstLawQuantity({
  key: 'heat-from-enthalpy-and-geopotential',
  name: 'heat taken up, from the changes of temperature and height',
  symbol: 'q',
  form: 'geopotential',
  unknown: 'heat',
  ask: 'The heat q = cp ΔT + g Δz that the air takes up, positive when taken up, in hydrostatic balance, per kilogram of dry air.',
  signSentence: 'The heat is counted positive when the air takes it up.',
  example: { inputs: { temperatureChange: -5, heightDifference: 1000 }, gives: 4790.0, within: 0.1 },
})
