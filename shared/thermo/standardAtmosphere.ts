/**
 * The standard atmosphere to 32 geopotential kilometers: temperature in straight layers of geopotential height, hydrostatic balance, dry air.
 *
 *   with a lapse rate:  T = T_b + L (H − H_b)     p = p_b (T_b/T)^(g₀/(R L))
 *   isothermal:         p = p_b exp[−g₀ (H − H_b)/(R T_b)]
 *
 * Source: ISO 2533:1975; ICAO Doc 7488/3 (1993); U.S. Standard Atmosphere 1976, Eqs. 23, 33a, 33b (identical below 32 km).
 * The standard has constants of its own: a course's convention does not change them.
 */
import { exp, log, pow } from '../numerics/elementary'
import { type Kelvin, kelvin, type KilogramPerCubicMeter, kilogramPerCubicMeter, type Meter, meter, type Pascal, pascal } from '../units/brands'
import { OutOfRangeError } from './errors'

export interface StandardLayer { baseHeight: number, lapse: number }
export interface StandardConstants {
  /** m s⁻² */
  gravity: number
  /** J kg⁻¹ K⁻¹ */
  gasConstant: number
  /** K at 0 m */
  temperature: number
  /** Pa at 0 m */
  pressure: number
  /** dT/dH above each height, K per geopotential meter, and where the last one ends. */
  layers: readonly StandardLayer[]
  top: number
  /** m, for geometric heights */
  earthRadius: number
}

/** ISO 2533:1975, Tables 1 and 4. */
export const standardConstants: StandardConstants = {
  gravity: 9.80665,
  gasConstant: 287.05287,
  temperature: 288.15,
  pressure: 101_325,
  layers: [{ baseHeight: 0, lapse: -0.0065 }, { baseHeight: 11_000, lapse: 0 }, { baseHeight: 20_000, lapse: 0.001 }],
  top: 32_000,
  earthRadius: 6_356_766,
}

/** The lowest height that the standard's tables cover, geopotential meters. */
export const lowestStandardHeight = -2000

export interface StandardAir { temperature: Kelvin, pressure: Pascal, density: KilogramPerCubicMeter }

interface Base { layer: StandardLayer, height: number, temperature: number, pressure: number, topHeight: number }

const pressureWithin = (base: Base, height: number, of: StandardConstants): number => {
  const { lapse } = base.layer
  if (lapse === 0) return base.pressure * exp(-of.gravity * (height - base.height) / (of.gasConstant * base.temperature))
  return base.pressure * pow(base.temperature / (base.temperature + lapse * (height - base.height)), of.gravity / (of.gasConstant * lapse))
}

function basesOf(of: StandardConstants): Base[] {
  const bases: Base[] = []
  let temperature = of.temperature, pressure = of.pressure
  of.layers.forEach((layer, at) => {
    const base: Base = { layer, height: layer.baseHeight, temperature, pressure, topHeight: of.layers[at + 1]?.baseHeight ?? of.top }
    bases.push(base)
    pressure = pressureWithin(base, base.topHeight, of)
    temperature += layer.lapse * (base.topHeight - base.height)
  })
  return bases
}

const standardBases = basesOf(standardConstants)
const basesFor = (of: StandardConstants): readonly Base[] => (of === standardConstants ? standardBases : basesOf(of))

/**
 * Temperature, pressure and density at a geopotential height.
 * @throws {OutOfRangeError} outside −2000 to 32 000 m
 * @example standardAtmosphere(meter(5000)) // 255.65 K, 54019.9 Pa, 0.736116 kg m⁻³
 */
export function standardAtmosphere(geopotentialHeight: Meter, of: StandardConstants = standardConstants): StandardAir {
  if (!(geopotentialHeight >= lowestStandardHeight && geopotentialHeight <= of.top)) throw new OutOfRangeError('geopotentialHeight', geopotentialHeight, `${lowestStandardHeight} to ${of.top} m`)
  const bases = basesFor(of)
  const base = bases.findLast(one => geopotentialHeight >= one.height) ?? bases[0]
  if (!base) throw new Error('a standard atmosphere has a layer')
  const temperature = base.temperature + base.layer.lapse * (geopotentialHeight - base.height)
  const pressure = pressureWithin(base, geopotentialHeight, of)
  return { temperature: kelvin(temperature), pressure: pascal(pressure), density: kilogramPerCubicMeter(pressure / (of.gasConstant * temperature)) }
}

/**
 * The geopotential height at which the standard atmosphere has a pressure: the pressure altitude.
 * @throws {OutOfRangeError} for pressures that the standard has not between −2000 and 32 000 m
 * @example standardHeight(pascal(89874.6)) // 1000 m
 */
export function standardHeight(pressure: Pascal, of: StandardConstants = standardConstants): Meter {
  const bases = basesFor(of)
  const base = bases.findLast(one => pressure <= one.pressure) ?? bases[0]
  if (!base) throw new Error('a standard atmosphere has a layer')
  const { lapse } = base.layer
  const height = lapse === 0
    ? base.height + of.gasConstant * base.temperature / of.gravity * log(base.pressure / pressure)
    : base.height + base.temperature / lapse * (pow(pressure / base.pressure, -of.gasConstant * lapse / of.gravity) - 1)
  // a millimeter for what rounding does at the ends
  if (!(height >= lowestStandardHeight - 0.001 && height <= of.top + 0.001)) throw new OutOfRangeError('pressure', pressure, `the pressures of the standard atmosphere between ${lowestStandardHeight} and ${of.top} m`)
  return meter(height)
}

/**
 * Geopotential height of a geometric one: H = a z/(a + z), with gravity falling by the square of the distance from the earth's center.
 * Source: U.S. Standard Atmosphere 1976, Eq. 18.
 * @example geopotentialOfGeometric(meter(10000), 6356766) // 9984.29 m
 */
export const geopotentialOfGeometric = (geometricHeight: Meter, earthRadius: number): Meter => meter(earthRadius * geometricHeight / (earthRadius + geometricHeight))

/**
 * Geometric height of a geopotential one: z = a H/(a − H). Source: U.S. Standard Atmosphere 1976, Eq. 19.
 * @example geometricOfGeopotential(meter(10000), 6356766) // 10015.76 m
 */
export const geometricOfGeopotential = (geopotentialHeight: Meter, earthRadius: number): Meter => meter(earthRadius * geopotentialHeight / (earthRadius - geopotentialHeight))
