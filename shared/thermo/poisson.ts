import { pow } from '../numerics/elementary'
import { type Kelvin, kelvin, type Pascal } from '../units/brands'
import { kappaOf } from './constants'
import type { Constants } from './definition'

/**
 * Temperature after a dry-adiabatic change of pressure.
 *
 *   T₂ = T₁ (p₂ / p₁)^κ
 *
 * Source: AMS Glossary of Meteorology, "Poisson equation". Valid where cp is constant (150–400 K, to 0.3 %).
 *
 * @example poissonTemperature(kelvin(293.15), pascal(100000), pascal(70000), { R: 287, cp: 1004 }) // 264.73 K
 */
export function poissonTemperature(temperature: Kelvin, from: Pascal, to: Pascal, constants: Constants): Kelvin {
  return kelvin(temperature * pow(to / from, kappaOf(constants)))
}
