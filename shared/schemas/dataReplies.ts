import { z } from 'zod'
import { columnRecipe, recipe, recipeDraft, refusedRow, timeRecipe } from './data'

/** What the data routes answer. Instants are ISO 8601 in UTC; digests are hex. */

export const guessReply = z.object({
  columns: z.array(z.object({
    name: z.string(), at: z.number().int(), kind: z.enum(['number', 'text', 'empty']), samples: z.array(z.string()),
    suggestion: columnRecipe.nullable(), isTaken: z.boolean(), isUnitOpen: z.boolean(),
  })),
  times: z.array(z.object({ label: z.string(), time: timeRecipe, hasZone: z.boolean(), zone: z.string().nullable(), isOrderOpen: z.boolean() })),
  /** Complete, and wrong where the file does not say: a person confirms it. */
  recipe: recipeDraft,
  isZoneOpen: z.boolean(),
  head: z.array(z.array(z.string())),
})
export type GuessReply = z.infer<typeof guessReply>

export const uploadReply = z.object({ id: z.string(), name: z.string(), size: z.number().int(), sha256: z.string(), at: z.string(), guess: guessReply })

export const previewBody = z.object({ recipe })
export const previewReply = z.object({
  columns: z.array(z.object({ name: z.string(), quantity: z.string(), unit: z.string(), decimals: z.number().int() })),
  rows: z.array(z.object({ line: z.number().int(), station: z.string(), at: z.string().nullable(), values: z.array(z.string()) })),
  refused: z.array(refusedRow),
  /** Of the first part of the file. */
  rowsRead: z.number().int(), rowsRefused: z.number().int(),
})
export type PreviewReply = z.infer<typeof previewReply>

export const importBody = z.object({
  recipe,
  /** A data set of the department is open to every course; a technician may make one. */
  forDepartment: z.boolean().default(false),
})

export const jobReply = z.object({
  id: z.string(),
  state: z.enum(['waiting', 'running', 'done', 'failed', 'cancelled']),
  rows: z.number().int(),
  /** From 0 to 1 of the file's bytes; null while waiting. */
  fraction: z.number().nullable(),
  secondsLeft: z.number().int().nullable(),
  dataSets: z.array(z.object({ id: z.string(), versionId: z.string(), title: z.string(), rowsTaken: z.number().int(), rowsRefused: z.number().int() })),
  problem: z.object({ code: z.string(), title: z.string(), detail: z.string(), first: z.array(refusedRow) }).nullable(),
})
export type JobReply = z.infer<typeof jobReply>

export const dataSetLine = z.object({
  id: z.string(), title: z.string(), kind: z.enum(['station', 'flight']), isDepartmentWide: z.boolean(),
  versionId: z.string(), versionNo: z.number().int(), rows: z.number().int(), refused: z.number().int(),
  firstAt: z.string().nullable(), lastAt: z.string().nullable(), madeAt: z.string(), quantities: z.array(z.string()),
})
export type DataSetLine = z.infer<typeof dataSetLine>

export const versionFacts = z.object({
  id: z.string(), no: z.number().int(), cause: z.string(), reason: z.string(), madeAt: z.string(), madeBy: z.string(), importer: z.string(),
  rowsRead: z.number().int(), rowsTaken: z.number().int(), rowsRefused: z.number().int(), firstAt: z.string().nullable(), lastAt: z.string().nullable(),
  rootSha256: z.string(), stepMs: z.number().nullable(), heightDatum: z.string(), station: z.string(), zone: z.string(), stampMeans: z.string(), doubledRows: z.number().int(),
  columns: z.array(z.object({ no: z.number().int(), name: z.string(), quantity: z.string(), unit: z.string(), unitLabel: z.string(), decimals: z.number().int(), heightM: z.number().nullable(), role: z.enum(['value', 'quality']) })),
  sources: z.array(z.object({ sha256: z.string(), size: z.number().int(), name: z.string() })),
})
export type VersionFacts = z.infer<typeof versionFacts>

export const dataSetReply = z.object({
  id: z.string(), title: z.string(), kind: z.enum(['station', 'flight']), isDepartmentWide: z.boolean(),
  /** Newest first. */
  versions: z.array(versionFacts),
})

export const flagRule = z.enum(['range', 'step', 'order', 'duplicate'])

/** A window of a record as a plot of some width needs it: instants in order, and a value or null of each column at each. */
export const seriesReply = z.object({
  fromMs: z.number(), toMs: z.number(),
  /** True where every row of the window is there; false where buckets keep their first, last, least and greatest. */
  isWhole: z.boolean(),
  /** Rows further apart than this are not joined by a line. */
  gapMs: z.number(),
  t: z.array(z.number()),
  columns: z.array(z.object({ no: z.number().int(), v: z.array(z.number().nullable()) })),
  flagged: z.array(z.object({ fromMs: z.number(), toMs: z.number(), rule: flagRule, no: z.number().int(), rows: z.number().int() })),
})
export type SeriesReply = z.infer<typeof seriesReply>

export const rowsReply = z.object({
  rowCount: z.number().int(), offset: z.number().int(),
  rows: z.array(z.object({ line: z.number().int(), at: z.string().nullable(), cells: z.array(z.object({ text: z.string(), flags: z.array(z.string()) })) })),
})
export type RowsReply = z.infer<typeof rowsReply>

export const profileReply = z.object({
  rowCount: z.number().int(),
  /** Column whose values stand upward: height, or pressure where there is none. */
  verticalNo: z.number().int(),
  time: z.array(z.number().nullable()),
  columns: z.array(z.object({ no: z.number().int(), values: z.array(z.number().nullable()) })),
})
export type ProfileReply = z.infer<typeof profileReply>

export const refusedReply = z.object({ total: z.number().int(), offset: z.number().int(), rows: z.array(refusedRow) })

export const pageQuery = z.object({ offset: z.coerce.number().int().min(0).max(1e9).default(0), limit: z.coerce.number().int().min(1).max(500).default(50) })

export const seriesQuery = z.object({
  /** Numbers of columns: `0,2,3`. */
  columns: z.string().regex(/^\d{1,3}(,\d{1,3}){0,11}$/).transform(text => text.split(',').map(Number)),
  fromMs: z.coerce.number().optional(), toMs: z.coerce.number().optional(),
  buckets: z.coerce.number().int().min(10).max(4000).default(1000),
})

/** What a person says about a file's layout; the rest is guessed anew. A tab and a blank are written as words, so that an address can carry them. */
export const layoutQuery = z.object({
  delimiter: z.enum([',', ';', 'tab', '|', 'blank']).transform(word => word === 'tab' ? '\t' as const : word === 'blank' ? ' ' as const : word).optional(),
  decimal: z.enum(['.', ',']).optional(),
  skipLines: z.coerce.number().int().min(0).max(1000).optional(),
  headerRows: z.coerce.number().int().min(0).max(20).optional(),
})
export type SaidLayout = z.output<typeof layoutQuery>
