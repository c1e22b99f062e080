/** Edges of a band as decimals in the asked unit, rounded outwards by at most 1e-9 of the band's size; compared as decimals, edge included. */
import { absolute, compare, fromDecimal, fromDouble, leadingExponent, toPlace, type Rational } from '../numerics/rational'
import { fromSi, type Unit } from '../units/ucum'

export function outwardDecimals(low: number, high: number, unit: Unit, isDifference: boolean): { lowDecimal: string, highDecimal: string } {
  const exactLow = fromDouble(low), exactHigh = fromDouble(high)
  const inUnitLow = fromSi(exactLow, unit, isDifference), inUnitHigh = fromSi(exactHigh, unit, isDifference)
  // what the doubles cannot tell apart is measured by the largest number that went in: kelvin, for a temperature near 0 °C
  const sizes = [inUnitLow, inUnitHigh, ...(isDifference ? [] : [exactLow, exactHigh])].map(absolute)
  const largest = sizes.reduce((a, b) => (compare(a, b) >= 0 ? a : b))
  const place = largest.numerator === 0n ? -9 : leadingExponent(largest) - 9
  return { lowDecimal: toPlace(inUnitLow, place, 'down'), highDecimal: toPlace(inUnitHigh, place, 'up') }
}

/** Whether a typed decimal lies between two, edges included. */
export function liesWithin(typed: string, lowDecimal: string, highDecimal: string): boolean {
  const value = fromDecimal(typed), low = fromDecimal(lowDecimal), high = fromDecimal(highDecimal)
  if (!value || !low || !high) return false
  return compare(low, value) <= 0 && compare(value, high) <= 0
}

/** How far a typed decimal lies from a double in SI, as a number in the asked unit; for showing and for slips. */
export function exactInUnit(si: number, unit: Unit, isDifference: boolean): Rational {
  return fromSi(fromDouble(si), unit, isDifference)
}
