import { seaLevelReduction } from '../seaLevelReduction'

/** Pressure reduced to sea level, isothermal. Formula, source and range: `seaLevelReduction.ts`. */
export const seaLevelPressureIsothermalDefinition = seaLevelReduction({
  key: 'sea-level-pressure-isothermal',
  name: 'pressure reduced to sea level, isothermal',
  symbol: 'p₀',
  to: 'sea level',
  mean: 'isothermal',
  ask: 'The pressure p₀ reduced to mean sea level through fictitious air of the station’s temperature throughout (isothermal).',
  example: { inputs: { stationPressure: 97_500, stationHeight: 320, stationTemperature: 283.15 }, gives: 101340.08, within: 0.01 },
})
