import type { DayJudge } from '../../observations/recordWriter'
import { flagBit, type StoredColumn } from '../../observations/root'
import { markDuplicate } from './duplicate'
import { markOrder } from './order'
import { markRange, rangeOf } from './range'
import { markStep, stepsOf, type Before } from './step'

/** Judges the days of one record in order. Flags stand beside the values; nothing is removed or changed. */
export function judgeDays(columns: readonly StoredColumn[], kind: 'station' | 'flight'): DayJudge {
  const rules = columns.map(column => ({ range: column.role === 'value' ? rangeOf(column.quantity, column.unitUcum, kind) : null, steps: column.role === 'value' && kind === 'station' ? stepsOf(column.quantity, column.unitUcum) : [] }))
  const before: (Before | null)[] = columns.map(() => null)
  let lastTime: number | null = null
  return (day) => {
    const flags = columns.map(() => new Uint8Array(day.time.length))
    rules.forEach(({ range, steps }, n) => {
      const values = day.columns[n]!
      if (range) markRange(values, flags[n]!, range, flagBit('range'))
      if (steps.length > 0) before[n] = markStep(day.time, values, flags[n]!, steps, flagBit('step'), before[n] ?? null)
    })
    if (kind === 'station') {
      markOrder(day.line, flags, flagBit('order'))
      lastTime = markDuplicate(day.time, flags, flagBit('duplicate'), lastTime)
    }
    return flags
  }
}
