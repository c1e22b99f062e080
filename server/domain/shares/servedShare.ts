import { unitLabel } from '#shared/schemas/measured'
import type { SupplyItem } from '#shared/schemas/lab'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { loadShare } from './loadShare'
import type { ServedRows } from './loadedShare'
import { shownColumns } from './servedData'

/** Served rows as JSON for plot and table: the measured columns with their digits, and nothing that was computed from them. */
export function servedJson(rows: ServedRows, item: Pick<SupplyItem, 'leg' | 'lowM' | 'highM'>, heightDatum: string) {
  return {
    columns: shownColumns(rows).map(({ name, quantity, unit, texts }) => ({ name, quantity, unit, unitLabel: unitLabel(quantity, unit), texts: [...texts] })),
    times: rows.times.some(time => time !== '') ? [...rows.times] : [], use: [...rows.use], count: rows.count, heightDatum, lowM: item.lowM, highM: item.highM, leg: item.leg,
  }
}

export async function servedData(read: Read, observations: Observations, shareId: string) {
  const { rows, share } = await loadShare(read, observations, shareId)
  return servedJson(rows, share.item, share.item.heightDatum)
}
