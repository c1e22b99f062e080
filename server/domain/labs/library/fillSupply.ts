import { checkBand } from '#shared/marking/proof'
import { proveStep, type ProvedStep } from '#shared/marking/proofOfStep'
import type { Convention } from '#shared/marking/types'
import { askedSteps, isNumber } from '#shared/schemas/askedSteps'
import type { LabBody, SupplyItem } from '#shared/schemas/lab'
import type { SupplyConditions } from '#shared/schemas/labParts'
import { findMeasuredUnit } from '#shared/schemas/measured'
import type { Read } from '../../../db/writer'
import type { Observations } from '../../../observations/chunks'
import { listFlightVersions, readFlight, type FlightRow } from '../../shares/flight'
import type { ServedRows } from '../../shares/loadedShare'
import { askedQuestion } from '../../shares/questionFor'
import { columnOf, neededQuantities, serveFlight, serveRows, type Flight } from '../../shares/servedData'
import { edgeRow } from '../rowsOfLayer'

/** Flights that are looked at, the newest first: more than a course flies in two terms. */
const mostFlights = 40

/** The newest version of each flight that a course may use, the one flown last first. */
export async function newestFlights(read: Read, observations: Observations, courseId: string): Promise<Flight[]> {
  const newest = new Map<string, FlightRow>()
  for (const row of await listFlightVersions(read, courseId)) if ((newest.get(row.dataSetId)?.versionNo ?? 0) < row.versionNo) newest.set(row.dataSetId, row)
  const flights = [...newest.values()].sort((a, b) => b.madeAt - a.madeAt).slice(0, mostFlights).map(row => readFlight(observations, row))
  return flights.sort((a, b) => flownAt(b) - flownAt(a))
}

function flownAt(flight: Flight): number {
  for (let row = 0; row < flight.rowCount; row++) {
    const at = flight.time[row]
    if (at !== undefined && !Number.isNaN(at)) return at
  }
  return 0
}

/** Quantities that a lab's shares need and that this flight has no column of. */
export function missingColumns(body: LabBody, flight: Flight): string[] {
  const values = { columns: flight.columns.filter(column => column.role === 'value') }
  const asked = body.conditions?.changes.map(change => change.column) ?? []
  return [...new Set(['height', ...neededQuantities(body), ...asked])].filter(quantity => !columnOf(values, quantity))
}

/** The layers of a flight that meet a lab's conditions, with the rows that a share of them would use. */
export function layersThatMeet(body: LabBody, flight: Flight): { item: SupplyItem, rows: ServedRows }[] {
  const { conditions } = body
  if (!conditions || missingColumns(body, flight).length > 0) return []
  const served = serveFlight(flight, body)
  return conditions.layers.flatMap(({ lowM, highM }) => {
    const item = { versionId: flight.versionId, leg: conditions.leg, lowM, highM }
    const rows = serveRows(served, item)
    return meets(conditions, rows) ? [{ item, rows }] : []
  })
}

/**
 * What keeps a layer from being a share: a step that cannot be asked on it, whose accepted range would be too wide, on which an accepted way would lose
 * or a slip would win. Empty where nothing does. What the proof run says of shares side by side is not in it.
 */
export function faultsOf(body: LabBody, convention: Convention, { item, rows }: { item: SupplyItem, rows: ServedRows }): string[] {
  const ground = { rows, convention, share: { item }, revision: { body } }
  return askedSteps(body).flatMap((step) => {
    const asked = askedQuestion(ground, step.key, {})
    if (!('question' in asked)) return [`${step.key}: ${asked.reason}`]
    if (!isNumber(step)) return []
    const { reasons } = checkBand(asked.question)
    return [...reasons, ...reasons.length > 0 ? [] : losses(proveStep(asked.question))].map(reason => `${step.key}: ${reason}`)
  })
}

const losses = ({ ways, slips }: ProvedStep): string[] => [
  ...ways.filter(way => !way.isInside).map(way => `${way.typed} by “${way.label}” would lose.`),
  ...slips.filter(slip => !slip.isOutside && !slip.isQuiet).map(slip => `${slip.typed} would win, which is the slip “${slip.label}”.`),
]

/**
 * Shares for a lab, from the first of these flights on, until there are as many as it wants: layers that meet its conditions and on which every
 * step can be asked. Other requests get their turn between two layers.
 */
export async function fillSupply(body: LabBody, convention: Convention, flights: readonly Flight[]): Promise<SupplyItem[]> {
  const found: SupplyItem[] = []
  for (const flight of flights) {
    for (const layer of layersThatMeet(body, flight)) {
      if (found.length === body.conditions?.atMost) return found
      if (faultsOf(body, convention, layer).length === 0) found.push(layer.item)
      await new Promise(setImmediate)
    }
  }
  return found
}

function meets(conditions: SupplyConditions, rows: ServedRows): boolean {
  if (rows.use.filter(Boolean).length < conditions.rows) return false
  return conditions.changes.every(({ column, least, most }) => {
    const change = changeOf(rows, column)
    return change !== null && (least === undefined || change >= least) && (most === undefined || change <= most)
  })
}

/** From the lowest to the highest row in use, in the unit in which the column is plotted. */
function changeOf(rows: ServedRows, quantity: string): number | null {
  const column = columnOf(rows, quantity)
  const unit = column && findMeasuredUnit(quantity, column.unit)
  const [low, high] = [edgeRow(rows, 'lowest'), edgeRow(rows, 'highest')].map(row => row === null ? null : column?.values[row] ?? null)
  return unit && typeof low === 'number' && typeof high === 'number' ? (high - low) * unit.factor : null
}
