import { psychrometerDefinition } from '../psychrometerDefinition'

/** Relative humidity by a ventilated psychrometer. Formula and source: `psychrometerDefinition.ts`; coefficients: `wetBulb.ts`. */
export const relativeHumidityFromPsychrometerDefinition = psychrometerDefinition({
  key: 'relative-humidity-from-psychrometer',
  name: 'relative humidity by a ventilated psychrometer',
  bulb: 'ventilated',
  gives: 'relative-humidity',
  example: { inputs: { pressure: 100_000, temperature: 293.15, wetBulb: 288.15 }, gives: 0.5874871, within: 1e-6 },
})
