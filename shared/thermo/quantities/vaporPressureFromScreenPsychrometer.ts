import { psychrometerDefinition } from '../psychrometerDefinition'

/** Vapor pressure by a psychrometer in a screen. Formula and source: `psychrometerDefinition.ts`; coefficients: `wetBulb.ts`. */
export const vaporPressureFromScreenPsychrometerDefinition = psychrometerDefinition({
  key: 'vapor-pressure-from-screen-psychrometer',
  name: 'vapor pressure by a psychrometer in a screen',
  bulb: 'screen',
  gives: 'vapor-pressure',
  example: { inputs: { pressure: 100_000, temperature: 293.15, wetBulb: 288.15 }, gives: 1304.549, within: 0.001 },
})
