import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { BracketError, findRoot } from '#shared/numerics/rootFinding'
import { defaultConvention } from '#shared/thermo/conventions/index'
import { plainFormulae } from '#shared/thermo/evaluate'
import { bolton39, bolton43, daviesJonesWetBulbPotential, equivalentPotentialTemperature, equivalentShortcut } from '#shared/thermo/equivalentPotential'
import { boltonLclTemperature, lclFunction, rompsLcl, rompsSaturationPressure, solvedLclTemperature } from '#shared/thermo/liftingCondensation'
import { moistAir } from '#shared/thermo/moistAir'
import { pseudoadiabaticSlope, pseudoadiabaticTemperature, pseudoadiabatThrough } from '#shared/thermo/pseudoadiabat'
import { fullSaturatedRate, saturatedRate } from '#shared/thermo/saturatedRate'

const constants = defaultConvention.constants
const air = moistAir(constants, plainFormulae)
const constantHeat = moistAir(constants, { ...plainFormulae, variants: { 'latent-heat-of-vaporization': 'constant' } })

describe('examples of the docstrings', () => {
  it('give what they say', () => {
    expect(findRoot(x => x * x - 2, 0, 2)).toBeCloseTo(Math.SQRT2, 12)
    expect(air.es(293.15)).toBeCloseTo(2336.95, 2)
    expect(pseudoadiabaticTemperature(278.15, 92_500, 70_000, air)).toBeCloseTo(264.3, 1)
    const through = pseudoadiabatThrough([85_000, 70_000], 278.15, 92_500, air)
    expect(through[0]).toBeCloseTo(274.1, 1)
    expect(through[1]).toBeCloseTo(264.3, 1)
    expect(saturatedRate(293.15, 100_000, air)).toBeCloseTo(0.00431, 5)
    expect(fullSaturatedRate(293.15, 100_000, 0, air)).toBeCloseTo(0.00427, 5)
    expect(boltonLclTemperature(293.15, 285.15)).toBeCloseTo(283.35, 2)
    expect(solvedLclTemperature(293.15, 285.15, 100_000, air)).toBeCloseTo(283.36, 2)
    expect(lclFunction(constants, plainFormulae)(293.15, 285.15, 100_000).heightAboveStart).toBeCloseTo(1003, 0)
    expect(equivalentPotentialTemperature(293.15, 291.15, 85_000, air)).toBeCloseTo(353.9, 1)
    expect(equivalentShortcut(293.15, 291.15, 85_000, air)).toBeCloseTo(349.35, 2)
    expect(daviesJonesWetBulbPotential(353.94)).toBeCloseTo(297.41, 2)
    expect(bolton39(293.15, 290.74, 85_000, 2064.1, 0.015477, 287 / 1004)).toBeCloseTo(353.94, 1)
    expect(bolton43(293.15, 290.74, 85_000, 0.015477)).toBeCloseTo(353.88, 1)
  })
})

describe('published values', () => {
  it('Romps (2017), the author’s self-test: 1433.844139279 m for 300 K, 50 %, 1000 hPa', () => {
    const e = 0.5 * rompsSaturationPressure(300), q = 287.04 * e / (461 * 100_000 + (287.04 - 461) * e)
    expect(rompsLcl(300, 0.5, 100_000, q).heightAboveStart).toBeCloseTo(1433.844139279, 8)
  })
  it.each([[85_000, 0.996], [70_000, -8.89], [50_000, -28.389], [30_000, -60.12]] as const)(
    'moist ascent from 925 hPa, 5 °C to %d Pa with a constant latent heat: %d °C (MetPy 1.7.0 documentation, moist_lapse)', (to, celsius) => {
      expect(Math.abs(pseudoadiabaticTemperature(278.15, 92_500, to, constantHeat) - 273.15 - celsius)).toBeLessThan(0.02)
    })
})

