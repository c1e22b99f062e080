import type { FiledReading } from './faults'
import type { FlightReading } from './flight'
import type { Place } from './place'

const two = (n: number) => String(n).padStart(2, '0')
const fixed = (value: number | null, decimals: number, missing: string) => value === null ? missing : value.toFixed(decimals).replace(/^-(0(?:\.0+)?)$/, '$1')

const utcStamp = (at: number) => `${new Date(at).toISOString().slice(0, 10)} ${new Date(at).toISOString().slice(11, 19)}`

/** The parts of an instant on the clocks of a zone. */
export function wallClock(at: number, zone: string): { year: number, month: number, day: number, hour: number, minute: number, second: number } {
  const parts = new Intl.DateTimeFormat('en-US', { timeZone: zone, hourCycle: 'h23', year: 'numeric', month: 'numeric', day: 'numeric', hour: 'numeric', minute: 'numeric', second: 'numeric' }).formatToParts(at)
  const part = (type: string) => Number(parts.find(found => found.type === type)?.value)
  return { year: part('year'), month: part('month'), day: part('day'), hour: part('hour'), minute: part('minute'), second: part('second') }
}

/** The roof logger: four head lines (station, names, units, how each was taken), commas, stamps in UTC at the interval's end, −9999 where a sensor was silent. */
export function roofLoggerFile(place: Place, readings: readonly FiledReading[], everyMinutes: number): string {
  const rows = readings.map((r, at) => [
    `"${utcStamp(r.at)}"`, at + 1, fixed(r.temperatureC, 2, '-9999'), fixed(r.humidityPct, 1, '-9999'), fixed(r.pressureHpa, 2, '-9999'),
    fixed(r.windMs, 2, '-9999'), fixed(r.gustMs, 2, '-9999'), fixed(r.windDeg, 0, '-9999'), fixed(r.globalWm2, 1, '-9999'), fixed(r.rainMm, 1, '-9999'),
  ].join(','))
  return [
    `"${place.station}","logger 2","program 14","every ${everyMinutes} min","stamp = end of interval, UTC"`,
    '"time","record","air_temp","rel_hum","station_pressure","wind_speed","wind_gust","wind_from","global_rad","rain"',
    '"UTC","no.","°C","%","hPa","m/s","m/s","deg","W/m^2","mm"',
    '"","","mean","mean","mean","mean","max","vector mean","mean","sum"',
    ...rows, '',
  ].join('\n')
}

/** The field station's logger: semicolons, decimal commas, day first, local wall time at the interval's end; an hour stands twice when clocks go back. */
export function fieldStationFile(place: Place, readings: readonly FiledReading[]): string {
  const comma = (text: string) => text.replace('.', ',')
  const rows = readings.map((r) => {
    const t = wallClock(r.at, place.zone)
    return [
      `${two(t.day)}.${two(t.month)}.${t.year} ${two(t.hour)}:${two(t.minute)}`, comma(fixed(r.temperatureC, 1, '---')), comma(fixed(r.humidityPct, 0, '---')),
      comma(fixed(r.pressureHpa, 1, '---')), comma(fixed(r.windMs, 1, '---')), fixed(r.windDeg, 0, '---'),
    ].join(';')
  })
  return ['Date and time;Temperature [°C];Humidity [%];Pressure [hPa];Wind speed [m/s];Wind direction [°]', ...rows, ''].join('\r\n')
}

/** The tethersonde's ground unit: remarks after "#", then a table. Height is above the field. */
export function flightFile(place: Place, readings: readonly FlightReading[], about: { name: string, lagS: number, fieldPressureHpa: number }): string {
  const rows = readings.map(r => [
    new Date(r.at).toISOString().replace('.000Z', 'Z'), fixed(r.elapsedS, 0, ''), fixed(r.heightM, 1, ''), fixed(r.pressureHpa, 1, ''),
    fixed(r.temperatureC, 2, ''), fixed(r.humidityPct, 1, ''), fixed(r.windMs, 1, ''), fixed(r.windDeg, 0, ''),
  ].join(','))
  return [
    `# flight ${about.name}, ${place.field}`,
    `# field ${place.fieldElevationM} m above sea level, ${place.latitude.toFixed(2)} N ${Math.abs(place.longitude).toFixed(2)} W`,
    `# pressure at the field before the flight ${about.fieldPressureHpa.toFixed(1)} hPa`,
    `# temperature sensor: time constant ${about.lagS} s in 4 m/s of air; not corrected`,
    '# height above the field; times in UTC',
    'time,elapsed_s,height_m,pressure_hpa,temperature_c,humidity_pct,wind_speed_ms,wind_from_deg',
    ...rows, '',
  ].join('\n')
}
