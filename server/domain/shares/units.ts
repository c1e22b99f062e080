import { refuse } from '#shared/errors'
import { fromDecimal, toDouble } from '#shared/numerics/rational'
import type { NumberKind } from '#shared/thermo/definition'
import { findUnit, isCommensurable, toSi } from '#shared/units/ucum'

/** True when both codes are units of the same kind of quantity. */
export function isSameDimension(code: string, other: string): boolean {
  const a = findUnit(code)
  const b = findUnit(other)
  return a !== null && b !== null && isCommensurable(a, b)
}

/** Served digits as an SI number: converted exactly, rounded once to the nearest double. Null where the text is no number or the unit is none. */
export function siFromText(text: string, code: string, kind: NumberKind): number | null {
  const unit = findUnit(code)
  const value = fromDecimal(text)
  return unit && value ? toDouble(toSi(value, unit, kind !== 'temperature')) : null
}

/** A width in an asked unit as an SI width: a degree of a temperature is a step, never a point of the scale. */
export function siWidth(width: number, code: string): number {
  return siFromText(String(width), code, 'difference') ?? refuse('binding_invalid', { step: '', reason: `"${code}" is not a unit.` })
}

/** A served height in meters. */
export const metersFromText = (text: string, code: string): number | null => siFromText(text, code, 'difference')
