import { firstLawQuantity } from '../energyBalance'

/** Change of pressure, from the heat and the change of temperature. Formula, source and range: `energyBalance.ts`. */
export const pressureChangeFromHeatAndEnthalpyDefinition = firstLawQuantity({
  key: 'pressure-change-from-heat-and-enthalpy',
  name: 'change of pressure, from the heat and the change of temperature',
  symbol: 'Δp',
  form: 'enthalpy',
  unknown: 'other',
  ask: 'The change of pressure Δp = (cp ΔT − q)/α of the air, end less start, for a small change at the mean specific volume α.',
  signSentence: 'A change of pressure is the end less the start.',
  example: { inputs: { heat: 0, temperatureChange: -2, specificVolume: 0.85 }, gives: -2362.3529, within: 0.0001 },
})
