import { refuse } from '#shared/errors'
import { labBody, lateRule, type LabBody } from '#shared/schemas/lab'
import { keptQuery } from '../../db/keptQuery'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { getConvention } from '../labs/conventions'
import { getDraw, itemOf } from './draws'
import { readFlight } from './flight'
import type { DrawnItem, LoadedPosting, LoadedShare, ServedRows } from './loadedShare'
import { csvOf, serveFlight, serveRows, type ServedFlight } from './servedData'

/** Served rows never change: what was served last stays at hand, since a class works on a few flights at the same time. */
const servedFlights = new Map<string, ServedFlight>()
const served = new Map<string, { rows: ServedRows, csv: string }>()
const bodies = new Map<string, LabBody>()
const mostBodies = 24
const mostFlights = 24
const mostServed = 64

function keep<T>(known: Map<string, T>, most: number, key: string, make: () => T): T {
  const found = known.get(key) ?? make()
  known.delete(key)
  known.set(key, found)
  if (known.size > most) known.delete(known.keys().next().value ?? '')
  return found
}

const shareWithRevision = keptQuery((db, given: { shareId: string }) => db.selectFrom('share').innerJoin('lab', 'lab.id', 'share.lab_id').innerJoin('draw', 'draw.id', 'share.draw_id').innerJoin('lab_revision', 'lab_revision.id', 'draw.lab_revision_id')
  .select(['share.id', 'share.lab_id as labId', 'share.holder_id as holderId', 'share.redraw', 'share.ordinal', 'share.draw_id as drawId', 'share.served_sha256 as servedSha256',
    'lab.course_id as courseId', 'lab.state', 'lab.version', 'lab_revision.id as revisionId', 'lab_revision.no as revisionNo', 'lab_revision.body_json as body'])
  .where('share.id', '=', given.shareId))

/** Everything that a share's steps are asked and judged from, as it was drawn and served. */
export async function loadShare(read: Read, observations: Observations, shareId: string): Promise<LoadedShare> {
  const [row] = await shareWithRevision(read, { shareId })
  if (!row) return refuse('no_share')
  const draw = await getDraw(read, row.drawId)
  const item = itemOf(draw, row.ordinal)
  // a draw froze the revision: it is the same whenever it is read
  const body = keep(bodies, mostBodies, row.revisionId, () => labBody.parse(JSON.parse(row.body)))
  const { rows, csv } = keep(served, mostServed, `${row.drawId}:${item.no}`, () => serveDrawn(observations, row.revisionId, body, item))
  return {
    share: { id: row.id, labId: row.labId, holderId: row.holderId, redraw: row.redraw, ordinal: row.ordinal, item, servedSha256: row.servedSha256.toString('hex') },
    lab: { id: row.labId, courseId: row.courseId, state: row.state, version: row.version },
    revision: { id: row.revisionId, no: row.revisionNo, body },
    posting: await postingOf(read, row.labId, row.holderId),
    convention: await getConvention(read, draw.supply.conventionRevisionId), conventionRevisionId: draw.supply.conventionRevisionId,
    dataSetVersionId: item.versionId, rows, asks: item.asks, csv,
  }
}

/** The rows and the file of a drawn item, from its frozen words and the observations that its root proves. */
export function serveDrawn(observations: Observations, revisionId: string, body: LabBody, item: DrawnItem): { rows: ServedRows, csv: string } {
  const flight = keep(servedFlights, mostFlights, `${revisionId}:${item.rootSha256}`, () =>
    serveFlight(readFlight(observations, { versionId: item.versionId, versionNo: item.versionNo, title: item.dataSetTitle, rootSha256: Buffer.from(item.rootSha256, 'hex') }), body))
  const rows = serveRows(flight, item)
  return { rows, csv: csvOf(item.head, rows) }
}

const postingOfHolder = keptQuery((db, given: { labId: string, holderId: string }) => db.selectFrom('holder_member').innerJoin('membership', 'membership.id', 'holder_member.membership_id')
  .innerJoin('posting', join => join.onRef('posting.section_id', '=', 'membership.section_id').on('posting.lab_id', '=', given.labId))
  .selectAll('posting').where('holder_member.holder_id', '=', given.holderId).orderBy('posting.due_at', 'desc').limit(1))

/** The posting of the section in which the share's holder is now: who moves keeps the share and takes the new section's dates. */
async function postingOf(read: Read, labId: string, holderId: string): Promise<LoadedPosting | null> {
  const [row] = await postingOfHolder(read, { labId, holderId })
  return row
    ? {
        id: row.id, sectionId: row.section_id, state: row.state, zone: row.zone, opensAt: row.opens_at, dueAt: row.due_at, lateRule: lateRule.parse(JSON.parse(row.late_rule_json)),
        attempts: row.attempts, keep: row.keep, feedback: row.feedback, releasedAt: row.released_at, version: row.version,
      }
    : null
}
