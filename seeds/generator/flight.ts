import { fromPotential, gasConstant, gravity, heatCapacity, relativeHumidity, virtual } from './air'
import { exp, pow, randomFrom, sqrt } from './arithmetic'
import type { Place } from './place'
import { clearSky, sunrise } from './sun'

/** A clear morning over the field: what the night left, and how the sun takes it down. */
export interface Morning {
  /** Local midnight before it, epoch ms. */
  midnight: number
  /** Pressure at the field, hPa. */
  pressureHpa: number
  /** Air temperature at the ground when the sun rises, °C. */
  groundC: number
  /** Potential temperature is lower at the ground than aloft by this much, K, over this depth, m. */
  inversionK: number
  inversionM: number
  /** What yesterday's mixing left above it: nearly, but not quite, dry-neutral. */
  residualKPerKm: number
  capM: number
  capK: number
  freeKPerKm: number
  /** Specific humidity near the ground, within the moist layer, and above the cap, g/kg. */
  groundGPerKg: number
  moistGPerKg: number
  aboveGPerKg: number
  /** The part of the sun's power that warms the air. */
  heating: number
  windMs: number
  windFromDeg: number
}

export interface AirAt { theta: number, q: number, windMs: number, windDeg: number }

const rise = (z: number, at: number, width: number) => 1 / (1 + exp(-(z - at) / width))
const square = (x: number) => x * x
const airDensity = 1.22

/** The column that the night left, before the sun reaches the ground. */
export function nightColumn(morning: Morning, z: number): AirAt {
  const ground = (morning.groundC + 273.15) * pow(1000 / morning.pressureHpa, gasConstant / heatCapacity)
  const under = z < morning.inversionM ? 1 - square(1 - z / morning.inversionM) : 1
  const above = Math.max(0, z - morning.capM - 30)
  return {
    theta: ground + morning.inversionK * under + (morning.residualKPerKm * Math.min(z, morning.capM)) / 1000 + morning.capK * rise(z, morning.capM, 11) + (morning.freeKPerKm * above) / 1000,
    q: (morning.groundGPerKg + (morning.moistGPerKg - morning.groundGPerKg) * rise(z, 0.55 * morning.inversionM, 15) + (morning.aboveGPerKg - morning.moistGPerKg) * rise(z, morning.capM, 12)) / 1000,
    windMs: morning.windMs * (0.35 + 1.25 * rise(z, morning.inversionM, 40) - 0.3 * rise(z, 1.6 * morning.inversionM, 60) + 0.5 * rise(z, morning.capM, 60)),
    windDeg: morning.windFromDeg + 24 * rise(z, morning.inversionM, 60) + 18 * rise(z, morning.capM, 80),
  }
}

export interface Mixing { depthM: number, theta: number, q: number }

/**
 * How deep the sun has mixed the column by an instant: the heat put in since sunrise fills the area between the night's
 * profile and the mixed layer's potential temperature (encroachment, without entrainment). Depth 0 before there is any.
 */
export function mixingAt(place: Place, morning: Morning, at: number): Mixing {
  const up = sunrise(morning.midnight, place.latitude, place.longitude)
  let heat = 0 // K m
  for (let t = up + 1_800_000; t < at; t += 60_000) heat += (morning.heating * clearSky(t, place.latitude, place.longitude) * 60) / (airDensity * heatCapacity)
  let filled = 0
  let vapor = 0
  let depth = 0
  let theta = nightColumn(morning, 0).theta
  while (filled < heat && depth < 2500) {
    const next = nightColumn(morning, depth + 1).theta
    filled += Math.max(0, next - theta) * (depth + 0.5)
    vapor += nightColumn(morning, depth + 0.5).q
    theta = Math.max(theta, next)
    depth++
  }
  return { depthM: depth, theta, q: depth === 0 ? nightColumn(morning, 0).q : vapor / depth }
}

/** The column at a height, given how deep it is mixed: the lowest meters stay warmer than the mixed layer, as heat leaves the ground. */
export function columnAt(morning: Morning, mixing: Mixing, z: number): AirAt {
  const night = nightColumn(morning, z)
  if (mixing.depthM < 3) return night
  const inside = 1 - rise(z, mixing.depthM, Math.min(6, mixing.depthM / 10))
  const excess = Math.min(1.1, mixing.depthM / 120) * exp(-z / 7)
  return {
    theta: inside * (mixing.theta + excess) + (1 - inside) * Math.max(night.theta, mixing.theta),
    q: inside * mixing.q + (1 - inside) * night.q,
    windMs: inside * (0.8 * morning.windMs * (0.75 + 0.25 * rise(z, 10, 8))) + (1 - inside) * night.windMs,
    windDeg: inside * (morning.windFromDeg + 14) + (1 - inside) * night.windDeg,
  }
}

export interface FlightPlan {
  startsAt: number
  topM: number
  /** Speed of the winch, m/s, up and down. */
  winchMs: number
  /** Heights at which the winch stood still on the way up, and for how long. */
  stops: readonly { heightM: number, seconds: number }[]
  /** Time constants of the temperature and humidity sensors, s. */
  lagS: number
  humidityLagS: number
  everyS: number
}

