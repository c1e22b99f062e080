import { describe, expect, it } from 'vitest'
import { columnAt, flight, mixingAt, nightColumn, type FlightReading } from '../../../seeds/generator/flight'
import { place } from '../../../seeds/generator/place'
import { clearSky, sunrise } from '../../../seeds/generator/sun'
import { flightStarts, morning } from '../../fixtures/generate'

const plan = { topM: 600, winchMs: 1.5, stops: [{ heightM: 100, seconds: 30 }], lagS: 4, humidityLagS: 9, everyS: 2 }
const [early, middle, late] = Object.values(flightStarts).map(startsAt => flight(place, morning, { ...plan, startsAt }, String(startsAt))) as [FlightReading[], FlightReading[], FlightReading[]]
const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length
const between = (rows: readonly FlightReading[], leg: FlightReading['leg'], low: number, high: number) => rows.filter(row => row.leg === leg && row.heightM >= low && row.heightM <= high)
// Written out here on purpose: the check must not share a formula with what it checks.
const theta = (row: FlightReading) => (row.temperatureC + 273.15) * (1000 / row.pressureHpa) ** (2 / 7)

describe('a flight', () => {
  it('starts at the ground, reaches its top and comes down again', () => {
    for (const rows of [early, middle, late]) {
      expect(rows[0]!.heightM).toBeLessThan(4)
      expect(Math.max(...rows.map(row => row.heightM))).toBeGreaterThan(597)
      expect(rows.at(-1)!.heightM).toBeLessThan(5)
      expect(rows.every(row => row.humidityPct > 5 && row.humidityPct <= 100)).toBe(true)
    }
  })

  it('agrees with the hydrostatic equation: thickness from its pressures and temperatures is the height between', () => {
    for (const rows of [early, middle, late]) {
      for (const [low, high] of [[20, 120], [150, 400], [50, 590]] as const) {
        const layer = between(rows, 'up', low, high)
        const kelvin = mean(layer.map(row => row.temperatureC)) + 273.15
        const tv = kelvin * (1 + 0.61 * mean(layer.map(row => row.truth.q)))
        const thickness = (287.05 * tv / 9.80665) * Math.log(layer[0]!.pressureHpa / layer.at(-1)!.pressureHpa)
        // 0.05 hPa of noise at each end is about half a meter
        expect(Math.abs(thickness - (layer.at(-1)!.heightM - layer[0]!.heightM))).toBeLessThan(1.2)
      }
    }
  })

  it('loses its inversion to the sun: the mixed layer deepens and its potential temperature is one value', () => {
    const depths = Object.values(flightStarts).map(at => mixingAt(place, morning, at).depthM)
    expect(depths[0]).toBe(0)
    expect(depths[1]).toBeGreaterThan(20)
    expect(depths[2]).toBeGreaterThan(80)
    const rises = [early, middle, late].map(rows => mean(between(rows, 'up', 95, 110).map(row => row.temperatureC)) - mean(between(rows, 'up', 0, 5).map(row => row.temperatureC)))
    expect(rises[0]).toBeGreaterThan(3.5)
    expect(rises[1]!).toBeLessThan(rises[0]!)
    expect(rises[2]!).toBeLessThan(0)
    const mixed = between(late, 'up', 35, 85).map(theta)
    expect(Math.max(...mixed) - Math.min(...mixed)).toBeLessThan(0.45)
    expect(Math.abs(mean(mixed.slice(0, 8)) - mean(mixed.slice(-8)))).toBeLessThan(0.15)
  })

  it('puts into the column the heat that the sun gave, and no more', () => {
    for (const at of [flightStarts['flight-morning.csv'], flightStarts['flight-late-morning.csv']]) {
      const mixing = mixingAt(place, morning, at)
      let stored = 0
      for (let z = 0.5; z < 1000; z++) stored += columnAt(morning, mixing, z).theta - nightColumn(morning, z).theta
      let given = 0
      for (let t = sunrise(morning.midnight, place.latitude, place.longitude) + 1_800_000; t < at; t += 30_000) given += (morning.heating * clearSky(t, place.latitude, place.longitude) * 30) / (1.22 * 1004.7)
      // the warm lowest meters and the smooth top add a little
      expect(stored / given).toBeGreaterThan(0.95)
      expect(stored / given).toBeLessThan(1.12)
    }
  })

  it('lags by τ w Γ on both legs: too warm on the way up where it gets colder with height, too cold on the way down (W21)', () => {
    for (const [leg, sign] of [['up', 1], ['down', -1]] as const) {
      const layer = between(early, leg, 220, 400)
      const lapse = -(layer.at(-1)!.truth.temperatureC - layer[0]!.truth.temperatureC) / (layer.at(-1)!.truth.heightM - layer[0]!.truth.heightM)
      const expected = sign * plan.lagS * plan.winchMs * lapse
      expect(Math.abs(mean(layer.map(row => row.temperatureC - row.truth.temperatureC)) - expected)).toBeLessThan(0.015)
    }
    const inversion = between(early, 'up', 20, 80)
    expect(mean(inversion.map(row => row.temperatureC - row.truth.temperatureC))).toBeLessThan(-0.2)
  })

  it('has a capping inversion, dry above it, and a stable free air between neutral and the standard atmosphere', () => {
    expect(mean(between(early, 'up', 500, 520).map(row => row.temperatureC))).toBeGreaterThan(mean(between(early, 'up', 415, 430).map(row => row.temperatureC)) + 1)
    expect(mean(between(early, 'up', 520, 590).map(row => row.humidityPct))).toBeLessThan(60)
    const above = between(early, 'up', 520, 590)
    const lapse = -(above.at(-1)!.temperatureC - above[0]!.temperatureC) / (above.at(-1)!.heightM - above[0]!.heightM) * 1000
    expect(lapse).toBeGreaterThan(3)
    expect(lapse).toBeLessThan(9)
  })
})
