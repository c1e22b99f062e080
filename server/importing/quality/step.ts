import { findMeasuredUnit } from '#shared/schemas/data'
import { greatestStep } from './limits'

export interface StepLimit { fromMs: number, toMs: number, limit: number }

export function stepsOf(quantity: string, unitUcum: string): readonly StepLimit[] {
  const unit = findMeasuredUnit(quantity, unitUcum)
  if (!unit) return []
  return (greatestStep[quantity] ?? []).map(step => ({ fromMs: step.fromS * 1000, toMs: step.toS * 1000, limit: step.limit / Math.abs(unit.factor) }))
}

/** The row before the first of a day: the last of the day before. */
export interface Before { time: number, value: number }

/** Marks a value that jumped from the row before; across a gap nothing is compared. Returns the last row for the next day. */
export function markStep(time: Float64Array, values: Float64Array, flags: Uint8Array, limits: readonly StepLimit[], bit: number, before: Before | null): Before | null {
  let last = before
  for (let row = 0; row < values.length; row += 1) {
    const at = time[row]!
    const value = values[row]!
    if (last !== null && !Number.isNaN(value) && !Number.isNaN(last.value)) {
      const apart = at - last.time
      const change = Math.abs(value - last.value)
      for (const limit of limits) if (apart >= limit.fromMs && apart <= limit.toMs && change > limit.limit * (1 + 1e-9)) flags[row]! |= bit
    }
    last = { time: at, value }
  }
  return last
}
