import { psychrometerDefinition } from '../psychrometerDefinition'

/** Relative humidity by a psychrometer with ice. Formula and source: `psychrometerDefinition.ts`; coefficients: `wetBulb.ts`. */
export const relativeHumidityFromIcePsychrometerDefinition = psychrometerDefinition({
  key: 'relative-humidity-from-ice-psychrometer',
  name: 'relative humidity by a psychrometer with ice',
  bulb: 'ice',
  gives: 'relative-humidity',
  example: { inputs: { pressure: 90_000, temperature: 270.15, wetBulb: 268.65 }, gives: 0.6968049, within: 1e-6 },
})
