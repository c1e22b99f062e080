import { describe, expect, it } from 'vitest'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs, Outcome } from '#shared/thermo/definition'
import { findQuantity } from '#shared/thermo/registry'
import { judgeTyped, kelvins, stepOf } from '../../fixtures/marking/ask'

function outcome(quantity: string, inputs: Inputs): Outcome {
  const definition = findQuantity(quantity)
  if (!definition) throw new Error(quantity)
  return evaluateQuantity(definition, inputs, defaultConvention.constants)
}
function value(quantity: string, inputs: Inputs): number {
  const found = outcome(quantity, inputs)
  return found.is === 'value' ? found.value : NaN
}
const slips = (quantity: string, inputs: Inputs) => Object.fromEntries(judgeTyped(stepOf(quantity, inputs), '').slipValues.map(slip => [slip.key, slip.value]))
const from = (...directions: number[]): number[] => directions.map(d => d * Math.PI / 180)
const degrees = (radians: number): number => radians * 180 / Math.PI

describe('traps W: winds', () => {
  it('W1: 350° and 10° have a mean of 360°, not 180°; 350, 10, 20 of 6.7°, not 126.7°', () => {
    const north = stepOf('mean-wind-direction', { windDirection: from(350, 10) })
    expect(degrees(value('mean-wind-direction', north.inputs))).toBeCloseTo(360, 9)
    for (const typed of ['360', '0', '360°', '0.0 deg']) expect(judgeTyped(north, typed).isAccepted, typed).toBe(true)
    expect(judgeTyped(north, '180')).toMatchObject({ isAccepted: false })
    const three = stepOf('mean-wind-direction', { windDirection: from(350, 10, 20) })
    expect(degrees(value('mean-wind-direction', three.inputs))).toBeCloseTo(6.7, 1)
    expect(judgeTyped(three, '6.7').isAccepted).toBe(true)
    expect(judgeTyped(three, '366.7').isAccepted).toBe(true)
    expect(judgeTyped(three, '126.7')).toMatchObject({ isAccepted: false, slip: { key: 'plain-mean' } })
  })
  it('W1: the turn is taken off a direction alone, and only one', () => {
    const three = stepOf('mean-wind-direction', { windDirection: from(350, 10, 20) })
    expect(judgeTyped(three, '726.7').isAccepted).toBe(false)
    expect(judgeTyped(stepOf('scalar-mean-wind-speed', { windSpeed: [5, 5] }), '365').isAccepted).toBe(false)
  })
  it('W2: 90° and 270° in equal strength have no mean direction: "not defined", which can be typed', () => {
    const opposite = { windSpeed: [4, 4], windDirection: from(90, 270) }
    expect(outcome('mean-wind-direction', opposite)).toMatchObject({ is: 'not_defined' })
    expect(outcome('vector-mean-wind-direction', opposite)).toMatchObject({ is: 'not_defined' })
    expect(judgeTyped(stepOf('mean-wind-direction', opposite), 'not defined').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('mean-wind-direction', opposite), '180').isAccepted).toBe(false)
  })
  it('W3: 5 m/s from 0° and from 90°: the vector mean is 3.54 m/s from 45°, the scalar mean 5.00', () => {
    const two = { windSpeed: [5, 5], windDirection: from(0, 90) }
    expect(value('vector-mean-wind-speed', two)).toBeCloseTo(3.54, 2)
    expect(degrees(value('vector-mean-wind-direction', two))).toBeCloseTo(45, 9)
    expect(value('scalar-mean-wind-speed', two)).toBe(5)
    expect(judgeTyped(stepOf('scalar-mean-wind-speed', two), '3.54')).toMatchObject({ isAccepted: false, slip: { key: 'vector-mean' } })
    expect(judgeTyped(stepOf('vector-mean-wind-speed', { windSpeed: [5, 5], windDirection: from(0, 60) }), '5.00').isAccepted).toBe(false)
    expect(judgeTyped(stepOf('vector-mean-wind-speed', { windSpeed: [5, 5], windDirection: from(0, 60) }), '5.00').slip?.key).toBe('scalar-mean')
  })
  it('W4: u = −s sin d, v = −s cos d: 10 m/s from 270°: u +10, v 0', () => {
    const west = { windSpeed: 10, windDirection: from(270)[0] ?? 0 }
    expect(value('eastward-wind', west)).toBeCloseTo(10, 9)
    expect(value('northward-wind', west)).toBeCloseTo(0, 9)
    expect(judgeTyped(stepOf('eastward-wind', west), '-10')).toMatchObject({ isAccepted: false, slip: { key: 'sign' } })
    expect(judgeTyped(stepOf('northward-wind', west), '0').isAccepted).toBe(true)
  })
  it('W5: calm rows stay out of a mean direction and count with 0 in a mean speed', () => {
    const rows = { windSpeed: [0, 3, 3], windDirection: from(0, 90, 110) }
    expect(degrees(value('mean-wind-direction', rows))).toBeCloseTo(100, 9)
    expect(value('scalar-mean-wind-speed', rows)).toBe(2)
    expect(outcome('mean-wind-direction', { windSpeed: [0, 0], windDirection: from(0, 0) })).toMatchObject({ is: 'not_defined' })
  })
  it('W6: natural logarithm, height above displacement: 5.083 m/s; log₁₀ gives 2.21, a slip', () => {
    const inputs = { frictionVelocity: 0.35, measurementHeight: 10, roughnessLength: 0.03 }
    expect(value('logarithmic-wind-speed', inputs)).toBeCloseTo(5.083, 3)
    expect(slips('logarithmic-wind-speed', inputs)['base-ten']).toBeCloseTo(2.21, 2)
    expect(judgeTyped(stepOf('logarithmic-wind-speed', inputs), '2.21')).toMatchObject({ isAccepted: false, slip: { key: 'base-ten' } })
    expect(value('logarithmic-wind-speed', { ...inputs, measurementHeight: 12, displacementHeight: 2 })).toBeCloseTo(5.083, 3)
    expect(() => outcome('logarithmic-wind-speed', { ...inputs, displacementHeight: 10 })).toThrow('measurementHeight')
  })
  it('W6: the von Kármán constant is 0.40 or 0.41, a spread that the band covers', () => {
    const step = stepOf('logarithmic-wind-speed', { frictionVelocity: 0.35, measurementHeight: 10, roughnessLength: 0.03 })
    expect(judgeTyped(step, '5.08').isAccepted).toBe(true)
    expect(judgeTyped(step, '4.96').isAccepted).toBe(true)
    expect(judgeTyped(step, '4.94').isAccepted).toBe(false)
  })
  it('friction velocity and roughness length of a profile give its wind back', () => {
    const two = { lowHeight: 2, lowSpeed: 3.2, highHeight: 10, highSpeed: 4.6 }
    const found = { frictionVelocity: value('friction-velocity', two), roughnessLength: value('roughness-length', two) }
    expect(value('logarithmic-wind-speed', { ...found, measurementHeight: 2 })).toBeCloseTo(3.2, 9)
    expect(value('logarithmic-wind-speed', { ...found, measurementHeight: 10 })).toBeCloseTo(4.6, 9)
    expect(outcome('roughness-length', { ...two, highSpeed: 3.2 })).toMatchObject({ is: 'not_defined' })
    expect(() => outcome('friction-velocity', { ...two, highHeight: 2 })).toThrow('highHeight')
  })
})