export interface FlightReading {
  at: number
  elapsedS: number
  leg: 'up' | 'top' | 'down'
  heightM: number
  pressureHpa: number
  temperatureC: number
  humidityPct: number
  windMs: number
  windDeg: number
  /** What the air was, without lag, noise or rounding: for checks, never written to a file. */
  truth: { temperatureC: number, humidityPct: number, pressureHpa: number, heightM: number, theta: number, q: number }
}

const top = 60 // seconds that the sonde hangs at the top
const tick = 0.5

/** A tethersonde's flight: up by winch with its stops, a minute at the top, down again; sensors lag on both legs. */
export function flight(place: Place, morning: Morning, plan: FlightPlan, seed: string): FlightReading[] {
  const random = randomFrom(`flight ${seed}`)
  const readings: FlightReading[] = []
  const heightBias = 0.3 * random.normal()
  let mixing = mixingAt(place, morning, plan.startsAt)
  let column = pressureColumn(morning, mixing, plan.topM)
  let sensor: { temperature: number, humidity: number } | null = null
  let waver = 0
  let aloft = 0
  for (const { seconds, height, leg } of winch(plan)) {
    if (seconds > 0 && seconds % 120 === 0) {
      mixing = mixingAt(place, morning, plan.startsAt + seconds * 1000)
      column = pressureColumn(morning, mixing, plan.topM)
    }
    waver = 0.985 * waver + 0.17 * random.normal() * sqrt(tick)
    const z = Math.max(1, height + (height > 5 ? 0.5 * waver : 0))
    const air = columnAt(morning, mixing, z)
    const pressure = column(z)
    aloft = 0.9 * aloft + 0.436 * random.normal()
    const eddy = aloft * (z < mixing.depthM ? 0.06 : 0.015)
    const temperature = fromPotential(air.theta, pressure * 100) - 273.15 + eddy
    const humidity = relativeHumidity(temperature, air.q * (1 - 0.06 * eddy), pressure * 100)
    sensor ??= { temperature, humidity }
    sensor.temperature += (temperature - sensor.temperature) * (1 - exp(-tick / plan.lagS))
    sensor.humidity += (humidity - sensor.humidity) * (1 - exp(-tick / plan.humidityLagS))
    if (seconds % plan.everyS !== 0) continue
    readings.push({
      at: plan.startsAt + seconds * 1000, elapsedS: seconds, leg,
      heightM: z + heightBias + 0.12 * random.normal(),
      pressureHpa: pressure + 0.02 * random.normal(),
      temperatureC: sensor.temperature + 0.015 * random.normal(),
      humidityPct: Math.min(100, sensor.humidity + 0.25 * random.normal()),
      windMs: Math.max(0, air.windMs * (1 + 0.09 * random.normal())),
      windDeg: (((Math.round(air.windDeg + 5 * random.normal()) - 1) % 360) + 360) % 360 + 1,
      truth: { temperatureC: temperature, humidityPct: humidity, pressureHpa: pressure, heightM: z, theta: air.theta, q: air.q },
    })
  }
  return readings
}

/** Where the winch has the sonde, every half second. */
function* winch(plan: FlightPlan): Generator<{ seconds: number, height: number, leg: FlightReading['leg'] }> {
  const stops = [...plan.stops].sort((a, b) => a.heightM - b.heightM)
  let seconds = 0
  let height = 1
  while (height < plan.topM) {
    yield { seconds, height, leg: 'up' }
    const stop = stops[0]
    if (stop && height >= stop.heightM) {
      for (let stood = 0; stood < stop.seconds; stood += tick) yield { seconds: (seconds += tick), height, leg: 'up' }
      stops.shift()
    }
    // The winch takes ten meters to come to speed.
    height += tick * plan.winchMs * Math.min(1, 0.35 + height / 15)
    seconds += tick
  }
  for (let stood = 0; stood < top; stood += tick) {
    yield { seconds, height: plan.topM, leg: 'top' }
    seconds += tick
  }
  while (height > 1) {
    yield { seconds, height, leg: 'down' }
    height -= tick * plan.winchMs * Math.min(1, 0.35 + height / 15)
    seconds += tick
  }
}

/** Pressure in hPa by height, integrated meter by meter with the virtual temperature of each. */
function pressureColumn(morning: Morning, mixing: Mixing, topM: number): (z: number) => number {
  const levels = [morning.pressureHpa]
  for (let z = 0; z < topM + 20; z++) {
    const below = levels[z]!
    const air = columnAt(morning, mixing, z + 0.5)
    const kelvin = virtual(fromPotential(air.theta, below * 100), air.q)
    levels.push(below * exp(-gravity / (gasConstant * kelvin)))
  }
  return (z) => {
    const at = Math.min(levels.length - 2, Math.floor(z))
    return levels[at]! + (levels[at + 1]! - levels[at]!) * (z - at)
  }
}
