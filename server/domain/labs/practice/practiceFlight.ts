import type { PracticeReadings } from '#shared/schemas/labParts'
import { findMeasuredQuantity } from '#shared/schemas/measured'
import type { Flight, FlightColumn } from '../../shares/servedData'

/** The readings that come with a lab as a flight, so that its steps are asked and answered on them as on anybody's share. */
export function practiceFlight(practice: PracticeReadings): Flight {
  return {
    versionId: 'practice', versionNo: 1, title: 'Readings for the practice', rootSha256: '', heightDatum: 'ground',
    time: practice.rows.map(() => Number.NaN), rowCount: practice.rows.length, columns: practice.columns.map((_, at) => columnAt(practice, at)),
  }
}

function columnAt({ columns, rows }: PracticeReadings, at: number): FlightColumn {
  const quantity = columns[at]?.quantity ?? ''
  const cells = rows.map(row => row[at] ?? '')
  return {
    name: findMeasuredQuantity(quantity)?.label ?? quantity, quantity, unit: columns[at]?.unit ?? '', role: 'value',
    decimals: Math.max(0, ...cells.map(cell => cell.split('.')[1]?.length ?? 0)), values: cells.map(cell => cell === '' ? Number.NaN : Number(cell)),
  }
}
