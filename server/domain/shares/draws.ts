import { createHash } from 'node:crypto'
import { z } from 'zod'
import { drawAlgorithm, drawOrdinals } from '#shared/marking/draw'
import { leg } from '#shared/schemas/labParts'
import type { Read, Trx } from '../../db/writer'
import { newId } from '../ids'
import { digestOf } from '../ledger/appendEntry'
import type { DrawnItem } from './loadedShare'

/** What a draw keeps of its supply: enough to serve and to judge every share again, whatever is renamed later. */
export const drawnSupply = z.object({
  conventionRevisionId: z.string(),
  items: z.array(z.object({
    no: z.number().int().min(0), versionId: z.string(), versionNo: z.number().int(), leg, lowM: z.number(), highM: z.number(),
    dataSetTitle: z.string(), rootSha256: z.string().length(64), heightDatum: z.string(), asks: z.record(z.string(), z.string()), head: z.array(z.string()), servedSha256: z.string().length(64),
  })).min(1),
})
export interface DrawnSupply { conventionRevisionId: string, items: readonly DrawnItem[] }

/** Writes a draw. It freezes the lab's revision; shares follow, one ordinal after another. */
export async function insertDraw(trx: Trx, draw: { labId: string, revisionId: string, seed: Buffer, supply: DrawnSupply }, now: number): Promise<string> {
  const id = newId(now)
  await trx.insertInto('draw').values({
    id, lab_id: draw.labId, lab_revision_id: draw.revisionId, algorithm: drawAlgorithm, seed: draw.seed, supply_json: JSON.stringify(draw.supply), supply_sha256: digestOf(draw.supply), made_at: now,
  }).execute()
  return id
}

export interface StoredDraw { id: string, labId: string, revisionId: string, seed: Buffer, supply: DrawnSupply }

/** The draw by which a lab's shares are given now: the last one made. */
export async function currentDraw(db: Read | Trx, labId: string): Promise<StoredDraw | null> {
  const row = await db.selectFrom('draw').select('id').where('lab_id', '=', labId).orderBy('made_at', 'desc').orderBy('id', 'desc').limit(1).executeTakeFirst()
  return row ? getDraw(db, row.id) : null
}

/** Draws never change, so the last few stay read. */
const readDraws = new Map<string, StoredDraw>()
const mostRead = 40

export async function getDraw(db: Read | Trx, drawId: string): Promise<StoredDraw> {
  const known = readDraws.get(drawId)
  if (known) return known
  const row = await db.selectFrom('draw').selectAll().where('id', '=', drawId).executeTakeFirstOrThrow()
  const draw = { id: row.id, labId: row.lab_id, revisionId: row.lab_revision_id, seed: row.seed, supply: drawnSupply.parse(JSON.parse(row.supply_json)) }
  // A row of a unit of work that is still open may be undone; one that was read back is there for good.
  if (!db.isTransaction) {
    if (readDraws.size >= mostRead) readDraws.delete(readDraws.keys().next().value ?? '')
    readDraws.set(drawId, draw)
  }
  return draw
}

/** Which item of the supply an ordinal gets. */
export function itemOf(draw: StoredDraw, ordinal: number): DrawnItem {
  const no = drawOrdinals(draw.seed.toString('hex'), draw.supply.items.length, ordinal + 1)[ordinal]
  const item = no === undefined ? undefined : draw.supply.items[no]
  if (!item) throw new Error(`Draw ${draw.id} has no item for ordinal ${ordinal}.`)
  return item
}

/** What a share's digest covers: the same again from seed, supply and ordinal. */
export const shareDigest = (draw: StoredDraw, ordinal: number, item: DrawnItem): Buffer => digestOf({ draw: draw.id, algorithm: drawAlgorithm, ordinal, supplyNo: item.no, versionId: item.versionId, leg: item.leg, lowM: item.lowM, highM: item.highM, served: item.servedSha256 })

/** The order in which members who come together get their ordinals: by a key drawn for each enrolment, not by name, e-mail or roster. */
export function inDrawnOrder(seed: Buffer, membershipIds: readonly string[]): string[] {
  const keyOf = (id: string) => createHash('sha256').update(seed).update(id).digest('hex')
  return membershipIds.map(id => ({ id, key: keyOf(id) })).sort((a, b) => a.key < b.key ? -1 : 1).map(entry => entry.id)
}

async function nextOrdinal(trx: Trx, drawId: string): Promise<number> {
  const last = await trx.selectFrom('share').select('ordinal').where('draw_id', '=', drawId).orderBy('ordinal', 'desc').limit(1).executeTakeFirst()
  return last ? last.ordinal + 1 : 0
}

async function insertShare(trx: Trx, draw: StoredDraw, share: { holderId: string, ordinal: number, redraw: number, reasonDigest: Buffer | null }, now: number): Promise<string> {
  const item = itemOf(draw, share.ordinal)
  const id = newId(now)
  await trx.insertInto('share').values({
    id, lab_id: draw.labId, holder_id: share.holderId, redraw: share.redraw, draw_id: draw.id, ordinal: share.ordinal, supply_no: item.no, data_set_version_id: item.versionId,
    inputs_json: JSON.stringify({ leg: item.leg, lowM: item.lowM, highM: item.highM }), served_sha256: Buffer.from(item.servedSha256, 'hex'), digest: shareDigest(draw, share.ordinal, item), reason_digest: share.reasonDigest?.toString('hex') ?? null,
  }).execute()
  return id
}

/** Gives a share to each of these members who has none in the lab yet. Nobody who has one is moved. */
export async function giveShares(trx: Trx, draw: StoredDraw, membershipIds: readonly string[], now: number): Promise<number> {
  if (membershipIds.length === 0) return 0
  const held = await trx.selectFrom('holder_member').select('membership_id').where('lab_id', '=', draw.labId).execute()
  const has = new Set(held.map(row => row.membership_id))
  let ordinal = await nextOrdinal(trx, draw.id)
  let given = 0
  for (const membershipId of inDrawnOrder(draw.seed, membershipIds.filter(id => !has.has(id)))) {
    const holderId = newId(now)
    await trx.insertInto('holder').values({ id: holderId, lab_id: draw.labId, kind: 'one' }).execute()
    await trx.insertInto('holder_member').values({ holder_id: holderId, membership_id: membershipId, lab_id: draw.labId }).execute()
    await insertShare(trx, draw, { holderId, ordinal, redraw: 0, reasonDigest: null }, now)
    ordinal++
    given++
  }
  return given
}

/** Gives a holder another share: the next ordinal that gets another item than the present one. */
export async function giveAnother(trx: Trx, draw: StoredDraw, holderId: string, reasonDigest: Buffer, now: number): Promise<{ shareId: string, ordinal: number, before: string }> {
  const present = await trx.selectFrom('share').select(['id', 'redraw', 'draw_id', 'supply_no']).where('holder_id', '=', holderId).orderBy('redraw', 'desc').limit(1).executeTakeFirstOrThrow()
  let ordinal = await nextOrdinal(trx, draw.id)
  const isSame = () => present.draw_id === draw.id && itemOf(draw, ordinal).no === present.supply_no
  if (draw.supply.items.length > 1) while (isSame()) ordinal++
  const shareId = await insertShare(trx, draw, { holderId, ordinal, redraw: present.redraw + 1, reasonDigest }, now)
  return { shareId, ordinal, before: present.id }
}
