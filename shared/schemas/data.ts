import { z } from 'zod'
import { findMeasuredQuantity, findMeasuredUnit } from './measured'

export { findMeasuredQuantity, findMeasuredUnit, measuredQuantities, unitLabel, type MeasuredQuantity, type MeasuredUnit } from './measured'

/**
 * A recipe: how the bytes of a logger's file become rows. A person confirms each line of it; with the source file it gives
 * the same data set again, chunk for chunk. Kept in `recipe_revision.body_json`.
 */

/** A column by its name in the head (`column 3` where there is no head) and its place, counted from 0. The name decides; the place tells twins apart. */
export const columnRef = z.object({ name: z.string().max(200), at: z.number().int().min(0).max(4999) })
export type ColumnRef = z.infer<typeof columnRef>

export const columnRecipe = columnRef.extend({
  /** value: a reading. quality: a number that another instrument or program gave as its verdict. */
  role: z.enum(['value', 'quality']),
  /** Name shown to people; the name in the head unless said otherwise. */
  title: z.string().trim().min(1).max(80),
  quantity: z.string().max(60),
  unit: z.string().trim().min(1).max(40),
  /** Digits behind the decimal mark in what is served; null takes the most that the file has, at most 6. */
  decimals: z.number().int().min(0).max(10).nullable(),
  /** Matched as text, and as a number where both are numbers. Blank is always missing. */
  missingCodes: z.array(z.string().trim().min(1).max(30)).max(20),
  /** Height of the sensor above ground, in meters. */
  heightM: z.number().min(-100).max(20_000).nullable(),
}).superRefine((column, context) => {
  const quantity = findMeasuredQuantity(column.quantity)
  if (!quantity) context.addIssue({ code: 'custom', path: ['quantity'], message: 'Not a quantity that a column can be.' })
  else if (column.quantity !== 'other' && !findMeasuredUnit(column.quantity, column.unit)) context.addIssue({ code: 'custom', path: ['unit'], message: `${quantity.label} does not come in this unit.` })
})
export type ColumnRecipe = z.infer<typeof columnRecipe>

export const dateOrder = z.enum(['ymd', 'dmy', 'mdy'])
export type DateOrder = z.infer<typeof dateOrder>

export const timeRecipe = z.discriminatedUnion('form', [
  /** Date and time in one cell, with or without an offset. */
  z.object({ form: z.literal('stamp'), column: columnRef, dateOrder }),
  z.object({ form: z.literal('split'), date: columnRef, time: columnRef, dateOrder }),
  z.object({ form: z.literal('fields'), year: columnRef, month: columnRef, day: columnRef, hour: columnRef, minute: columnRef.nullable(), second: columnRef.nullable() }),
  z.object({ form: z.literal('dayOfYear'), year: columnRef, day: columnRef, time: columnRef }),
  z.object({ form: z.literal('epoch'), column: columnRef, unit: z.enum(['s', 'ms']) }),
  /** Seconds or minutes since a start; without a start the instants stay unknown. */
  z.object({ form: z.literal('elapsed'), column: columnRef, unit: z.enum(['s', 'min']), startsAt: z.string().max(40).nullable() }),
  z.object({ form: z.literal('none') }),
])
export type TimeRecipe = z.infer<typeof timeRecipe>

export const delimiters = [',', ';', '\t', '|', ' '] as const
export const encodings = ['utf-8', 'windows-1252', 'utf-16le', 'utf-16be'] as const
export const heightDatums = ['sea level', 'ground', 'roof', 'launch point', 'unknown'] as const

/** `UTC`, `UTC-07:00`, or a name of the zone database. */
export const zoneName = z.string().min(1).max(60).regex(/^[A-Za-z0-9_+\-/:]+$/, 'Not a time zone.')

/** A recipe as it is drafted: nothing may be taken yet. */
export const recipeDraft = z.object({
  title: z.string().trim().min(1).max(120),
  kind: z.enum(['station', 'flight']),
  encoding: z.enum(encodings),
  /** A blank means runs of blanks. */
  delimiter: z.enum(delimiters),
  decimal: z.enum(['.', ',']),
  /** Lines that begin with this are no rows. */
  comment: z.string().min(1).max(4).nullable(),
  /** Lines above the head. */
  skipLines: z.number().int().min(0).max(1000),
  headerRows: z.number().int().min(0).max(20),
  columns: z.array(columnRecipe).max(200),
  time: timeRecipe,
  /** Zone of the stamps where the cells carry none, or where what they carry is not believed. */
  zone: zoneName,
  /** The cells print a zone or an offset that is wrong: read the wall time in `zone`. */
  ignoresCellZone: z.boolean(),
  /** What a stamp names. A row is stored under the end of its interval. */
  stampMeans: z.enum(['instant', 'start', 'end']),
  /** Length of the averaging interval in seconds, where a stamp names one. */
  intervalS: z.number().int().min(1).max(86_400).nullable(),
  /** Gives a data set for each value of this column. */
  stationColumn: columnRef.nullable(),
  /** What heights in this record are counted from. */
  heightDatum: z.enum(heightDatums),
})

export const recipe = recipeDraft.superRefine((body, context) => {
  if (body.columns.length === 0) context.addIssue({ code: 'custom', path: ['columns'], message: 'Take at least one column.' })
  if (body.stampMeans !== 'instant' && body.intervalS === null) context.addIssue({ code: 'custom', path: ['intervalS'], message: 'Say how long the interval is that a stamp starts or ends.' })
  const seen = new Set<number>()
  body.columns.forEach((column, at) => {
    if (seen.has(column.at)) context.addIssue({ code: 'custom', path: ['columns', at, 'at'], message: 'This column is taken twice.' })
    seen.add(column.at)
  })
})
export type Recipe = z.infer<typeof recipe>

/** One refused row: where it stands, what stood there, and why it was not taken. */
export const refusedRow = z.object({ line: z.number().int(), column: z.string(), text: z.string(), reason: z.string() })
export type RefusedRow = z.infer<typeof refusedRow>
