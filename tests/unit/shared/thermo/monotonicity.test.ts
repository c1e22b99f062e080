/** Which way a result goes when an input grows, what undoes what, and what is conserved along a path: whatever the numbers. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formulaeOf } from '#shared/marking/alternatives'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Formulae, Inputs } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity } from '#shared/thermo/registry'

const { constants } = defaultConvention, taught = formulaeOf(defaultConvention)
function value(key: string, inputs: Inputs, variant?: string, formulae: Formulae = taught): number {
  const definition = findQuantity(key)
  if (!definition) throw new Error(key)
  const outcome = evaluateQuantity(definition, inputs, constants, variant, formulae)
  return outcome.is === 'value' ? outcome.value : NaN
}

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const T = between(252, 305), p = between(60_000, 103_000), w = between(0.001, 0.02), RH = between(0.2, 0.95)
const moist = { pressure: p, temperature: between(275, 305), depression: between(1, 15) }

/** A quantity, the inputs that are drawn, and which of them moves it up (+) or down (−) on a step of one in a hundred (of one kelvin, where it is a temperature). */
type Case = readonly [key: string, drawn: Readonly<Record<string, fc.Arbitrary<number>>>, directions: Readonly<Record<string, 1 | -1>>]
const cases: readonly Case[] = [
  ['density', { pressure: p, temperature: T }, { pressure: 1, temperature: -1 }],
  ['specific-volume', { pressure: p, temperature: T }, { pressure: -1, temperature: 1 }],
  ['potential-temperature', { pressure: p, temperature: T }, { pressure: -1, temperature: 1 }],
  ['exner-function', { pressure: p }, { pressure: 1 }],
  ['temperature-from-potential-temperature', { potentialTemperature: between(280, 320), pressure: p }, { potentialTemperature: 1, pressure: 1 }],
  ['parcel-temperature-by-height', { temperature: T, heightDifference: between(100, 3000) }, { temperature: 1, heightDifference: -1 }],
  ['dry-static-energy', { temperature: T, heightAboveDatum: between(10, 5000) }, { temperature: 1, heightAboveDatum: 1 }],
  ['hypsometric-thickness', { pressureBottom: between(85_000, 103_000), pressureTop: between(30_000, 80_000), meanVirtualTemperature: T }, { pressureBottom: 1, pressureTop: -1, meanVirtualTemperature: 1 }],
  ['pressure-at-height', { pressure: p, heightDifference: between(100, 3000), meanVirtualTemperature: T }, { pressure: 1, heightDifference: -1, meanVirtualTemperature: 1 }],
  ['sea-level-pressure', { stationPressure: between(80_000, 101_000), stationHeight: between(50, 1500), stationTemperature: T }, { stationPressure: 1, stationHeight: 1, stationTemperature: -1 }],
  ['pressure-altitude', { pressure: p }, { pressure: -1 }],
  ['geopotential-height', { geometricHeight: between(100, 30_000) }, { geometricHeight: 1 }],
  ['geopotential', { geometricHeight: between(100, 30_000) }, { geometricHeight: 1 }],
  ['scale-height', { temperature: T }, { temperature: 1 }],
  ['saturation-vapor-pressure', { temperature: T }, { temperature: 1 }],
  ['saturation-vapor-pressure-over-ice', { temperature: between(210, 271) }, { temperature: 1 }],
  ['latent-heat-of-vaporization', { temperature: T }, { temperature: -1 }],
  ['mixing-ratio', { pressure: p, dewpoint: T }, { pressure: -1, dewpoint: 1 }],
  ['specific-humidity', { mixingRatio: w }, { mixingRatio: 1 }],
  ['mixing-ratio-from-specific-humidity', { specificHumidity: w }, { specificHumidity: 1 }],
  ['absolute-humidity', { vaporPressure: between(100, 4000), temperature: T }, { vaporPressure: 1, temperature: -1 }],
  ['dewpoint-from-relative-humidity', { temperature: T, relativeHumidity: RH }, { temperature: 1, relativeHumidity: 1 }],
  ['virtual-temperature', { temperature: T, mixingRatio: w }, { temperature: 1, mixingRatio: 1 }],
  ['specific-heat-of-moist-air', { mixingRatio: w }, { mixingRatio: 1 }],
  ['moist-unsaturated-lapse-rate', { mixingRatio: w }, { mixingRatio: -1 }],
  ['saturated-adiabatic-lapse-rate', { pressure: p, temperature: T }, { pressure: 1, temperature: -1 }],
  ['reversible-saturated-lapse-rate', { pressure: p, temperature: T, liquidWater: between(0.0005, 0.006) }, { pressure: 1, temperature: -1 }],
  ['saturated-ascent-temperature', { pressureStart: between(90_000, 102_000), temperature: T, pressureEnd: between(40_000, 80_000) }, { pressureStart: -1, temperature: 1, pressureEnd: 1 }],
  ['saturation-equivalent-potential-temperature', { pressure: p, temperature: T }, { pressure: -1, temperature: 1 }],
  ['brunt-vaisala-frequency-squared', { potentialTemperatureBottom: between(290, 300), potentialTemperatureTop: between(300.5, 312), depth: between(50, 2000) }, { potentialTemperatureBottom: -1, potentialTemperatureTop: 1, depth: -1 }],
  ['potential-temperature-gradient', { temperature: T, potentialTemperature: between(290, 310), lapseRate: between(0.001, 0.009) }, { lapseRate: -1 }],
  ['virtual-potential-temperature-gradient', { virtualTemperature: T, virtualPotentialTemperature: between(290, 310), virtualLapseRate: between(0.001, 0.009) }, { virtualLapseRate: -1 }],
  ['logarithmic-wind-speed', { frictionVelocity: between(0.1, 0.8), measurementHeight: between(3, 40), roughnessLength: between(0.01, 0.5) }, { frictionVelocity: 1, measurementHeight: 1, roughnessLength: -1 }],
  ['sensor-lag-error', { timeConstant: between(1, 60), verticalSpeed: between(0.5, 5), lapseRate: between(0.001, 0.012) }, { timeConstant: 1, verticalSpeed: 1, lapseRate: 1 }],
]

