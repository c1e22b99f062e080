import { seaLevelReduction } from '../seaLevelReduction'

/** Station pressure from the pressure at sea level, 6.5 K km⁻¹. Formula, source and range: `seaLevelReduction.ts`. */
export const stationPressureDefinition = seaLevelReduction({
  key: 'station-pressure',
  name: 'station pressure from the pressure at sea level, 6.5 K km⁻¹',
  symbol: 'p_s',
  to: 'station',
  mean: 'standard lapse rate',
  ask: 'The pressure p_s at the station from the pressure reduced to mean sea level, through fictitious air that warms downwards at 6.5 K km⁻¹ from the station’s temperature, with its mean temperature half way.',
  example: { inputs: { seaLevelPressure: 101_325, stationHeight: 320, stationTemperature: 283.15 }, gives: 97499.27, within: 0.01 },
})
