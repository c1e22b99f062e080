import { findMeasuredUnit, unitLabel } from '#shared/schemas/measured'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { listFlightVersions, readFlight } from './flight'
import { turnOf } from './legs'
import { columnOf, type Flight, type FlightColumn } from './servedData'

/** Points of a profile in the list: enough to choose a layer by, few enough for a page with a dozen flights. */
const mostPoints = 240

/** The flights of a course as the supply is chosen from them: what they measure, how high they went, and their temperature profile. */
export async function listFlights(read: Read, observations: Observations, courseId: string) {
  const versions = await listFlightVersions(read, courseId)
  const newest = new Map<string, number>()
  for (const version of versions) newest.set(version.dataSetId, Math.max(version.versionNo, newest.get(version.dataSetId) ?? 0))
  return versions.map((version) => {
    const flight = readFlight(observations, version)
    const heights = inCanonical(valueColumn(flight, 'height'), flight.rowCount)
    const turnRow = turnOf(heights)
    return {
      versionId: version.versionId, versionNo: version.versionNo, isNewest: newest.get(version.dataSetId) === version.versionNo, title: version.title, heightDatum: flight.heightDatum,
      rows: flight.rowCount, turnRow, topM: heights[turnRow] ?? null,
      columns: flight.columns.filter(column => column.role === 'value').map(column => ({ name: column.name, quantity: column.quantity, unit: column.unit, unitLabel: unitLabel(column.quantity, column.unit) })),
      profile: profileOf(flight, heights, turnRow),
    }
  })
}

const valueColumn = (flight: Flight, quantity: string): FlightColumn | undefined => columnOf({ columns: flight.columns.filter(column => column.role === 'value') }, quantity)

/** Values in the unit in which a quantity is plotted; for the eye only, never for a mark. */
function inCanonical(column: FlightColumn | undefined, count: number): (number | null)[] {
  const unit = column ? findMeasuredUnit(column.quantity, column.unit) : undefined
  return Array.from({ length: count }, (_, row) => {
    const value = column?.values[row]
    return value === undefined || Number.isNaN(value) || !unit ? null : value * unit.factor + unit.offset
  })
}

function profileOf(flight: Flight, heights: readonly (number | null)[], turnRow: number) {
  const temperatures = inCanonical(valueColumn(flight, 'air-temperature'), flight.rowCount)
  const every = Math.max(1, Math.ceil(flight.rowCount / mostPoints))
  return heights.flatMap((heightM, row) => {
    const temperatureC = temperatures[row]
    if (row % every !== 0 && row !== turnRow) return []
    return heightM === null || temperatureC === null || temperatureC === undefined ? [] : [{ heightM, temperatureC, leg: row <= turnRow ? 'up' as const : 'down' as const }]
  })
}
