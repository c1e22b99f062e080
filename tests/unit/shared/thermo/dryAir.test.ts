import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { adiabaticExponent, adiabaticState } from '#shared/thermo/adiabats'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs } from '#shared/thermo/definition'
import { firstLawTerm } from '#shared/thermo/energyBalance'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { dryAir } from '#shared/thermo/groups/dryAir'
import { temperatureTendency } from '#shared/thermo/heating'
import { isothermalWork } from '#shared/thermo/isothermal'
import { polytropicWork } from '#shared/thermo/polytropic'
import { dryStaticEnergy } from '#shared/thermo/quantities/dryStaticEnergy'
import { exnerFunction } from '#shared/thermo/quantities/exnerFunction'
import { moistUnsaturatedLapseRate } from '#shared/thermo/quantities/moistUnsaturatedLapseRate'
import { parcelLapseRateInEnvironment } from '#shared/thermo/quantities/parcelLapseRateInEnvironment'
import { pressureAfterIsochoricHeating } from '#shared/thermo/quantities/pressureAfterIsochoricHeating'
import { pressureByEquationOfState } from '#shared/thermo/quantities/pressureByEquationOfState'
import { specificVolume } from '#shared/thermo/quantities/specificVolume'
import { temperatureByEquationOfState } from '#shared/thermo/quantities/temperatureByEquationOfState'
import { temperatureFromPotentialTemperature } from '#shared/thermo/quantities/temperatureFromPotentialTemperature'
import { findQuantity } from '#shared/thermo/registry'
import { kelvin, kilogramPerCubicMeter, meter, pascal } from '#shared/units/brands'

const constants = defaultConvention.constants

function value(key: string, inputs: Inputs): number {
  const definition = findQuantity(key)
  if (!definition) throw new Error(key)
  const outcome = evaluateQuantity(definition, inputs, constants)
  if (outcome.is !== 'value') throw new Error(outcome.is)
  return outcome.value
}

describe('examples of the docstrings', () => {
  it('give what they say', () => {
    expect(adiabaticExponent('pressure', 'temperature', { kappa: 2 / 7 })).toBeCloseTo(3.5, 12)
    expect(adiabaticState('specificVolume', 0.84, 'pressure', 100_000, 70_000, { kappa: 2 / 7 })).toBeCloseTo(1.08374, 5)
    expect(firstLawTerm('geopotential', 'temperatureChange', { heat: 0, heightDifference: 1000 }, { cp: 1004, g: 9.81 })).toBeCloseTo(-9.771, 3)
    expect(temperatureTendency({ temperatureStart: 285.15, temperatureEnd: 288.15, timeBetween: 7200 })).toBeCloseTo(0.00041667, 8)
    expect(isothermalWork(kelvin(293.15), pascal(100_000), pascal(70_000), { R: 287 })).toBeCloseTo(30_008.5, 0)
    expect(polytropicWork({ temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000, polytropicExponent: 1.2 }, { R: 287 })).toBeCloseTo(24_280, -1)
    expect(dryStaticEnergy(kelvin(288.15), meter(1000), { cp: 1004, g: 9.81 })).toBeCloseTo(299_112.6, 1)
    expect(exnerFunction(pascal(85_000), { R: 287, cp: 1004, p0: 100_000 })).toBeCloseTo(0.9546055, 7)
    expect(moistUnsaturatedLapseRate(0.015, { g: 9.81, cp: 1004, cpv: 1870 })).toBeCloseTo(0.0096479, 7)
    expect(parcelLapseRateInEnvironment(290, 280, { g: 9.81, cp: 1004 })).toBeCloseTo(0.0101199, 7)
    expect(pressureAfterIsochoricHeating(pascal(90_000), kelvin(273.15), kelvin(303.15))).toBeCloseTo(99_885, 0)
    expect(pressureByEquationOfState(kilogramPerCubicMeter(1.2), kelvin(288.15), { R: 287 })).toBeCloseTo(99_238.9, 1)
    expect(specificVolume(pascal(101_325), kelvin(298.15), { R: 287 })).toBeCloseTo(0.8445, 5)
    expect(temperatureByEquationOfState(pascal(95_000), kilogramPerCubicMeter(1.15), { R: 287 })).toBeCloseTo(287.835, 3)
    expect(temperatureFromPotentialTemperature(kelvin(300), pascal(85_000), constants)).toBeCloseTo(286.38, 2)
  })
})