describe('traps W: a sensor’s lag', () => {
  it('W21: in a normal lapse ascent reads too warm, descent too cold, the other way in an inversion: τ 12 s, 2 m/s, 9.8 K/km: 0.235 K, 24 m', () => {
    const inputs = { timeConstant: 12, verticalSpeed: 2, lapseRate: 0.0098 }
    expect(value('sensor-lag-error', inputs)).toBeCloseTo(0.235, 3)
    expect(value('sensor-lag-error', { ...inputs, verticalSpeed: -2 })).toBeCloseTo(-0.235, 3)
    expect(value('sensor-lag-error', { ...inputs, lapseRate: -0.0098 })).toBeCloseTo(-0.235, 3)
    expect(value('sensor-lag-height-shift', { timeConstant: 12, verticalSpeed: 2 })).toBe(24)
    const reading = { indicatedTemperature: 285.55, indicatedLapseRate: 0.0098, timeConstant: 12 }
    expect(value('lag-corrected-temperature-in-flight', { ...reading, verticalSpeed: 2 })).toBeCloseTo(285.55 - 0.2352, 9)
    expect(value('lag-corrected-temperature-in-flight', { ...reading, verticalSpeed: -2 })).toBeCloseTo(285.55 + 0.2352, 9)
    expect(judgeTyped(stepOf('lag-corrected-temperature-in-flight', { ...reading, verticalSpeed: 2 }), '12.64 °C')).toMatchObject({ isAccepted: false, slip: { key: 'sign-of-correction' } })
  })
  it('W22: after its start lag moves a uniform layer’s temperatures and leaves its slope: simulated second by second', () => {
    const tau = 12, w = 2, rate = 0.0065
    const height: number[] = [], temperature: number[] = []
    let shown = 290
    for (let t = 0; t < 400; t++) {
      const air = 290 - rate * w * t
      // exact for a sensor behind a steady change from second to second
      shown = air + tau * rate * w + (shown - (air + rate * w) - tau * rate * w) * Math.exp(-1 / tau)
      if (t >= 120) {
        height.push(w * t)
        temperature.push(shown)
      }
    }
    expect(value('lapse-rate-least-squares', { height, temperature })).toBeCloseTo(rate, 6)
    expect((temperature[200] ?? 0) - (290 - rate * (height[200] ?? 0))).toBeCloseTo(value('sensor-lag-error', { timeConstant: tau, verticalSpeed: w, lapseRate: rate }), 6)
  })
  it('W23: the time constant is an input, found from a step; a sonde in calm air has a longer one', () => {
    const step = { temperatureStart: 295.15, airTemperature: 288.15, elapsedTime: 30 }
    for (const timeConstant of [8, 20, 45]) {
      const indicatedTemperature = value('sensor-step-response', { ...step, timeConstant })
      expect(value('sensor-time-constant', { ...step, indicatedTemperature })).toBeCloseTo(timeConstant, 9)
    }
    expect(outcome('sensor-time-constant', { ...step, indicatedTemperature: 288.15 })).toMatchObject({ is: 'not_defined' })
    expect(outcome('sensor-time-constant', { ...step, indicatedTemperature: 296 })).toMatchObject({ is: 'not_defined' })
  })
  it('W24: an error that both readings share leaves the lapse rate alone', () => {
    const height = [20, 220]
    const off = (by: number) => value('lapse-rate-end-points', { height, temperature: kelvins(18 + by, 16.2 + by) })
    expect(off(0.3)).toBeCloseTo(off(0), 12)
  })
})
