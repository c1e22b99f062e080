import { dewpointOf, gasConstant, gravity, relativeHumidity, saturationPressure, specificHumidityOf, virtual } from './air'
import { atan2, cos, exp, randomFrom, sin, sqrt, type Random } from './arithmetic'
import type { Place } from './place'
import { clearSky } from './sun'

/** A change of air mass: cooler, drier, the wind veering, pressure rising behind it. */
export interface Front {
  at: number
  coolingK: number
  dewpointDropK: number
  veerDeg: number
  riseHpa: number
  rainMm: number
  /** How long its air mass lasts before the weather is itself again; for ever where not said. */
  lastsMs?: number
}

/** Weather that changes from day to day. */
export type Sky = (at: number) => Weather

/** What the weather is like from `from` on; the station follows with its own inertia. */
export interface Weather {
  /** Temperature toward which air without sun would settle, °C. */
  settlesAtC: number
  /** Rise of the afternoon above that by a full clear sun, K. */
  sunWarmingK: number
  dewpointC: number
  /** Pressure at the barometer at the start, hPa, and its trend. */
  pressureHpa: number
  trendHpaPerDay: number
  windMs: number
  windFromDeg: number
  /** 0 clear to 1 overcast. */
  cloud: number
  fronts: readonly Front[]
}

export interface StationReading {
  /** End of the interval that it stands for, epoch ms. */
  at: number
  temperatureC: number
  humidityPct: number
  dewpointC: number
  pressureHpa: number
  windMs: number
  gustMs: number
  /** From which it blows, 1–360; 0 where it is calm. */
  windDeg: number
  globalWm2: number
  rainMm: number
}

/** By day the sun warms a shallow layer quickly; by night it cools slowly. Gives the maximum two to three hours after noon, the minimum at sunrise. */
const relaxation = { day: 2.6 * 3_600_000, night: 5 * 3_600_000 }
const nightCoolingK = 7 // below the air mass's own, by a clear sky
const step = 60_000
const square = (x: number) => x * x

/**
 * A roof station's record, every `everyMinutes` from `from` to `to`.
 * Temperature relaxes toward the air mass, warmed by the sun and cooled by a clear sky; humidity, dewpoint and temperature
 * agree with one another by Bolton's formula; pressure carries the twice-daily tide.
 */
export function stationRecord(place: Place, sky: Weather | Sky, span: { from: number, to: number, everyMinutes: number }, seed: string): StationReading[] {
  const random = randomFrom(`station ${seed}`)
  const readings: StationReading[] = []
  const spinUp = span.from - 24 * 3_600_000
  const noise = { air: 0, vapor: 0, speed: 0, turn: 0, cloud: 0, pressure: 0 }
  const weatherAt = typeof sky === 'function' ? sky : () => sky
  let air = weatherAt(spinUp).settlesAtC
  let interval = new Interval()
  for (let at = spinUp; at < span.to; at += step) {
    const weather = weatherAt(at)
    const sun = clearSky(at, place.latitude, place.longitude)
    const passed = weather.fronts.map(front => ({ front, share: passedBy(front, at) }))
    const sum = (of: (front: Front) => number) => passed.reduce((total, { front, share }) => total + share * of(front), 0)
    noise.cloud = ar(random, noise.cloud, 0.97)
    const nearFront = Math.min(1, passed.reduce((total, { front }) => total + exp(-square((at - front.at) / 5_400_000)), 0))
    const cloud = Math.min(1, Math.max(weather.cloud, nearFront))
    const through = Math.min(1, Math.max(0.12, 1 - 0.75 * cloud + 0.22 * noise.cloud * 4 * cloud * (1 - cloud)))
    const global = sun * through
    const goal = weather.settlesAtC - sum(front => front.coolingK) - nightCoolingK * (1 - 0.8 * cloud) + (weather.sunWarmingK * 1.55 * global) / 700
    air += ((goal - air) * step) / (sun > 30 ? relaxation.day : relaxation.night)
    // A front comes faster than the slow relaxation: the air itself is exchanged.
    for (const { front } of passed) air -= front.coolingK * 0.7 * Math.max(0, passedBy(front, at + step) - passedBy(front, at))
    noise.air = ar(random, noise.air, 0.86)
    noise.vapor = ar(random, noise.vapor, 0.95)
    const day = ((at - span.from) / 86_400_000)
    const solarHour = ((at / 3_600_000 + place.longitude / 15) % 24 + 24) % 24
    const tide = 0.45 * cos(((solarHour - 9.8) / 12) * 2 * Math.PI)
    noise.pressure = ar(random, noise.pressure, 0.99)
    const pressure = weather.pressureHpa + weather.trendHpaPerDay * day + tide + sum(front => front.riseHpa) - nearFront * 0.8 + 0.04 * noise.pressure
    const shaken = air + noise.air * (0.05 + (0.22 * global) / 700)
    const dewpointAir = weather.dewpointC - sum(front => front.dewpointDropK) + 0.9 * sin(((solarHour - 10) / 24) * 2 * Math.PI) + 0.25 * noise.vapor
    // Dew takes vapor from air that would pass 97 %: the roof never stands in fog of its own making.
    const vapor = Math.min(saturationPressure(dewpointAir), (0.955 + 0.006 * noise.vapor) * saturationPressure(shaken))
    const q = specificHumidityOf(vapor, pressure * 100)
    noise.speed = ar(random, noise.speed, 0.9)
    noise.turn = ar(random, noise.turn, 0.9)
    const gusty = 0.55 + (0.6 * global) / 700 + 1.3 * nearFront
    const speed = Math.max(0, weather.windMs * gusty * exp(0.28 * noise.speed))
    const from = weather.windFromDeg + sum(front => front.veerDeg) + noise.turn * (speed < 1 ? 30 : 9)
    const tips = passed.reduce((total, { front }) => total + (front.rainMm / 70) * (Math.abs(at - front.at - 900_000) < 2_100_000 ? 1 : 0), 0)
    interval.add({ temperature: shaken, q, pressure, speed, from, global, tips: random.uniform() < tips / 0.2 ? 1 : 0, gust: speed * (1.25 + 0.2 * random.uniform()) })
    const end = at + step
    if (at < span.from || (end - span.from) % (span.everyMinutes * step) !== 0) {
      if (at < span.from) interval = new Interval()
      continue
    }
    readings.push(interval.reading(end, random))
    interval = new Interval()
  }
  return readings
}

