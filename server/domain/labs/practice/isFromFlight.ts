import type { PracticeReadings } from '#shared/schemas/labParts'
import { columnOf, type ServedFlight } from '../../shares/servedData'

/** So many rows may agree by chance, and such a part of them: heights and temperatures are printed with few digits. */
const byChance = { rows: 3, part: 0.2 }

/** True where the readings of a practice are rows of this flight, whatever digits they are written with. */
export function isFromFlight(practice: PracticeReadings, flight: ServedFlight): boolean {
  const shared = practice.columns.flatMap(({ quantity, unit }, at) => {
    const column = columnOf(flight, quantity)
    return column && column.unit === unit ? [{ at, column }] : []
  })
  if (shared.length < 2) return false
  const known = new Set(Array.from({ length: flight.count }, (_, row) => JSON.stringify(shared.map(({ column }) => column.values[row] ?? null))))
  const same = practice.rows.filter(row => known.has(JSON.stringify(shared.map(({ at }) => row[at] === '' || row[at] === undefined ? null : Number(row[at]))))).length
  return same > byChance.rows && same > byChance.part * practice.rows.length
}
