import { z } from 'zod'
import { stepKey } from './steps'

/** What a lab carries beside its text and steps: what it is for, what it needs, how it is practiced, and what people who go out are told. */

export const leg = z.enum(['up', 'down', 'all'])

export const labKinds = ['station', 'profile', 'parcel', 'first-law', 'moisture', 'instruments', 'surface-layer', 'field-work'] as const
export const labKind = z.enum(labKinds)
export type LabKind = z.infer<typeof labKind>

const sentence = z.string().trim().min(1).max(600)

/** Where people go out. Limits are the department's: one that nobody has set reads "not set: ask". */
export const fieldPlan = z.object({
  hazards: z.array(z.object({ hazard: sentence, caution: sentence })).min(1).max(40),
  /** The go/no-go list: one that is not met stops the work. */
  checks: z.array(z.object({ item: sentence, setBy: sentence, limit: z.string().trim().max(200).default('') })).min(1).max(40),
  inCharge: sentence,
})
export type FieldPlan = z.infer<typeof fieldPlan>

const layer = { lowM: z.number(), highM: z.number() }
const hasDepth = (item: { lowM: number, highM: number }) => item.highM > item.lowM
const flat = { path: ['highM'], message: 'The layer needs a top above its base.' }

/** By which a supply is filled from a course's flights. */
export const supplyConditions = z.object({
  leg,
  layers: z.array(z.object(layer).refine(hasDepth, flat)).min(1).max(60),
  /** Rows in use that a layer must have at least. */
  rows: z.number().int().min(2).max(10_000).default(5),
  /** From the lowest to the highest row in use a column changes by at least and at most so much, in the unit in which it is plotted. */
  changes: z.array(z.object({ column: stepKey, least: z.number().optional(), most: z.number().optional() })).max(10).default([]),
  /** Shares at most. */
  atMost: z.number().int().min(1).max(200).default(24),
})
export type SupplyConditions = z.infer<typeof supplyConditions>

/** Readings that come with the lab, of a flight that is nobody's share: for the practice with its worked answers. Cells are the digits as they are served. */
export const practiceReadings = z.object({
  leg, ...layer,
  columns: z.array(z.object({ quantity: stepKey, unit: z.string().regex(/^[^\s,]{1,40}$/) })).min(1).max(12),
  rows: z.array(z.array(z.string().regex(/^(-?\d{1,7}(\.\d{1,6})?)?$/, 'A number with a point, or nothing.')).max(12)).min(2).max(600),
}).refine(hasDepth, flat).refine(practice => practice.rows.every(row => row.length === practice.columns.length), { path: ['rows'], message: 'Every row has one cell for each column.' })
export type PracticeReadings = z.infer<typeof practiceReadings>

/** All optional: a revision from before there were such parts is read as one without them. */
export const labParts = {
  kind: labKind.nullable().default(null),
  /** About how long it takes. */
  minutes: z.number().int().min(5).max(3000).nullable().default(null),
  aims: z.array(sentence).max(12).default([]),
  outcomes: z.array(sentence).max(12).default([]),
  fieldPlan: fieldPlan.nullable().default(null),
  /** For staff: what to look for, and what goes wrong; Markdown. */
  guide: z.string().max(20_000).default(''),
  conditions: supplyConditions.nullable().default(null),
  practice: practiceReadings.nullable().default(null),
}