const stepped = (key: string, given: number): number => (/[tT]emperature|dewpoint/.test(key) ? given + 1 : given * 1.01)

describe('monotonicity', () => {
  it.each(cases)('%s', (key, drawn, directions) => {
    fc.assert(fc.property(fc.record(drawn), (inputs) => {
      const at = value(key, inputs)
      for (const [name, direction] of Object.entries(directions)) {
        const moved = value(key, { ...inputs, [name]: stepped(name, inputs[name] ?? NaN) })
        expect(direction * (moved - at), `${name} ${JSON.stringify(inputs)}`).toBeGreaterThan(0)
      }
    }), { numRuns: 60 })
  })
  it.each([
    ['relative-humidity', 1], ['virtual-potential-temperature', 1], ['equivalent-potential-temperature', 1], ['wet-bulb-temperature', 1], ['pseudoadiabatic-wet-bulb-temperature', 1], ['wet-bulb-potential-temperature', 1],
    ['lifting-condensation-level-pressure', 1], ['lifting-condensation-level-temperature', 1], ['lifting-condensation-level-height', -1],
  ] as const)('%s with the dewpoint (%d)', (key, direction) => {
    const names = findQuantity(key)?.inputs.map(one => one.name) ?? []
    fc.assert(fc.property(moist.pressure, moist.temperature, moist.depression, (pressure, temperature, depression) => {
      const of = (dewpoint: number): number => value(key, Object.fromEntries(Object.entries({ pressure, temperature, dewpoint }).filter(([name]) => names.includes(name))))
      expect(direction * (of(temperature - depression + 0.5) - of(temperature - depression))).toBeGreaterThan(0)
    }), { numRuns: 60 })
  })
})

/** Forward, its inverse, and what the inverse gives back. */
const pairs: readonly (readonly [forward: string, back: string, drawn: Readonly<Record<string, fc.Arbitrary<number>>>, isGivenBack: string, resultIs: string, within: number])[] = [
  ['potential-temperature', 'temperature-from-potential-temperature', { temperature: T, pressure: p }, 'temperature', 'potentialTemperature', 1e-10],
  ['geopotential-height', 'geometric-height', { geometricHeight: between(-400, 32_000) }, 'geometricHeight', 'geopotentialHeight', 1e-7],
  ['sea-level-pressure-isothermal', 'station-pressure-isothermal', { stationPressure: between(86_000, 101_000), stationHeight: between(50, 500), stationTemperature: T }, 'stationPressure', 'seaLevelPressure', 1e-6],
  ['vapor-pressure', 'dewpoint', { dewpoint: T }, 'dewpoint', 'vaporPressure', 1e-8],
  ['vapor-pressure-from-mixing-ratio', 'mixing-ratio-from-vapor-pressure', { pressure: p, mixingRatio: w }, 'mixingRatio', 'vaporPressure', 1e-14],
  ['specific-humidity', 'mixing-ratio-from-specific-humidity', { mixingRatio: w }, 'mixingRatio', 'specificHumidity', 1e-14],
  ['adiabatic-pressure-from-temperature', 'parcel-temperature-by-pressure', { pressureStart: between(60_000, 90_000), temperatureStart: between(285, 300), temperatureEnd: between(260, 295) }, 'temperatureEnd', 'pressureEnd', 1e-9],
  ['adiabatic-specific-volume-from-temperature', 'adiabatic-temperature-from-specific-volume', { specificVolumeStart: between(0.7, 1.2), temperatureStart: between(280, 300), temperatureEnd: between(260, 300) }, 'temperatureEnd', 'specificVolumeEnd', 1e-9],
  ['adiabatic-specific-volume-from-pressure', 'adiabatic-pressure-from-specific-volume', { specificVolumeStart: between(0.7, 1.2), pressureStart: p, pressureEnd: p }, 'pressureEnd', 'specificVolumeEnd', 1e-6],
  ['density', 'temperature-by-equation-of-state', { pressure: p, temperature: T }, 'temperature', 'density', 1e-10],
  ['density', 'pressure-by-equation-of-state', { pressure: p, temperature: T }, 'pressure', 'density', 1e-7],
  ['sensor-step-response', 'sensor-time-constant', { temperatureStart: between(285, 295), airTemperature: between(270, 280), elapsedTime: between(2, 30), timeConstant: between(5, 60) }, 'timeConstant', 'indicatedTemperature', 1e-7],
]

