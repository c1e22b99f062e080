import type { Temporal } from 'temporal-polyfill'
import { instantOf, lastFallBack } from './calendar'
import { withFaults } from './generator/faults'
import { flight, type FlightPlan } from './generator/flight'
import { fieldStationFile, flightFile, roofLoggerFile } from './generator/loggerFiles'
import { place } from './generator/place'
import { morningOver, skyOver } from './generator/skies'
import { sunrise } from './generator/sun'
import { fieldPressure, stationRecord, type Sky, type StationReading } from './generator/weather'

/** A file as the technician brings it in: when, under which name, and what it is. */
export interface LoggerFile { kind: 'roof' | 'field' | 'flight', title: string, fileName: string, content: string, broughtInAt: number, everyMinutes: number }
export interface FlightFile extends LoggerFile { kind: 'flight', startsAt: number }

const hour = 3_600_000
const day = 24 * hour
const hoursFromSunrise = [-0.5, 1.6, 3.3] as const
const flightPlan: Omit<FlightPlan, 'startsAt'> = { topM: 600, winchMs: 1.5, stops: [{ heightM: 100, seconds: 30 }, { heightM: 300, seconds: 30 }], lagS: 4, humidityLagS: 9, everyS: 2 }

/** The weather and the files of one stretch of a term. The same name and days give the same files. */
export class Observing {
  private readonly sky: Sky
  private readonly midnights: number[]

  constructor(private readonly name: string, private readonly from: Temporal.PlainDate, private readonly to: Temporal.PlainDate, private readonly flightDays: readonly Temporal.PlainDate[]) {
    this.midnights = flightDays.map(date => instantOf(date, '00:00'))
    this.sky = skyOver({ from: instantOf(from, '00:00'), to: instantOf(to, '00:00') }, this.midnights, name)
  }

  /** The roof's ten-minute record over the whole stretch: long, sound but for a night of missing pressure, and the night's offset of the pyranometer. */
  roofRecord(): LoggerFile {
    const span = { from: instantOf(this.from, '00:00'), to: instantOf(this.to, '00:00'), everyMinutes: 10 }
    const rows = stationRecord(place, this.sky, span, this.name)
    const night = Math.min(rows.length - 60, 9 * 144)
    const filed = withFaults(rows, [{ kind: 'night offset', wm2: -2.1 }, { kind: 'missing', fromRow: night, toRow: night + 41, column: 'pressureHpa' }, { kind: 'gap', fromRow: 5 * 144 + 60, toRow: 5 * 144 + 83 }])
    return { kind: 'roof', title: `Roof, every 10 min, ${this.name}`, fileName: `roof_10min_${this.from.toString()}_${this.to.subtract({ days: 1 }).toString()}.csv`, content: roofLoggerFile(place, filed, 10), broughtInAt: span.to + 8 * hour, everyMinutes: 10 }
  }

  /** One day of the roof at one minute, with what goes wrong on roofs. */
  faultyDay(date: Temporal.PlainDate): LoggerFile {
    const from = instantOf(date, '00:00')
    const rows = stationRecord(place, this.sky, { from, to: from + day, everyMinutes: 1 }, `${this.name} ${date.toString()}`)
    const filed = withFaults(rows, [
      { kind: 'gap', fromRow: 250, toRow: 289 }, { kind: 'spike', row: 580, column: 'temperatureC', by: 6.2 }, { kind: 'spike', row: 581, column: 'temperatureC', by: 3.4 },
      { kind: 'missing', fromRow: 640, toRow: 651, column: 'humidityPct' }, { kind: 'stuck', fromRow: 800, toRow: 871, columns: ['temperatureC', 'humidityPct'] }, { kind: 'night offset', wm2: -2.6 },
    ])
    return { kind: 'roof', title: `Roof, every minute, ${spoken(date)}`, fileName: `roof_1min_${date.toString()}.csv`, content: roofLoggerFile(place, filed, 1), broughtInAt: from + day + 9 * hour, everyMinutes: 1 }
  }

  /** The flights of one clear morning: before the sun, while the inversion goes, and when it is gone below. */
  flights(date: Temporal.PlainDate, firstNo: number): FlightFile[] {
    const midnight = instantOf(date, '00:00')
    const rows = stationRecord(place, this.sky, { from: midnight, to: midnight + day, everyMinutes: 1 }, `${this.name} ${date.toString()}`)
    const at = (instant: number): StationReading => rows[Math.round((instant - midnight) / 60_000) - 1] ?? (() => { throw new Error('The roof was not read then.') })()
    const up = sunrise(midnight, place.latitude, place.longitude)
    const morning = morningOver(place, midnight, at(up), `${this.name} ${date.toString()}`)
    return hoursFromSunrise.map((hours, which) => {
      const startsAt = Math.round((up + hours * hour) / 60_000) * 60_000
      const no = firstNo + which
      const now = { ...morning, pressureHpa: fieldPressure(place, at(startsAt)) }
      const readings = flight(place, now, { ...flightPlan, startsAt }, `${this.name} ${no}`)
      const time = new Date(startsAt).toISOString().slice(11, 16).replace(':', '')
      return {
        kind: 'flight', title: `Flight ${no}, ${spoken(date)}, ${localTime(startsAt)}`, fileName: `flight_${no}_${new Date(startsAt).toISOString().slice(0, 10).replaceAll('-', '')}T${time}Z.csv`,
        content: flightFile(place, readings, { name: String(no), lagS: flightPlan.lagS, fieldPressureHpa: now.pressureHpa }), startsAt, broughtInAt: midnight + 14 * hour + which * 240_000, everyMinutes: 0,
      }
    })
  }
}

/** The meadow station on the last night on which the clocks went back: its local hour stands twice. */
export function clockChangeDay(now: number): LoggerFile {
  const date = lastFallBack(now)
  const from = instantOf(date, '00:00')
  const to = instantOf(date.add({ days: 1 }), '00:00')
  const rows = stationRecord(place, skyOver({ from, to }, [], 'clock change'), { from, to, everyMinutes: 5 }, 'clock change')
  return { kind: 'field', title: `Meadow station, ${spoken(date)}, clocks went back`, fileName: `meadow_${date.toString()}.csv`, content: fieldStationFile(place, withFaults(rows, [])), broughtInAt: to + 10 * hour, everyMinutes: 5 }
}

const spoken = (date: Temporal.PlainDate) => `${date.day} ${date.toLocaleString('en-US', { month: 'long' })} ${date.year}`
const localTime = (at: number) => new Intl.DateTimeFormat('en-GB', { timeZone: place.zone, hour: '2-digit', minute: '2-digit' }).format(at)
