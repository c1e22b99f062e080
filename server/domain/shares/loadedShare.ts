import type { Convention, ReadAnswer } from '#shared/marking/types'
import type { LabBody, LateRule, SupplyItem } from '#shared/schemas/lab'

/** One column as it was served: the digits are the evidence, the numbers are those digits. */
export interface ServedColumn {
  /** As in the data set and in the CSV's head. */
  name: string
  /** What the column measures: `air_temperature`, `height` … */
  quantity: string
  unit: string
  decimals: number | null
  /** Not shown to students: what they read on an instrument of their own is compared with it. */
  isWithheld?: true
  /** As printed; an empty text is a missing value. */
  texts: readonly string[]
  /** The printed digits as numbers in `unit`; NaN-free: null is a missing value. */
  values: readonly (number | null)[]
}

/** The rows that were served, whole flight, and which of them the steps use. */
export interface ServedRows {
  columns: readonly ServedColumn[]
  /** True for the rows of the leg and of the closed layer that have every value a step needs. */
  use: readonly boolean[]
  /** ISO 8601 with Z; empty where the flight has no clock. */
  times: readonly string[]
  count: number
}

/** What a share was drawn from: frozen in the draw, with the printed words and the digest of the bytes that were served. */
export interface DrawnItem extends SupplyItem {
  no: number
  versionNo: number
  dataSetTitle: string
  /** Hex. */
  rootSha256: string
  heightDatum: string
  /** The ask of each step with this share's bounds, rows and columns, by step key. */
  asks: Readonly<Record<string, string>>
  /** The comment lines at the head of the file that is served. */
  head: readonly string[]
  /** Hex. */
  servedSha256: string
}

export interface LoadedPosting {
  id: string
  sectionId: string
  state: 'planned' | 'posted' | 'withdrawn'
  zone: string
  opensAt: number
  dueAt: number
  lateRule: LateRule
  attempts: number
  keep: 'last' | 'best'
  feedback: 'at_once' | 'after_release'
  releasedAt: number | null
  version: number
}

/** Everything that a step of a share is asked and judged from. */
export interface LoadedShare {
  share: { id: string, labId: string, holderId: string, redraw: number, ordinal: number, item: DrawnItem, servedSha256: string }
  lab: { id: string, courseId: string, state: 'draft' | 'posted' | 'withdrawn' | 'archived', version: number }
  revision: { id: string, no: number, body: LabBody }
  /** The posting of the section in which the share's holder is now; null where the lab is not posted to it. */
  posting: LoadedPosting | null
  /** The convention whose constants the ask printed: it stays with the draw. */
  convention: Convention
  conventionRevisionId: string
  dataSetVersionId: string
  rows: ServedRows
  /** The asks of the steps as this share's student reads them, by step key. */
  asks: Readonly<Record<string, string>>
  csv: string
}

/** The student's readings of earlier steps in this submission, by step key. */
export type EarlierReadings = Readonly<Record<string, ReadAnswer>>
