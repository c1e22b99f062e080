import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { poissonTemperature } from '#shared/thermo/poisson'
import { density } from '#shared/thermo/quantities/density'
import { dryAdiabaticLapseRate } from '#shared/thermo/quantities/dryAdiabaticLapseRate'
import { hypsometricThickness } from '#shared/thermo/quantities/hypsometricThickness'
import { parcelTemperatureByHeight } from '#shared/thermo/quantities/parcelTemperatureByHeight'
import { potentialTemperature } from '#shared/thermo/quantities/potentialTemperature'
import { staticStability } from '#shared/thermo/quantities/staticStability'
import { findQuantity } from '#shared/thermo/registry'
import { kelvin, kelvinPerMeter, meter, pascal } from '#shared/units/brands'

const constants = defaultConvention.constants
const temperatures = fc.double({ min: 200, max: 320, noNaN: true }).map(kelvin)
const pressures = fc.double({ min: 20_000, max: 105_000, noNaN: true }).map(pascal)

function value(key: string, inputs: Inputs): number {
  const definition = findQuantity(key)
  if (!definition) throw new Error(key)
  const outcome = evaluateQuantity(definition, inputs, constants)
  if (outcome.is !== 'value') throw new Error(outcome.is)
  return outcome.value
}

describe('examples of the docstrings', () => {
  it('give what they say', () => {
    expect(density(pascal(101_325), kelvin(298.15), { R: 287 })).toBeCloseTo(1.18413, 5)
    expect(potentialTemperature(kelvin(293.15), pascal(85_000), constants)).toBeCloseTo(307.09, 2)
    expect(poissonTemperature(kelvin(293.15), pascal(100_000), pascal(70_000), { R: 287, cp: 1004 })).toBeCloseTo(264.73, 2)
    expect(dryAdiabaticLapseRate({ g: 9.81, cp: 1004 })).toBeCloseTo(0.0097709, 7)
    expect(parcelTemperatureByHeight(kelvin(288.15), meter(1500), kelvinPerMeter(0.0097709))).toBeCloseTo(273.49, 2)
    expect(hypsometricThickness(pascal(100_000), pascal(50_000), kelvin(273.15), constants)).toBeCloseTo(5539.1, 1)
    expect(staticStability(0.0065, constants)).toBe('stable')
  })
})

describe('what has to hold whatever the numbers', () => {
  it('θ is conserved where a parcel changes pressure dry-adiabatically', () => {
    fc.assert(fc.property(temperatures, pressures, pressures, (T, from, to) => {
      const there = poissonTemperature(T, from, to, constants)
      fc.pre(there > 150 && there < 400)
      expect(Math.abs(potentialTemperature(there, to, constants) / potentialTemperature(T, from, constants) - 1)).toBeLessThan(1e-13)
    }))
  })
  it('Poisson’s relation goes there and back', () => {
    fc.assert(fc.property(temperatures, pressures, pressures, (T, from, to) => {
      expect(Math.abs(poissonTemperature(poissonTemperature(T, from, to, constants), to, from, constants) / T - 1)).toBeLessThan(1e-13)
    }))
  })
  it('the first law closes on isobaric and adiabatic paths, per kilogram and for a mass', () => {
    const start = fc.double({ min: 220, max: 320, noNaN: true }), mass = fc.double({ min: 0.01, max: 1000, noNaN: true })
    fc.assert(fc.property(start, start, pressures, pressures, mass, (T1, T2, p1, p2, m) => {
      const isobaric = { temperatureStart: T1, temperatureEnd: T2 }, adiabatic = { temperatureStart: T1, pressureStart: p1, pressureEnd: p2 }
      expect(Math.abs(value('isobaric-heat', isobaric) - value('isobaric-internal-energy-change', isobaric) - value('isobaric-work', isobaric))).toBeLessThan(1e-7)
      expect(Math.abs(value('adiabatic-heat', adiabatic) - value('adiabatic-internal-energy-change', adiabatic) - value('adiabatic-work', adiabatic))).toBeLessThan(1e-7)
      expect(Math.abs(value('isobaric-heat-of-mass', { mass: m, ...isobaric }) / m - value('isobaric-heat', isobaric))).toBeLessThan(1e-7)
    }))
  })
  it('thicknesses add up, and grow with temperature', () => {
    const levels = fc.tuple(pressures, pressures, pressures).map(three => [...three].sort((a, b) => b - a)).filter(([a = 0, b = 0, c = 0]) => a > b * 1.001 && b > c * 1.001)
    fc.assert(fc.property(levels, temperatures, ([a = 0, b = 0, c = 0], T) => {
      const whole = hypsometricThickness(pascal(a), pascal(c), T, constants)
      const parts = hypsometricThickness(pascal(a), pascal(b), T, constants) + hypsometricThickness(pascal(b), pascal(c), T, constants)
      expect(Math.abs(parts / whole - 1)).toBeLessThan(1e-11)
      expect(hypsometricThickness(pascal(a), pascal(c), kelvin(T + 1), constants)).toBeGreaterThan(whole)
    }))
  })
  it('a parcel lifted and lowered by one height is back where it was', () => {
    fc.assert(fc.property(temperatures, fc.double({ min: 0, max: 5000, noNaN: true }), (T, z) => {
      const up = value('parcel-temperature-by-height', { temperature: T, heightDifference: z })
      expect(Math.abs(value('parcel-temperature-by-height', { temperature: up, heightDifference: -z }) - T)).toBeLessThan(1e-9)
    }))
  })
  it('an input times 1 + 1e-6 moves the result smoothly', () => {
    fc.assert(fc.property(temperatures, pressures, (T, p) => {
      const at = (t: number, q: number) => value('potential-temperature', { temperature: t, pressure: q })
      expect(Math.abs(at(T * (1 + 1e-6), p) / at(T, p) - 1)).toBeLessThan(2e-6)
      expect(Math.abs(at(T, p * (1 + 1e-6)) / at(T, p) - 1)).toBeLessThan(2e-6)
    }))
  })
  it('a layer whose T falls at Γ has Γ by end points and by fit', () => {
    fc.assert(fc.property(fc.double({ min: -0.02, max: 0.02, noNaN: true }), fc.integer({ min: 3, max: 60 }), (rate, count) => {
      const height = Array.from({ length: count }, (_, at) => 12 + 7 * at), temperature = height.map(z => 285 - rate * z)
      for (const key of ['lapse-rate-end-points', 'lapse-rate-least-squares']) expect(Math.abs(value(key, { height, temperature }) - rate)).toBeLessThan(1e-11)
      expect(value('lapse-rate-standard-error', { height, temperature })).toBeLessThan(1e-11)
    }))
  })
})
