import { seaLevelReduction } from '../seaLevelReduction'

/** Pressure reduced to sea level, 6.5 K km⁻¹. Formula, source and range: `seaLevelReduction.ts`. */
export const seaLevelPressureDefinition = seaLevelReduction({
  key: 'sea-level-pressure',
  name: 'pressure reduced to sea level, 6.5 K km⁻¹',
  symbol: 'p₀',
  to: 'sea level',
  mean: 'standard lapse rate',
  ask: 'The pressure p₀ reduced to mean sea level through fictitious air that warms downwards at 6.5 K km⁻¹ from the station’s temperature, with its mean temperature half way.',
  example: { inputs: { stationPressure: 97_500, stationHeight: 320, stationTemperature: 283.15 }, gives: 101325.76, within: 0.01 },
})
