import type { Convention } from '#shared/marking/types'
import { askedSteps } from '#shared/schemas/askedSteps'
import type { LabBody, SupplyItem } from '#shared/schemas/lab'
import { formatUnit } from '#shared/units/formatQuantity'
import { asksOf, constantWords, datumWords } from '../labs/askOf'
import { legWords } from './legs'
import type { ServedRows } from './loadedShare'
import { csvOf, serveRows, shownColumns, type Flight, type ServedFlight } from './servedData'

/** What a lab's shares are served with: the same for every share of it. */
export interface Serving { body: LabBody, convention: Convention }

export interface ServedShare {
  rows: ServedRows
  /** By step key, with this share's bounds, rows and columns. */
  asks: Record<string, string>
  /** Comment lines of the file. */
  head: string[]
  csv: string
}

/** Everything that one item of the supply shows: made from flight, revision and convention alone, so that the same bytes come out at any later time. */
export function serveShare(serving: Serving, flight: Flight, served: ServedFlight, item: Pick<SupplyItem, 'leg' | 'lowM' | 'highM'>): ServedShare {
  const rows = serveRows(served, item)
  const asks = asksOf(serving.body, serving.convention, { item, heightDatum: flight.heightDatum, rows })
  const head = headOf(serving, flight, item, rows, asks)
  return { rows, asks, head, csv: csvOf(head, rows) }
}

function headOf({ body, convention }: Serving, flight: Flight, item: Pick<SupplyItem, 'leg' | 'lowM' | 'highM'>, rows: ServedRows, asks: Readonly<Record<string, string>>): string[] {
  const used = rows.use.filter(Boolean).length
  return [
    `Lab: ${body.title}`,
    `Data: ${flight.title}, version ${flight.versionNo}, root SHA-256 ${flight.rootSha256}`,
    `Your share: ${item.lowM} m to ${item.highM} m ${datumWords(flight.heightDatum)}, both bounds included; ${legWords[item.leg]}`,
    `Use the ${used} of ${rows.count} rows with use = 1. Rows with use = 0 lie outside the layer or the leg, or a value that a step needs is missing or flagged. An empty cell is a missing value.`,
    ...askedSteps(body).map((step, at) => `Step ${at + 1}, ${step.title}: ${asks[step.key] ?? ''}`),
    `Constants (${convention.title}): ${Object.entries(convention.constants).flatMap(([name, value]) => constantWords(name, value) ?? []).join('; ')}`,
    `Columns: ${shownColumns(rows).map(column => `${column.name} in ${formatUnit(column.unit)}`).join('; ')}`,
    'Times are UTC. The worked value is computed from the digits in this file.',
    '',
  ]
}
