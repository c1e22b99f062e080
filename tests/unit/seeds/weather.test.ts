import { describe, expect, it } from 'vitest'
import { place } from '../../../seeds/generator/place'
import { clearSky, sineOfSun, sunrise } from '../../../seeds/generator/sun'
import { stationRecord, type Weather } from '../../../seeds/generator/weather'

const hour = 3_600_000
const midnight = Date.UTC(2026, 9, 7, 5)
const clear: Weather = { settlesAtC: 9, sunWarmingK: 10, dewpointC: 2, pressureHpa: 986, trendHpaPerDay: 0, windMs: 2.6, windFromDeg: 352, cloud: 0.05, fronts: [] }
const record = (weather: Weather, seed: string) => stationRecord(place, weather, { from: midnight, to: midnight + 24 * hour, everyMinutes: 5 }, seed)
const day = record(clear, 'a clear day')

describe('the sun', () => {
  it('is up a little longer than twelve hours at the equinox (refraction and its disk: about nine minutes at 44°)', () => {
    const up = sunrise(Date.UTC(2026, 2, 20, 6), place.latitude, place.longitude)
    let down = up
    while (sineOfSun(down, place.latitude, place.longitude) > Math.sin((-0.833 * Math.PI) / 180)) down += 60_000
    expect((down - up) / 60_000).toBeGreaterThan(725)
    expect((down - up) / 60_000).toBeLessThan(735)
  })

  it('is highest 16.4 minutes before mean noon in early November (equation of time, common almanac value)', () => {
    const meanNoon = Date.UTC(2026, 10, 3, 12) - (place.longitude / 15) * hour
    let best = meanNoon
    for (let at = meanNoon - hour; at < meanNoon + hour; at += 10_000) if (sineOfSun(at, place.latitude, place.longitude) > sineOfSun(best, place.latitude, place.longitude)) best = at
    expect(Math.abs((meanNoon - best) / 60_000 - 16.4)).toBeLessThan(0.7)
  })

  it('stands at the solstice noon as high as 90° − latitude + 23.44°', () => {
    let best = 0
    for (let at = Date.UTC(2026, 5, 21, 15); at < Date.UTC(2026, 5, 21, 21); at += 60_000) best = Math.max(best, sineOfSun(at, place.latitude, place.longitude))
    expect(Math.abs((Math.asin(best) * 180) / Math.PI - (90 - place.latitude + 23.44))).toBeLessThan(0.1)
  })
})

describe('a clear day on the roof', () => {
  const warmest = day.reduce((a, b) => (b.temperatureC > a.temperatureC ? b : a))
  const coldest = day.reduce((a, b) => (b.temperatureC < a.temperatureC ? b : a))

  it('is coldest about sunrise and warmest two to four hours after the sun is highest', () => {
    const up = sunrise(midnight, place.latitude, place.longitude)
    const noon = Date.UTC(2026, 9, 7, 12) - (place.longitude / 15) * hour - 12 * 60_000
    expect(Math.abs(coldest.at - up)).toBeLessThan(1.2 * hour)
    expect(warmest.at - noon).toBeGreaterThan(1.2 * hour)
    expect(warmest.at - noon).toBeLessThan(4 * hour)
    expect(warmest.temperatureC - coldest.temperatureC).toBeGreaterThan(7)
    expect(warmest.temperatureC - coldest.temperatureC).toBeLessThan(18)
  })

  it('has a dewpoint that agrees with its humidity, never above the air', () => {
    for (const reading of day) {
      expect(reading.dewpointC).toBeLessThanOrEqual(reading.temperatureC + 1e-9)
      // Magnus with the constants of WMO-No. 8 (17.62, 243.12), which the generator does not use; it differs by 0.1–0.4 %
      const ratio = Math.exp((17.62 * reading.dewpointC) / (243.12 + reading.dewpointC) - (17.62 * reading.temperatureC) / (243.12 + reading.temperatureC))
      expect(Math.abs(100 * ratio - reading.humidityPct)).toBeLessThan(0.4)
    }
  })

  it('never stands at the top of its humidity for two hours', () => {
    for (let at = 0; at + 24 < day.length; at++) expect(day.slice(at, at + 24).every(reading => reading.humidityPct >= 98.5)).toBe(false)
  })

  it('has no light before sunrise and no more than the clear sky gives', () => {
    for (const reading of day) {
      expect(reading.globalWm2).toBeGreaterThanOrEqual(0)
      expect(reading.globalWm2).toBeLessThanOrEqual(Math.max(clearSky(reading.at, place.latitude, place.longitude), clearSky(reading.at - 5 * 60_000, place.latitude, place.longitude)) + 1)
    }
    expect(day.filter(reading => reading.at < sunrise(midnight, place.latitude, place.longitude) - 10 * 60_000).every(reading => reading.globalWm2 === 0)).toBe(true)
  })

  it('averages directions about north as vectors: a north wind stays north (W1), 0 is kept for calm (W5)', () => {
    const blowing = day.filter(reading => reading.windMs >= 1)
    expect(blowing.length).toBeGreaterThan(50)
    for (const reading of blowing) expect(Math.cos(((reading.windDeg - 352) * Math.PI) / 180)).toBeGreaterThan(0.3)
    for (const reading of day) {
      expect(reading.windDeg === 0).toBe(reading.windMs < 0.3)
      expect(reading.gustMs).toBeGreaterThanOrEqual(reading.windMs)
    }
  })

  it('comes out the same for the same name and otherwise for another', () => {
    expect(record(clear, 'a clear day')).toEqual(day)
    expect(record(clear, 'another')).not.toEqual(day)
  })
})

describe('a front', () => {
  const at = midnight + 15 * hour
  const passed = record({ ...clear, cloud: 0.5, windFromDeg: 190, fronts: [{ at, coolingK: 7, dewpointDropK: 6, veerDeg: 105, riseHpa: 6, rainMm: 5 }] }, 'front')
  const near = (instant: number) => passed.reduce((a, b) => (Math.abs(b.at - instant) < Math.abs(a.at - instant) ? b : a))

  it('brings a fall of temperature and dewpoint, a rise of pressure, a veer of wind and rain', () => {
    const before = near(at - hour)
    const after = near(at + hour)
    expect(before.temperatureC - after.temperatureC).toBeGreaterThan(3)
    expect(before.dewpointC - after.dewpointC).toBeGreaterThan(2)
    expect(after.pressureHpa - before.pressureHpa).toBeGreaterThan(3)
    expect(Math.sin(((after.windDeg - before.windDeg) * Math.PI) / 180)).toBeGreaterThan(0.4)
    const rain = passed.reduce((sum, reading) => sum + reading.rainMm, 0)
    expect(rain).toBeGreaterThan(2)
    expect(rain).toBeLessThan(9)
  })
})
