import { firstLawQuantity } from '../energyBalance'

/** Change of temperature, from the heat and the change of height. Formula, source and range: `energyBalance.ts`. */
export const temperatureChangeFromHeatAndHeightChangeDefinition = firstLawQuantity({
  key: 'temperature-change-from-heat-and-height-change',
  name: 'change of temperature, from the heat and the change of height',
  symbol: 'ΔT',
  form: 'geopotential',
  unknown: 'temperatureChange',
  ask: 'The change of temperature ΔT = (q − g Δz)/cp of the air, end less start, in hydrostatic balance; q is 0 where the change is adiabatic.',
  signSentence: 'A change of temperature is the end less the start.',
  example: { inputs: { heat: 0, heightDifference: 1000 }, gives: -9.770916, within: 0.000001 },
})
