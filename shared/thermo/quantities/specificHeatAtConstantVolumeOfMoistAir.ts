import { constant } from '../constants'
import { moistHeatDefinition } from '../moistHeatDefinition'

/** Specific heat of moist air at constant volume, per kilogram of moist air; that of the vapor is cpv − Rv. Formula and source: `moistHeatDefinition.ts`. */
export const specificHeatAtConstantVolumeOfMoistAirDefinition = moistHeatDefinition({
  key: 'specific-heat-at-constant-volume-of-moist-air',
  name: 'specific heat of moist air at constant volume',
  symbol: 'c_vm',
  ask: 'The specific heat of the moist air at constant volume, per kilogram of moist air.',
  constants: ['cv', 'cpv', 'Rv'],
  tex: 'c_{vm}',
  dryTex: 'c_v', vaporTex: '(c_{pv} - R_v)',
  dry: constants => constant(constants, 'cv'),
  vapor: constants => constant(constants, 'cpv') - constant(constants, 'Rv'),
  example: { inputs: { mixingRatio: 0.015 }, gives: 727.219, within: 0.001 },
})
