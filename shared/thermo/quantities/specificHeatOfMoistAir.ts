import { constant } from '../constants'
import { moistHeatDefinition } from '../moistHeatDefinition'

/** Specific heat of moist air at constant pressure, per kilogram of moist air. Formula and source: `moistHeatDefinition.ts`. */
export const specificHeatOfMoistAirDefinition = moistHeatDefinition({
  key: 'specific-heat-of-moist-air',
  name: 'specific heat of moist air at constant pressure',
  symbol: 'c_pm',
  ask: 'The specific heat of the moist air at constant pressure, per kilogram of moist air.',
  constants: ['cp', 'cpv'],
  tex: 'c_{pm}',
  dryTex: 'c_p', vaporTex: 'c_{pv}',
  dry: constants => constant(constants, 'cp'),
  vapor: constants => constant(constants, 'cpv'),
  example: { inputs: { mixingRatio: 0.015 }, gives: 1016.798, within: 0.001 },
})
