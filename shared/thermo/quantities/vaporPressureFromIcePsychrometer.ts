import { psychrometerDefinition } from '../psychrometerDefinition'

/** Vapor pressure by a psychrometer with ice. Formula and source: `psychrometerDefinition.ts`; coefficients: `wetBulb.ts`. */
export const vaporPressureFromIcePsychrometerDefinition = psychrometerDefinition({
  key: 'vapor-pressure-from-ice-psychrometer',
  name: 'vapor pressure by a psychrometer with ice',
  bulb: 'ice',
  gives: 'vapor-pressure',
  example: { inputs: { pressure: 90_000, temperature: 270.15, wetBulb: 268.65 }, gives: 341.640, within: 0.001 },
})
