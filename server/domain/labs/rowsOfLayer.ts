import type { ServedRows } from '../shares/loadedShare'
import { columnOf } from '../shares/servedData'

/** The row that stands lowest or highest among those in use; the earlier one where two stand equally. */
export function edgeRow(rows: ServedRows, read: 'lowest' | 'highest'): number | null {
  const heights = columnOf(rows, 'height')?.values
  let found: { row: number, height: number } | null = null
  for (let row = 0; row < rows.count; row++) {
    const height = heights?.[row]
    if (height === undefined || height === null || rows.use[row] !== true) continue
    if (found === null || (read === 'lowest' ? height < found.height : height > found.height)) found = { row, height }
  }
  return found?.row ?? null
}

/** Row `no` of `of` rows of a table: spread evenly over the rows in use, from the lowest to the highest. Null where there are fewer. */
export function tableRow(rows: ServedRows, no: number, of: number): number | null {
  const heights = columnOf(rows, 'height')?.values
  const used = rows.use.flatMap((isUsed, row) => isUsed ? [{ row, height: heights?.[row] ?? 0 }] : []).sort((a, b) => a.height - b.height || a.row - b.row)
  if (used.length < of || no > of) return null
  const at = of === 1 ? 0 : Math.round((no - 1) * (used.length - 1) / (of - 1))
  return used[at]?.row ?? null
}