describe('inverse pairs', () => {
  it.each(pairs)('%s and %s', (forward, back, drawn, isGivenBack, resultIs, within) => {
    const wanted = findQuantity(back)?.inputs.map(one => one.name) ?? []
    fc.assert(fc.property(fc.record(drawn), (inputs) => {
      const result = value(forward, inputs), known = Object.fromEntries(Object.entries({ ...inputs, [resultIs]: result }).filter(([name]) => name !== isGivenBack && wanted.includes(name)))
      expect(Math.abs(value(back, known) - (inputs[isGivenBack] ?? NaN))).toBeLessThanOrEqual(within)
    }), { numRuns: 100 })
  })
  it('a friction velocity and a roughness from two heights give both winds back', () => {
    fc.assert(fc.property(between(1.6, 4), between(8, 30), between(1, 4), between(4.2, 9), (lowHeight, highHeight, lowSpeed, highSpeed) => {
      const two = { lowHeight, lowSpeed, highHeight, highSpeed }, frictionVelocity = value('friction-velocity', two), roughnessLength = value('roughness-length', two)
      fc.pre(roughnessLength > 1e-6 && roughnessLength < lowHeight)
      for (const [measurementHeight, speed] of [[lowHeight, lowSpeed], [highHeight, highSpeed]] as const) expect(Math.abs(value('logarithmic-wind-speed', { frictionVelocity, measurementHeight, roughnessLength }) - speed)).toBeLessThan(1e-9)
    }))
  })
  it('wind components give speed and direction back', () => {
    fc.assert(fc.property(between(0.5, 30), between(0.01, 6.27), (windSpeed, windDirection) => {
      expect(Math.hypot(value('eastward-wind', { windSpeed, windDirection }), value('northward-wind', { windSpeed, windDirection }))).toBeCloseTo(windSpeed, 9)
      expect(value('vector-mean-wind-direction', { windSpeed: [windSpeed, windSpeed], windDirection: [windDirection, windDirection] })).toBeCloseTo(windDirection, 9)
    }))
  })
})

describe('along a saturated ascent', () => {
  const byTemperature: Formulae = { ...taught, variants: { ...taught.variants, 'latent-heat-of-vaporization': 'linear' } }
  // the forms are fits to pseudoadiabats of other constants: 0.02 K by the paper, and what L(T) and cp make of it beside them
  it.each([['bolton-39', 0.2], ['bolton-43', 0.5]] as const)('θe by %s stays where it was, within the form’s error (%d K)', (variant, most) => {
    fc.assert(fc.property(between(92_000, 102_000), between(268, 298), between(50_000, 90_000), (pressureStart, temperature, pressureEnd) => {
      const start = value('saturation-equivalent-potential-temperature', { pressure: pressureStart, temperature }, variant, byTemperature)
      const aloft = value('saturated-ascent-temperature', { pressureStart, temperature, pressureEnd }, undefined, byTemperature)
      expect(Math.abs(value('saturation-equivalent-potential-temperature', { pressure: pressureEnd, temperature: aloft }, variant, byTemperature) - start)).toBeLessThan(most)
    }), { numRuns: 150 })
  })
  it('a dry ascent is not conserved by it: the measure sees another path', () => {
    const start = value('saturation-equivalent-potential-temperature', { pressure: 95_000, temperature: 290 })
    const aloft = value('parcel-temperature-by-pressure', { pressureStart: 95_000, temperatureStart: 290, pressureEnd: 80_000 })
    expect(Math.abs(value('saturation-equivalent-potential-temperature', { pressure: 80_000, temperature: aloft }) - start)).toBeGreaterThan(5)
  })
  it('moist static energy keeps, along a saturated rise by the full rate, within 0.12 kJ/kg over 200 m; the dry one does not', () => {
    fc.assert(fc.property(between(85_000, 100_000), between(272, 298), (pressure, temperature) => {
      const rate = value('saturated-adiabatic-lapse-rate', { pressure, temperature }, 'full'), dry = value('dry-adiabatic-lapse-rate', {})
      const q = (at: number, P: number): number => value('specific-humidity', { mixingRatio: value('saturation-mixing-ratio', { pressure: P, temperature: at }) })
      const above = value('pressure-at-height', { pressure, heightDifference: 200, meanVirtualTemperature: temperature })
      const energy = (at: number, z: number, P: number): number => value('moist-static-energy', { temperature: at, heightAboveDatum: z, specificHumidity: q(at, P) })
      const change = energy(temperature - 200 * rate, 1200, above) - energy(temperature, 1000, pressure)
      expect(Math.abs(change)).toBeLessThan(120)
      expect(Math.abs(energy(temperature - 200 * dry, 1200, above) - energy(temperature, 1000, pressure))).toBeGreaterThan(Math.abs(change))
    }), { numRuns: 60 })
  })
})
