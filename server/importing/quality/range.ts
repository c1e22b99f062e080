import { findMeasuredUnit } from '#shared/schemas/data'
import { plausibleRange } from './limits'

/** Limits of a column in its own unit, or null where the quantity has none. For a flight the pressure goes as low as the sonde gets. */
export function rangeOf(quantity: string, unitUcum: string, kind: 'station' | 'flight'): readonly [number, number] | null {
  const range = kind === 'flight' && quantity === 'pressure' ? [1, 1100] as const : kind === 'flight' && quantity === 'air-temperature' ? [-100, 60] as const : plausibleRange[quantity]
  const unit = findMeasuredUnit(quantity, unitUcum)
  return range && unit ? [(range[0] - unit.offset) / unit.factor, (range[1] - unit.offset) / unit.factor] : null
}

/** Marks values beyond the limits; slack covers the rounding of the unit's conversion. */
export function markRange(values: Float64Array, flags: Uint8Array, limits: readonly [number, number], bit: number): void {
  const slack = 1e-9 * Math.max(Math.abs(limits[0]), Math.abs(limits[1]))
  for (let row = 0; row < values.length; row += 1) {
    const value = values[row]!
    if (value < limits[0] - slack || value > limits[1] + slack) flags[row]! |= bit
  }
}