/** How much of a front's change is there: it comes within a half hour and fades over days. */
function passedBy(front: Front, at: number): number {
  const since = at - front.at
  return (1 / (1 + exp(-since / 600_000))) * (front.lastsMs === undefined || since < 0 ? 1 : exp(-since / front.lastsMs))
}

/** One step of a first-order autoregression with unit variance. */
function ar(random: Random, before: number, memory: number): number {
  return memory * before + sqrt(1 - memory * memory) * random.normal()
}

interface Minute { temperature: number, q: number, pressure: number, speed: number, from: number, global: number, tips: number, gust: number }

/** What the logger averages before it writes a line. Directions are averaged as vectors. */
class Interval {
  private minutes: Minute[] = []
  add(minute: Minute) {
    this.minutes.push(minute)
  }

  reading(at: number, random: Random): StationReading {
    const mean = (of: (minute: Minute) => number) => this.minutes.reduce((total, minute) => total + of(minute), 0) / this.minutes.length
    const temperatureC = mean(m => m.temperature) + 0.02 * random.normal()
    const pressureHpa = mean(m => m.pressure)
    const humidityPct = Math.min(100, relativeHumidity(temperatureC, mean(m => m.q), pressureHpa * 100) + 0.25 * random.normal())
    const windMs = mean(m => m.speed)
    const east = mean(m => m.speed * sin((m.from * Math.PI) / 180))
    const north = mean(m => m.speed * cos((m.from * Math.PI) / 180))
    const degrees = Math.round(((atan2(east, north) * 180) / Math.PI + 360) % 360)
    return {
      at, temperatureC, humidityPct, dewpointC: dewpointOf((humidityPct / 100) * saturationPressure(temperatureC)), pressureHpa, windMs,
      gustMs: Math.max(...this.minutes.map(m => m.gust)), windDeg: windMs < 0.3 ? 0 : degrees === 0 ? 360 : degrees,
      globalWm2: mean(m => m.global), rainMm: 0.2 * this.minutes.reduce((total, m) => total + m.tips, 0),
    }
  }
}

/** Pressure at the field from the barometer on the roof, hydrostatically, with the virtual temperature of the air between. hPa in and out. */
export function fieldPressure(place: Place, reading: Pick<StationReading, 'pressureHpa' | 'temperatureC' | 'dewpointC'>): number {
  const q = specificHumidityOf(saturationPressure(reading.dewpointC), reading.pressureHpa * 100)
  const scale = (gasConstant * virtual(reading.temperatureC + 273.15, q)) / gravity
  return reading.pressureHpa * exp((place.barometerElevationM - place.fieldElevationM) / scale)
}
