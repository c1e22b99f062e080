import { seaLevelReduction } from '../seaLevelReduction'

/** Station pressure from the pressure at sea level, isothermal. Formula, source and range: `seaLevelReduction.ts`. */
export const stationPressureIsothermalDefinition = seaLevelReduction({
  key: 'station-pressure-isothermal',
  name: 'station pressure from the pressure at sea level, isothermal',
  symbol: 'p_s',
  to: 'station',
  mean: 'isothermal',
  ask: 'The pressure p_s at the station from the pressure reduced to mean sea level, through fictitious air of the station’s temperature throughout (isothermal).',
  example: { inputs: { seaLevelPressure: 101_325, stationHeight: 320, stationTemperature: 283.15 }, gives: 97485.49, within: 0.01 },
})
