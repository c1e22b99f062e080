import type { StationReading } from './weather'

/** A reading as it stands in a file: some values may be absent. */
export type FiledReading = { [K in keyof StationReading]: K extends 'at' ? number : number | null }

/** What goes wrong on roofs. Positions are row numbers of the sound record, from 0. */
export type Fault =
  | { kind: 'spike', row: number, column: Exclude<keyof StationReading, 'at'>, by: number }
  | { kind: 'gap', fromRow: number, toRow: number }
  | { kind: 'stuck', fromRow: number, toRow: number, columns: readonly Exclude<keyof StationReading, 'at'>[] }
  | { kind: 'missing', fromRow: number, toRow: number, column: Exclude<keyof StationReading, 'at'> }
  /** A pyranometer without sun reads a few watts below zero, more under a clear sky. */
  | { kind: 'night offset', wm2: number }

/** Applies faults to a sound record; the order of the list does not matter to what they touch. */
export function withFaults(readings: readonly StationReading[], faults: readonly Fault[]): FiledReading[] {
  const filed: FiledReading[] = readings.map(reading => ({ ...reading }))
  const lost = new Set<number>()
  for (const fault of faults) {
    if (fault.kind === 'spike') {
      const at = filed[fault.row]!
      at[fault.column] = (at[fault.column] ?? 0) + fault.by
    }
    else if (fault.kind === 'gap') for (let row = fault.fromRow; row <= fault.toRow; row++) lost.add(row)
    else if (fault.kind === 'missing') for (let row = fault.fromRow; row <= fault.toRow; row++) filed[row]![fault.column] = null
    else if (fault.kind === 'stuck') {
      for (let row = fault.fromRow; row <= fault.toRow; row++) for (const column of fault.columns) filed[row]![column] = filed[fault.fromRow]![column]
    }
    else for (const reading of filed) if (reading.globalWm2 !== null && reading.globalWm2 < 1) reading.globalWm2 = fault.wm2 + 0.2 * (reading.humidityPct ?? 80) / 100
  }
  return filed.filter((_reading, row) => !lost.has(row))
}