const temperatures = fc.double({ min: 220, max: 320, noNaN: true }), pressures = fc.double({ min: 30_000, max: 105_000, noNaN: true })
const near = (got: number, wanted: number, relative = 1e-12) => expect(Math.abs(got - wanted)).toBeLessThanOrEqual(relative * Math.max(1, Math.abs(wanted)))

describe('what has to hold whatever the numbers', () => {
  it('the equation of state gives back each of p, ρ, α, T', () => {
    fc.assert(fc.property(temperatures, pressures, (temperature, pressure) => {
      const density = value('density', { pressure, temperature })
      near(value('pressure-by-equation-of-state', { density, temperature }), pressure)
      near(value('temperature-by-equation-of-state', { pressure, density }), temperature)
      near(value('specific-volume', { pressure, temperature }) * density, 1)
    }))
  })
  it('the three relations of Poisson agree, there and back', () => {
    fc.assert(fc.property(temperatures, pressures, pressures, (temperatureStart, pressureStart, pressureEnd) => {
      const temperatureEnd = value('parcel-temperature-by-pressure', { temperatureStart, pressureStart, pressureEnd })
      fc.pre(temperatureEnd >= 150 && temperatureEnd <= 400)
      const specificVolumeStart = value('specific-volume', { pressure: pressureStart, temperature: temperatureStart }), specificVolumeEnd = value('specific-volume', { pressure: pressureEnd, temperature: temperatureEnd })
      near(value('adiabatic-specific-volume-from-pressure', { specificVolumeStart, pressureStart, pressureEnd }), specificVolumeEnd, 1e-11)
      near(value('adiabatic-specific-volume-from-temperature', { specificVolumeStart, temperatureStart, temperatureEnd }), specificVolumeEnd, 1e-11)
      near(value('adiabatic-temperature-from-specific-volume', { temperatureStart, specificVolumeStart, specificVolumeEnd }), temperatureEnd, 1e-11)
      near(value('adiabatic-pressure-from-temperature', { pressureStart, temperatureStart, temperatureEnd }), pressureEnd, 1e-11)
      near(value('adiabatic-pressure-from-specific-volume', { pressureStart, specificVolumeStart, specificVolumeEnd }), pressureEnd, 1e-11)
    }))
  })
  it('θ and its inverse, and the Exner function between them', () => {
    fc.assert(fc.property(temperatures, pressures, (temperature, pressure) => {
      const potentialTemperature = value('potential-temperature', { temperature, pressure })
      near(value('temperature-from-potential-temperature', { potentialTemperature, pressure }), temperature)
      near(value('exner-function', { pressure }) * potentialTemperature, temperature)
    }))
  })
  it('the first law closes on every path, and the mass only multiplies', () => {
    const exponents = fc.double({ min: 0.3, max: 5, noNaN: true })
    fc.assert(fc.property(temperatures, temperatures, pressures, pressures, exponents, fc.double({ min: 0.01, max: 1000, noNaN: true }), (T1, T2, p1, p2, n, mass) => {
      const paths: [string, Inputs][] = [
        ['isobaric', { temperatureStart: T1, temperatureEnd: T2 }], ['isochoric', { temperatureStart: T1, temperatureEnd: T2 }],
        ['isothermal', { temperature: T1, pressureStart: p1, pressureEnd: p2 }], ['adiabatic', { temperatureStart: T1, pressureStart: p1, pressureEnd: p2 }],
        ['polytropic', { temperatureStart: T1, pressureStart: p1, pressureEnd: p2, polytropicExponent: n }],
      ]
      for (const [path, inputs] of paths) {
        const q = value(`${path}-heat`, inputs), w = value(`${path}-work`, inputs), u = value(`${path}-internal-energy-change`, inputs), h = value(`${path}-enthalpy-change`, inputs)
        const size = Math.abs(u) + Math.abs(w) + 1
        expect(Math.abs(q - u - w), path).toBeLessThan(1e-9 * size)
        expect(Math.abs(h * (constants.cv ?? NaN) - u * (constants.cp ?? NaN)), path).toBeLessThan(1e-6 * size)
        for (const [key, one] of [['heat', q], ['work', w], ['internal-energy-change', u], ['enthalpy-change', h]] as const) {
          expect(Math.abs(value(`${path}-${key}-of-mass`, { mass, ...inputs }) - mass * one), `${path} ${key}`).toBeLessThanOrEqual(1e-9 * mass * size)
        }
      }
    }))
  })
  it('a polytropic process is isothermal at n = 1, isobaric towards n = 0 and adiabatic at n = cp/cv', () => {
    const path = { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }
    const isothermal = value('isothermal-work', { temperature: 293.15, pressureStart: 100_000, pressureEnd: 70_000 })
    expect(value('polytropic-work', { ...path, polytropicExponent: 1 })).toBe(isothermal)
    expect(value('polytropic-work', { ...path, polytropicExponent: 1 + 1e-7 })).toBeCloseTo(isothermal, 0)
    expect(value('polytropic-heat', { ...path, polytropicExponent: 1004 / 717 })).toBeCloseTo(0, 6)
    expect(value('polytropic-work', { ...path, polytropicExponent: 1004 / 717 })).toBeCloseTo(value('adiabatic-work', path), 6)
  })
  it('each form of the first law gives back any one of its terms', () => {
    const energies = fc.double({ min: -50_000, max: 50_000, noNaN: true }), changes = fc.double({ min: -30, max: 30, noNaN: true })
    fc.assert(fc.property(changes, energies, fc.double({ min: -20_000, max: 20_000, noNaN: true }), (temperatureChange, work, other) => {
      const heat = value('heat-from-internal-energy-and-work', { temperatureChange, work })
      near(value('work-from-heat-and-internal-energy', { heat, temperatureChange }), work, 1e-9)
      near(value('temperature-change-from-heat-and-work', { heat, work }), temperatureChange, 1e-9)
      const enthalpy = value('heat-from-enthalpy-and-pressure-change', { temperatureChange, specificVolume: 0.85, pressureChange: other })
      near(value('pressure-change-from-heat-and-enthalpy', { heat: enthalpy, temperatureChange, specificVolume: 0.85 }), other, 1e-9)
      if (other < -100) near(value('specific-volume-from-heat-and-enthalpy', { heat: enthalpy, temperatureChange, pressureChange: other }), 0.85, 1e-9)
      near(value('temperature-change-from-heat-and-pressure-change', { heat: enthalpy, specificVolume: 0.85, pressureChange: other }), temperatureChange, 1e-9)
      const geopotential = value('heat-from-enthalpy-and-geopotential', { temperatureChange, heightDifference: other })
      near(value('height-change-from-heat-and-enthalpy', { heat: geopotential, temperatureChange }), other, 1e-9)
      near(value('temperature-change-from-heat-and-height-change', { heat: geopotential, heightDifference: other }), temperatureChange, 1e-9)
    }))
  })
  it('dry static energy is conserved where a parcel rises dry-adiabatically by height', () => {
    fc.assert(fc.property(temperatures, fc.double({ min: 0, max: 4000, noNaN: true }), (temperature, z) => {
      const aloft = value('parcel-temperature-by-height', { temperature, heightDifference: z })
      near(value('dry-static-energy', { temperature: aloft, heightAboveDatum: z }), value('dry-static-energy', { temperature, heightAboveDatum: 0 }))
    }))
  })
  it('an input times 1 + 1e-6 moves every number of the group smoothly', () => {
    for (const definition of dryAir.quantities.filter(one => one.kind !== 'class')) {
      const { inputs } = definition.example, before = value(definition.key, inputs)
      for (const input of definition.inputs) {
        const given = inputs[input.name]
        if (typeof given !== 'number' || given === 0) continue
        const step = (factor: number) => value(definition.key, { ...inputs, [input.name]: given * factor }) - before
        const one = step(1 + 1e-6), two = step(1 + 2e-6)
        expect(Math.abs(two - 2 * one), `${definition.key} ${input.name}`).toBeLessThanOrEqual(1e-4 * Math.abs(one) + 1e-9 * Math.abs(before) + 1e-12)
      }
    }
  })
})
