import type { Observations } from './chunks'
import { decodeFlags, decodeMonth, decodeValues, type DayValues } from './form'
import { readRoot } from './root'

/** One day of a record: three look-ups, whatever the record's length. Null where the record has no such day. */
export function readDay(observations: Observations, rootSha256: Buffer, day: string): (DayValues & { flags: Uint8Array[] }) | null {
  const root = readRoot(observations, rootSha256)
  const month = root.months.find(entry => entry.month === (day === 'flight' ? 'flight' : day.slice(0, 7)))
  if (!month) return null
  const entry = decodeMonth(observations.getChunk(Buffer.from(month.sha256, 'hex')).bytes).days.find(found => found.day === day)
  if (!entry) return null
  return {
    ...decodeValues(observations.getChunk(Buffer.from(entry.values, 'hex')).bytes),
    flags: decodeFlags(observations.getChunk(Buffer.from(entry.flags, 'hex')).bytes),
  }
}