describe('the pseudoadiabat', () => {
  const starts = fc.double({ min: 250, max: 305, noNaN: true })
  it('does not depend on the length of its steps by 1e-5 K', () => {
    fc.assert(fc.property(starts, fc.double({ min: 15_000, max: 99_000, noNaN: true }), (T, to) => {
      expect(Math.abs(pseudoadiabaticTemperature(T, 100_000, to, air) - pseudoadiabaticTemperature(T, 100_000, to, air, 0.005))).toBeLessThan(1e-5)
    }), { numRuns: 50 })
  })
  it('comes back down where it went up, and at levels on the way it is where it is without them', () => {
    fc.assert(fc.property(starts, fc.double({ min: 30_000, max: 95_000, noNaN: true }), (T, to) => {
      const up = pseudoadiabaticTemperature(T, 100_000, to, air)
      expect(Math.abs(pseudoadiabaticTemperature(up, to, 100_000, air) - T)).toBeLessThan(2e-5)
      expect(Math.abs((pseudoadiabatThrough([97_000, to], T, 100_000, air)[1] ?? 0) - up)).toBeLessThan(1e-5)
    }), { numRuns: 50 })
  })
  it('keeps θe of Bolton to 0.12 K with the latent heat by temperature, and to 1.4 K with a constant one', () => {
    const drift = (T: number, to: number, by: typeof air) => {
      const up = pseudoadiabaticTemperature(T, 100_000, to, by)
      return Math.abs(equivalentPotentialTemperature(up, up, to, by) - equivalentPotentialTemperature(T, T, 100_000, by))
    }
    fc.assert(fc.property(fc.double({ min: 260, max: 298, noNaN: true }), fc.double({ min: 40_000, max: 95_000, noNaN: true }), (T, to) => {
      expect(drift(T, to, air)).toBeLessThan(0.12)
      expect(drift(T, to, constantHeat)).toBeLessThan(1.4)
    }))
  })
  it('agrees with the local lapse rate: dT/dz = dT/d ln p · (−g/RT)', () => {
    fc.assert(fc.property(starts, fc.double({ min: 40_000, max: 100_000, noNaN: true }), (T, p) => {
      expect(Math.abs(pseudoadiabaticSlope(T, p, air) * air.g / (air.R * T) / saturatedRate(T, p, air) - 1)).toBeLessThan(1e-12)
    }))
  })
  it('refuses water that boils', () => expect(() => pseudoadiabaticTemperature(373.15, 90_000, 80_000, air)).toThrow('temperature = 373.15'))
})

describe('condensation levels', () => {
  const airs = fc.record({ T: fc.double({ min: 258, max: 313, noNaN: true }), spread: fc.double({ min: 0, max: 30, noNaN: true }), p: fc.double({ min: 70_000, max: 104_000, noNaN: true }) })
  it('by Bolton, by Romps and solved lie within 0.12 K and 1.2 hPa; none above the start’s pressure', () => {
    fc.assert(fc.property(airs, ({ T, spread, p }) => {
      const all = ['bolton', 'romps', 'solved'].map(variant => lclFunction(constants, plainFormulae, variant)(T, T - spread, p))
      const temperatures = all.map(one => one.temperature), pressures = all.map(one => one.pressure)
      expect(Math.max(...temperatures) - Math.min(...temperatures)).toBeLessThan(0.35)
      expect(Math.max(...pressures) - Math.min(...pressures)).toBeLessThan(250)
      for (const one of all) expect(one.pressure).toBeLessThanOrEqual(p * (1 + 1e-12))
    }))
  })
})

describe('wet-bulb potential temperature', () => {
  it('by the rational fit is that of the pseudoadiabat to 1000 hPa, within 0.1 K', () => {
    fc.assert(fc.property(fc.double({ min: 258, max: 305, noNaN: true }), (T) => {
      expect(Math.abs(daviesJonesWetBulbPotential(equivalentPotentialTemperature(T, T, 100_000, air)) - T)).toBeLessThan(0.1)
    }))
  })
})

describe('roots', () => {
  it('are found within a bracket, and nowhere else', () => {
    fc.assert(fc.property(fc.double({ min: -50, max: 50, noNaN: true }), (root) => {
      expect(Math.abs(findRoot(x => (x - root) * (1 + (x - root) ** 2), -60, 70) - root)).toBeLessThan(1e-9 + 1e-11 * Math.abs(root))
    }))
    expect(findRoot(x => x, 0, 1)).toBe(0)
    expect(() => findRoot(x => x * x + 1, -1, 1)).toThrow(BracketError)
    expect(() => findRoot(() => NaN, -1, 1)).toThrow(BracketError)
  })
})
