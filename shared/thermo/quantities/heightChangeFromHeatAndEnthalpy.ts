import { firstLawQuantity } from '../energyBalance'

/** Change of height, from the heat and the change of temperature. Formula, source and range: `energyBalance.ts`. */
export const heightChangeFromHeatAndEnthalpyDefinition = firstLawQuantity({
  key: 'height-change-from-heat-and-enthalpy',
  name: 'change of height, from the heat and the change of temperature',
  symbol: 'Δz',
  form: 'geopotential',
  unknown: 'other',
  ask: 'The change of height Δz = (q − cp ΔT)/g of the air, end less start, in hydrostatic balance; q is 0 where the change is adiabatic.',
  signSentence: 'A change of height is the end less the start.',
  example: { inputs: { heat: 0, temperatureChange: -9.8 }, gives: 1002.9766, within: 0.0001 },
})
