import { refuse } from '#shared/errors'
import type { Convention } from '#shared/marking/types'
import type { LabBody, SupplyItem } from '#shared/schemas/lab'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { listFlightVersions, readFlight, type FlightRow } from '../shares/flight'
import { serveFlight, type Flight, type ServedFlight } from '../shares/servedData'
import { serveShare, type ServedShare } from '../shares/serveShare'
import { conventionOfLab } from './conventions'
import { latestRevision, type StoredRevision } from './latestRevision'

/** A lab with its supply laid out in its canonical order and its flights at hand. */
export interface PreparedLab {
  lab: { id: string, courseId: string, title: string, state: 'draft' | 'posted' | 'withdrawn' | 'archived', version: number }
  zone: string
  revision: StoredRevision
  convention: Convention
  conventionRevisionId: string
  /** Flights that the course may use, by version. */
  flights: ReadonlyMap<string, FlightRow>
  items: readonly SupplyItem[]
  flightOf: (versionId: string) => { flight: Flight, served: ServedFlight }
  serve: (item: SupplyItem) => ServedShare
}

/** The order in which a supply is numbered, whatever the order in which it was typed; the same item twice is one. */
export function canonicalSupply(supply: readonly SupplyItem[]): SupplyItem[] {
  const keyOf = (item: SupplyItem) => JSON.stringify([item.versionId, item.leg, item.lowM, item.highM])
  const compare = (a: SupplyItem, b: SupplyItem) => a.versionId < b.versionId ? -1 : a.versionId > b.versionId ? 1 : a.leg < b.leg ? -1 : a.leg > b.leg ? 1 : a.lowM - b.lowM || a.highM - b.highM
  return [...new Map(supply.map(item => [keyOf(item), item])).values()].sort(compare)
}

/** Reads a lab as it stands, with its flights as they are asked for. `body` puts an author's unsaved text in place of the stored one. */
export async function prepareLab(read: Read, observations: Observations, labId: string, body?: LabBody): Promise<PreparedLab> {
  const lab = await read.selectFrom('lab').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
    .select(['lab.id', 'lab.course_id as courseId', 'lab.title', 'lab.state', 'lab.version', 'term.zone']).where('lab.id', '=', labId).executeTakeFirst()
  if (!lab) return refuse('not_found')
  const stored = await latestRevision(read, labId)
  const revision = body ? { ...stored, body } : stored
  const { id: conventionRevisionId, convention } = await conventionOfLab(read, lab)
  const flights = new Map((await listFlightVersions(read, lab.courseId)).map(row => [row.versionId, row]))
  const opened = new Map<string, { flight: Flight, served: ServedFlight }>()
  const flightOf = (versionId: string) => {
    const known = opened.get(versionId)
    if (known) return known
    const row = flights.get(versionId) ?? refuse('binding_invalid', { step: 'supply', reason: 'A flight of the supply is not one of this course.' })
    const flight = readFlight(observations, row)
    const both = { flight, served: serveFlight(flight, revision.body) }
    opened.set(versionId, both)
    return both
  }
  return {
    lab: { id: lab.id, courseId: lab.courseId, title: lab.title, state: lab.state, version: lab.version }, zone: lab.zone,
    revision, convention, conventionRevisionId, flights, items: canonicalSupply(revision.body.supply), flightOf,
    serve: (item) => {
      const { flight, served } = flightOf(item.versionId)
      return serveShare({ body: revision.body, convention }, flight, served, item)
    },
  }
}
