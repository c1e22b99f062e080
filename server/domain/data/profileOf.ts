import { refuse } from '#shared/errors'
import type { ProfileReply } from '#shared/schemas/dataReplies'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { readVersion } from '../../observations/readVersion'
import { rootOf } from './rootOf'

const orNull = (value: number): number | null => Number.isNaN(value) ? null : value

/** A flight as a profile: every row, with the column that stands upward. */
export async function profileOf(read: Read, observations: Observations, versionId: string): Promise<ProfileReply> {
  const { columns, time, rowCount } = readVersion(observations, await rootOf(read, versionId))
  const vertical = columns.find(column => column.quantity === 'height') ?? columns.find(column => column.quantity === 'pressure')
  if (!vertical) return refuse('no_height_column')
  return { rowCount, verticalNo: vertical.no, time: Array.from(time, orNull), columns: columns.map(column => ({ no: column.no, values: Array.from(column.values, orNull) })) }
}
