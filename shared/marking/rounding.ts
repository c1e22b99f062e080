/**
 * Half a unit of the last digit asked, SI. Digits are counted on the reference in the asked unit, with two exceptions: a temperature has an
 * arbitrary zero and takes a fixed place, the same in every scale (3 digits are 0.1 K or 0.1 °C, as in 15.3 °C), and a quantity near zero counts as if it had its `nearZero` size.
 */
import { absolute, compare, fromDouble, leadingExponent, over, rational, tenTo, times, toDouble } from '../numerics/rational'
import type { QuantityDefinition } from '../thermo/definition'
import { fromSi, type Unit } from '../units/ucum'

/** The decimal place of the last digit asked, in the asked unit: −1 for tenths. */
export function lastPlaceAsked(definition: QuantityDefinition, reference: number, unit: Unit, digits: number): number {
  if (definition.kind === 'temperature') return 2 - digits
  const size = absolute(fromSi(fromDouble(reference), unit, true))
  const least = definition.nearZero === undefined ? null : over(fromDouble(definition.nearZero), unit.factor)
  const counted = least && compare(size, least) < 0 ? least : size
  return (counted.numerator === 0n ? 0 : leadingExponent(counted)) - digits + 1
}

export function halfUnitAsked(definition: QuantityDefinition, reference: number, unit: Unit, digits: number): number {
  const place = lastPlaceAsked(definition, reference, unit, digits)
  const step = place >= 0 ? rational(tenTo(place)) : rational(1n, tenTo(-place))
  return toDouble(times(times(step, rational(1n, 2n)), absolute(unit.factor)))
}

/** For the ask: "to 0.1 K" for a temperature, "to 0.1 degree" where no unit is named, "3 significant digits" for the rest. */
export function digitsInWords(definition: QuantityDefinition, digits: number, unit?: string): string {
  if (definition.kind === 'class') return 'one of the classes'
  if (definition.kind !== 'temperature') return `${digits} significant digit${digits === 1 ? '' : 's'}`
  const place = 2 - digits
  if (place > 0) return `to ${place === 1 ? 10 : 100} ${unit ?? 'degrees'}`
  return `to ${place === 0 ? '1' : `0.${'1'.padStart(-place, '0')}`} ${unit ?? 'degree'}`
}
