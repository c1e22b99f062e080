import { psychrometerDefinition } from '../psychrometerDefinition'

/** Relative humidity by a psychrometer in a screen. Formula and source: `psychrometerDefinition.ts`; coefficients: `wetBulb.ts`. */
export const relativeHumidityFromScreenPsychrometerDefinition = psychrometerDefinition({
  key: 'relative-humidity-from-screen-psychrometer',
  name: 'relative humidity by a psychrometer in a screen',
  bulb: 'screen',
  gives: 'relative-humidity',
  example: { inputs: { pressure: 100_000, temperature: 293.15, wetBulb: 288.15 }, gives: 0.5582281, within: 1e-6 },
})
