import { firstLawQuantity } from '../energyBalance'

/** Heat taken up, from the changes of temperature and pressure. Formula, source and range: `energyBalance.ts`. */
export const heatFromEnthalpyAndPressureChangeDefinition = firstLawQuantity({
  key: 'heat-from-enthalpy-and-pressure-change',
  name: 'heat taken up, from the changes of temperature and pressure',
  symbol: 'q',
  form: 'enthalpy',
  unknown: 'heat',
  ask: 'The heat q = cp ΔT − α Δp that the air takes up, positive when taken up, for a small change of pressure Δp at the mean specific volume α, per kilogram of dry air.',
  signSentence: 'The heat is counted positive when the air takes it up.',
  example: { inputs: { temperatureChange: 5, specificVolume: 0.85, pressureChange: -2000 }, gives: 6720.0, within: 0.1 },
})
