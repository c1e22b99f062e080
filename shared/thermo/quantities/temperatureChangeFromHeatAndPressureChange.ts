import { firstLawQuantity } from '../energyBalance'

/** Change of temperature, from the heat and the change of pressure. Formula, source and range: `energyBalance.ts`. */
export const temperatureChangeFromHeatAndPressureChangeDefinition = firstLawQuantity({
  key: 'temperature-change-from-heat-and-pressure-change',
  name: 'change of temperature, from the heat and the change of pressure',
  symbol: 'ΔT',
  form: 'enthalpy',
  unknown: 'temperatureChange',
  ask: 'The change of temperature ΔT = (q + α Δp)/cp of the air, end less start, for a small change of pressure Δp at the mean specific volume α.',
  signSentence: 'A change of temperature is the end less the start.',
  example: { inputs: { heat: 0, specificVolume: 0.85, pressureChange: -2000 }, gives: -1.693227, within: 0.000001 },
})
