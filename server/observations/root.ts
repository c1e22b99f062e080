import canonicalize from 'canonicalize'
import type { Observations, ObservationsWriter } from './chunks'

export interface StoredColumn {
  no: number
  name: string
  quantity: string
  unitUcum: string
  decimals: number
  heightM: number | null
  role: 'value' | 'quality'
}

/** The bits of a flag byte. Later rules take the next bits; a stored bit never changes its meaning. */
export const flagRules = ['range', 'step', 'order', 'duplicate'] as const
export type FlagRule = (typeof flagRules)[number]
export const flagBit = (rule: FlagRule): number => 1 << flagRules.indexOf(rule)
export const flagsOf = (bits: number): FlagRule[] => flagRules.filter(rule => (bits & flagBit(rule)) !== 0)

/** The top of a version's tree: its digest proves every row and flag below it. */
export interface Root {
  form: 1
  kind: 'station' | 'flight'
  columns: readonly StoredColumn[]
  /** Days end with the row at 00:00 where stamps name an interval's end. */
  isInterval: boolean
  /** The most frequent step between rows, in ms; null for fewer than two rows or no clock. */
  stepMs: number | null
  heightDatum: string
  rowCount: number
  firstAt: number | null
  lastAt: number | null
  months: readonly { month: string, sha256: string, rows: number }[]
}

export function putRoot(observations: ObservationsWriter, root: Root): Buffer {
  return observations.putChunk('root', Buffer.from(canonicalize(root) ?? '')).sha256
}

export function readRoot(observations: Observations, sha256: Buffer): Root {
  const { kind, bytes } = observations.getChunk(sha256)
  if (kind !== 'root') throw new Error('Not the root of a version.')
  return JSON.parse(bytes.toString('utf8')) as Root
}
