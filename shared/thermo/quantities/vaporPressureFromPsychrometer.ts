import { psychrometerDefinition } from '../psychrometerDefinition'

/** Vapor pressure by a ventilated psychrometer. Formula and source: `psychrometerDefinition.ts`; coefficients: `wetBulb.ts`. */
export const vaporPressureFromPsychrometerDefinition = psychrometerDefinition({
  key: 'vapor-pressure-from-psychrometer',
  name: 'vapor pressure by a ventilated psychrometer',
  bulb: 'ventilated',
  gives: 'vapor-pressure',
  example: { inputs: { pressure: 100_000, temperature: 293.15, wetBulb: 288.15 }, gives: 1372.926, within: 0.001 },
})
