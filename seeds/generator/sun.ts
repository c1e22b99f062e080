import { cos, exp, sin } from './arithmetic'

const rad = Math.PI / 180
const dayMs = 86_400_000

/**
 * Sine of the sun's height. Declination and equation of time by the Fourier series of Spencer (1971):
 * good to about 0.1° and half a minute, well within what a roof's horizon hides.
 */
export function sineOfSun(at: number, latitude: number, longitude: number): number {
  const year = new Date(at).getUTCFullYear()
  const day = (at - Date.UTC(year, 0, 1)) / dayMs
  const g = (2 * Math.PI * day) / 365
  const declination = 0.006918 - 0.399912 * cos(g) + 0.070257 * sin(g) - 0.006758 * cos(2 * g) + 0.000907 * sin(2 * g) - 0.002697 * cos(3 * g) + 0.00148 * sin(3 * g)
  const equation = 229.18 * (0.000075 + 0.001868 * cos(g) - 0.032077 * sin(g) - 0.014615 * cos(2 * g) - 0.040849 * sin(2 * g)) // minutes
  const solarMinutes = (day % 1) * 1440 + equation + 4 * longitude
  const hourAngle = (solarMinutes / 4 - 180) * rad
  return sin(latitude * rad) * sin(declination) + cos(latitude * rad) * cos(declination) * cos(hourAngle)
}

/** Global irradiance of a clear sky, W/m² (Haurwitz 1945: 1098 sin h exp(−0.057 / sin h)). */
export function clearSky(at: number, latitude: number, longitude: number): number {
  const s = sineOfSun(at, latitude, longitude)
  return s <= 0.005 ? 0 : 1098 * s * exp(-0.057 / s)
}

/** Instants at which the sun's center crosses −0.833° between two instants, to the minute. */
export function sunrise(from: number, latitude: number, longitude: number): number {
  const edge = sin(-0.833 * rad)
  for (let at = from; at < from + dayMs; at += 60_000) if (sineOfSun(at, latitude, longitude) < edge && sineOfSun(at + 60_000, latitude, longitude) >= edge) return at + 60_000
  throw new Error('The sun does not rise on this day.')
}
