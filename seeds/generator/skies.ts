import { saturationPressure, specificHumidityOf } from './air'
import { cos, randomFrom, type Random } from './arithmetic'
import type { Morning } from './flight'
import type { Place } from './place'
import { fieldPressure, type Front, type Sky, type StationReading, type Weather } from './weather'

const day = 86_400_000

/** Mean air temperature of the place by the season, °C: coldest in the third week of January. */
export function seasonalMean(at: number): number {
  const start = Date.UTC(new Date(at).getUTCFullYear(), 0, 1)
  return 7.5 - 14.5 * cos((2 * Math.PI * ((at - start) / day - 18)) / 365.25)
}

/**
 * Weather from day to day over a span: air masses come and go in about four days, a front passes about every week,
 * and the days on which flights were planned are clear and calm, as they would have been called off otherwise.
 */
export function skyOver(span: { from: number, to: number }, clearDays: readonly number[], seed: string): Sky {
  const random = randomFrom(`sky ${seed}`)
  const memory = { air: 0, pressure: 0, cloud: 0, turn: 0 }
  const anchors: Omit<Weather, 'fronts'>[] = []
  const first = span.from - 2 * day
  for (let midnight = first; midnight <= span.to + 2 * day; midnight += day) {
    for (const key of ['air', 'pressure', 'cloud', 'turn'] as const) memory[key] = 0.72 * memory[key] + 0.69 * random.normal()
    const isClear = clearDays.some(clear => midnight > clear - 1.3 * day && midnight <= clear + 1.1 * day)
    const settlesAtC = seasonalMean(midnight) + 1.5 + 3.6 * memory.air
    anchors.push({
      settlesAtC, sunWarmingK: 10, dewpointC: settlesAtC - 6.6 - 1.2 * Math.abs(memory.cloud), trendHpaPerDay: 0,
      pressureHpa: 964.5 + 5 * memory.pressure - 1.4 * memory.air + (isClear ? 4 : 0),
      windMs: isClear ? 2.1 : 3 + 1.1 * Math.abs(memory.turn), windFromDeg: 235 + 40 * memory.turn,
      cloud: isClear ? 0.04 : Math.min(1, Math.max(0.05, 0.5 + 0.33 * memory.cloud)),
    })
  }
  const fronts = frontsOver(span, clearDays, random)
  return (at) => {
    const place = Math.min(anchors.length - 1.001, Math.max(0, (at - first) / day))
    const before = anchors[Math.floor(place)]!
    const after = anchors[Math.floor(place) + 1]!
    const part = place - Math.floor(place)
    const mix = (of: (weather: Omit<Weather, 'fronts'>) => number) => of(before) * (1 - part) + of(after) * part
    return {
      settlesAtC: mix(w => w.settlesAtC), sunWarmingK: mix(w => w.sunWarmingK), dewpointC: mix(w => w.dewpointC), pressureHpa: mix(w => w.pressureHpa), trendHpaPerDay: 0,
      windMs: mix(w => w.windMs), windFromDeg: mix(w => w.windFromDeg), cloud: mix(w => w.cloud), fronts: fronts.filter(front => Math.abs(at - front.at) < 12 * day),
    }
  }
}

function frontsOver(span: { from: number, to: number }, clearDays: readonly number[], random: Random): Front[] {
  const fronts: Front[] = []
  for (let at = span.from + 3 * day; at < span.to; at += (5.5 + 3 * random.uniform()) * day) {
    if (clearDays.some(clear => at > clear - 1.5 * day && at < clear + 1.5 * day)) continue
    fronts.push({ at, coolingK: 3 + 3 * random.uniform(), dewpointDropK: 3 + 2 * random.uniform(), veerDeg: 70 + 30 * random.uniform(), riseHpa: 4 + 3 * random.uniform(), rainMm: 1 + 7 * random.uniform(), lastsMs: 1.6 * day })
  }
  return fronts
}

/** The column over the field on a clear morning, fitted to what the roof read when the sun rose. No two mornings are alike. */
export function morningOver(place: Place, midnight: number, atSunrise: StationReading, seed: string): Morning {
  const random = randomFrom(`morning ${seed}`)
  const between = (low: number, high: number) => low + (high - low) * random.uniform()
  const pressureHpa = fieldPressure(place, atSunrise)
  const groundC = atSunrise.temperatureC - between(0.4, 1.2)
  const inversionK = between(4.8, 7.2)
  const inversionM = between(130, 190)
  const capM = between(420, 490)
  const humidityAt = (celsius: number, pct: number, hPa: number) => 1000 * specificHumidityOf((pct / 100) * saturationPressure(celsius), hPa * 100)
  const aloftC = groundC + inversionK - 0.0098 * capM * 0.85
  return {
    midnight, pressureHpa, groundC, inversionK, inversionM, capM, residualKPerKm: between(1.2, 2), capK: between(2.2, 3.4), freeKPerKm: between(3.4, 4.6),
    groundGPerKg: humidityAt(groundC, between(84, 91), pressureHpa), moistGPerKg: humidityAt(aloftC, between(76, 84), pressureHpa - 0.118 * capM),
    aboveGPerKg: humidityAt(aloftC + 2, between(32, 42), pressureHpa - 0.118 * capM), heating: between(0.11, 0.14), windMs: between(2.8, 4), windFromDeg: between(190, 240),
  }
}
