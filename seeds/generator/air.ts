import { exp, log, pow } from './arithmetic'

/** Constants of the invented atmosphere: real ones, not those that a course teaches with. */
export const gravity = 9.80665
export const gasConstant = 287.05
export const heatCapacity = 1004.7
export const kappa = gasConstant / heatCapacity
const epsilon = 0.622

/** Bolton (1980) Eq. 10, over water; °C in, Pa out. */
export const saturationPressure = (celsius: number) => 611.2 * exp((17.67 * celsius) / (celsius + 243.5))
/** Eq. 10 turned round; Pa in, °C out. */
export function dewpointOf(vaporPressure: number): number {
  const l = log(vaporPressure / 611.2)
  return (243.5 * l) / (17.67 - l)
}
/** Vapor pressure in Pa of air with specific humidity q at pressure p in Pa. */
export const vaporPressureOf = (q: number, p: number) => (q * p) / (epsilon + (1 - epsilon) * q)
export const specificHumidityOf = (e: number, p: number) => (epsilon * e) / (p - (1 - epsilon) * e)
export const virtual = (kelvin: number, q: number) => kelvin * (1 + 0.608 * q)
export const potential = (kelvin: number, p: number) => kelvin * pow(100_000 / p, kappa)
export const fromPotential = (theta: number, p: number) => theta * pow(p / 100_000, kappa)
/** Relative humidity in per cent, over water at every temperature, as sensors report it. */
export const relativeHumidity = (celsius: number, q: number, p: number) => (100 * vaporPressureOf(q, p)) / saturationPressure(celsius)
