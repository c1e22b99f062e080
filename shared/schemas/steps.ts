import { z } from 'zod'

/** Steps as an author writes them, each kind with its schema; what each asks is in `askedSteps`. Points are thousandths of a mark. */

/** How one number (or a series) is taken from a student's share. */
export const shareReading = z.enum([
  'layer', // the series of a column over the rows marked `use`
  'lowest', // the value at the lowest row of the layer
  'highest', // the value at the highest row of the layer
  'mean', // the mean of the column over the layer
  'lowBound', 'highBound', // the layer's own bounds, in meters
  'row', // the value in one row of a table, see `row`
])

export const inputSource = z.discriminatedUnion('from', [
  z.object({
    from: z.literal('share'), column: z.string().min(1).max(60), read: shareReading,
    /** For a row of a table: the row number `no` of `of`, spread evenly over the rows in use from the lowest to the highest. */
    row: z.object({ no: z.number().int().min(1), of: z.number().int().min(1) }).optional(),
  }),
  z.object({ from: z.literal('text'), value: z.number(), unit: z.string().max(40) }),
  z.object({ from: z.literal('constant'), name: z.string().min(1).max(40) }),
  z.object({ from: z.literal('step'), key: z.string().min(1).max(40) }),
])
export type InputSource = z.infer<typeof inputSource>

export const stepKey = z.string().regex(/^[a-z][a-z0-9-]{0,39}$/)
/** A step that is made of parts: the parts' keys begin with it. */
const blockKey = z.string().regex(/^[a-z][a-z0-9-]{0,23}$/)
const partKey = z.string().regex(/^[a-z][a-z0-9]{0,7}$/)
const pointsMilli = z.number().int().min(0).max(1_000_000)

const titled = {
  title: z.string().trim().min(1).max(200),
  /** A sentence or two under the ask; Markdown. */
  text: z.string().max(4000).default(''),
}

/** A number that is asked by a quantity of the reference. */
const asked = {
  quantity: z.string().min(1).max(80),
  variant: z.string().max(80).nullable().default(null),
  inputs: z.record(z.string(), inputSource),
  /** UCUM code in which the step asks. */
  unit: z.string().min(1).max(40),
  digits: z.number().int().min(1).max(10).default(3),
  /** What the author grants, in `unit`; relative is a fraction and refused for temperatures. */
  granted: z.object({ absolute: z.number().min(0).optional(), relative: z.number().min(0).max(1).optional() }).default({}),
  /** Part of the marks for a value that a named slip alone explains. */
  slipMilli: z.number().int().min(0).default(0),
  /** Part of the marks that a right value earns only with the digits asked. */
  digitsMilli: z.number().int().min(0).default(0),
  /** A near miss: a value that no slip explains, within so many half-widths of the accepted range, earns part. */
  near: z.object({ widths: z.number().min(1).max(5), milli: z.number().int().min(0) }).nullable().default(null),
}

export const numberStep = z.object({ key: stepKey, kind: z.literal('number'), ...titled, pointsMilli, ...asked })
export type NumberStep = z.infer<typeof numberStep>

/** Read off the plot of the share: half a division of its axis is added to the accepted range. */
export const diagramStep = z.object({
  key: stepKey, kind: z.literal('diagram'), ...titled, pointsMilli, ...asked,
  /** Divisions of the plot's axes from which it is read: by input for inputs that are read off, `result` for the value itself. */
  divisions: z.record(z.string(), z.object({ division: z.number().positive(), unit: z.string().min(1).max(40) })),
})
export type DiagramStep = z.infer<typeof diagramStep>

/** The student's own reading, judged against the station within both accuracies; later steps go on from what the student read. */
export const readingStep = z.object({
  key: stepKey, kind: z.literal('reading'), ...titled, pointsMilli, ...asked,
  accuracy: z.object({ station: z.number().positive(), own: z.number().positive() }),
})
export type ReadingStep = z.infer<typeof readingStep>

/** A straight line through a layer: slope, intercept and standard error, each with marks of its own. */
export const fitStep = z.object({
  key: blockKey, kind: z.literal('fit'), ...titled,
  inputs: z.object({ height: inputSource, temperature: inputSource }),
  parts: z.object({
    slope: z.object({ pointsMilli, digits: asked.digits, granted: asked.granted, slipMilli: asked.slipMilli }),
    intercept: z.object({ pointsMilli, digits: asked.digits, granted: asked.granted, slipMilli: asked.slipMilli }).nullable(),
    error: z.object({ pointsMilli, digits: asked.digits, granted: asked.granted, slipMilli: asked.slipMilli }).nullable(),
  }),
})
export type FitStep = z.infer<typeof fitStep>

/** Numbers in rows and columns: each row is one row of the share, spread evenly over those in use, from the lowest to the highest. */
export const tableStep = z.object({
  key: blockKey, kind: z.literal('table'), ...titled,
  rows: z.number().int().min(1).max(24),
  columns: z.array(z.object({ key: partKey, title: z.string().trim().min(1).max(60), pointsMilli, ...asked })).min(1).max(6),
}).superRefine((step, context) => {
  if (new Set(step.columns.map(column => column.key)).size !== step.columns.length) context.addIssue({ code: 'custom', path: ['columns'], message: 'Two columns have the same key.' })
})
export type TableStep = z.infer<typeof tableStep>

/** One right option, or several; each says why, which is shown with the marks. */
export const choiceStep = z.object({
  key: stepKey, kind: z.literal('choice'), ...titled, pointsMilli,
  isSeveral: z.boolean().default(false),
  options: z.array(z.object({ key: partKey, text: z.string().trim().min(1).max(400), isRight: z.boolean(), why: z.string().trim().max(800).default('') })).min(2).max(10),
}).superRefine((step, context) => {
  const right = step.options.filter(option => option.isRight).length
  if (right === 0) context.addIssue({ code: 'custom', path: ['options'], message: 'Say which option is right.' })
  if (right > 1 && !step.isSeveral) context.addIssue({ code: 'custom', path: ['options'], message: 'One option is right here, unless several may be chosen.' })
  if (new Set(step.options.map(option => option.key)).size !== step.options.length) context.addIssue({ code: 'custom', path: ['options'], message: 'Two options have the same key.' })
})
export type ChoiceStep = z.infer<typeof choiceStep>

export const labStep = z.discriminatedUnion('kind', [numberStep, diagramStep, readingStep, fitStep, tableStep, choiceStep])
export type LabStep = z.infer<typeof labStep>
export type StepKind = LabStep['kind']
