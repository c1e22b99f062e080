import { z } from 'zod'

/** The handbook: what the reference computes and how, made from the definitions that marking reads. */
const unit = z.object({ ucum: z.string(), label: z.string() })
const worked = z.array(z.object({ text: z.string(), formulaHtml: z.string(), filledHtml: z.string() }))

export const handbookReply = z.object({
  version: z.string(),
  groups: z.array(z.object({ key: z.string(), title: z.string(), quantities: z.array(z.object({ key: z.string(), name: z.string(), symbol: z.string(), unit: z.string(), variants: z.number() })) })),
  conventions: z.array(z.object({ key: z.string(), title: z.string(), isDefault: z.boolean() })),
})
export type HandbookReply = z.output<typeof handbookReply>

const handbookInput = z.object({
  name: z.string(), label: z.string(), symbol: z.string(), unit, shape: z.enum(['number', 'series']), isOptional: z.boolean(), isForSlips: z.boolean(),
  range: z.string(), needs: z.string().nullable(),
  /** What the calculator starts with, as a person would type it. */
  start: z.string(),
})

export const handbookQuantityReply = z.object({
  key: z.string(), name: z.string(), symbol: z.string(), ask: z.string(), group: z.object({ key: z.string(), title: z.string() }),
  kind: z.enum(['temperature', 'difference', 'ratio', 'fraction', 'class']), unit, units: z.array(unit),
  inputs: z.array(handbookInput),
  variants: z.array(z.object({ key: z.string(), label: z.string(), source: z.string(), status: z.string(), validity: z.string(), knownError: z.string(), formulas: z.array(z.string()) })),
  constants: z.array(z.object({ name: z.string(), symbolHtml: z.string(), label: z.string(), value: z.string() })),
  uses: z.array(z.object({ key: z.string(), name: z.string(), isListed: z.boolean() })),
  classes: z.array(z.string()),
  slips: z.array(z.object({ key: z.string(), label: z.string(), sentence: z.string() })),
  taught: z.array(z.object({ key: z.string(), title: z.string(), variant: z.string() })),
})
export type HandbookQuantity = z.output<typeof handbookQuantityReply>

const typed = z.string().max(20_000)
export const computeBody = z.object({
  convention: z.string().max(40),
  /** The convention's own where it is empty. */
  variant: z.string().max(60).default(''),
  unit: z.string().max(40),
  inputs: z.record(z.string().max(60), typed),
  /** The input that the curve runs along; none where it is empty. */
  along: z.string().max(60).default(''),
})
export type ComputeBody = z.input<typeof computeBody>

export const computeReply = z.object({
  /** By input: how it was read, or what is wrong with it. */
  read: z.record(z.string(), z.object({ ok: z.boolean(), message: z.string() })),
  /** What cannot be computed, and why; null where it can. */
  refused: z.string().nullable(),
  outcome: z.object({ words: z.string(), why: z.string().nullable() }).nullable(),
  band: z.object({ low: z.string(), high: z.string(), unit: z.string() }).nullable(),
  notes: z.array(z.string()),
  lines: worked,
  slips: z.array(z.object({ label: z.string(), words: z.string() })),
  curve: z.object({ along: z.string(), xLabel: z.string(), yLabel: z.string(), at: z.number(), here: z.object({ x: z.number(), y: z.number().nullable() }), points: z.array(z.object({ x: z.number(), y: z.number().nullable() })) }).nullable(),
})
export type ComputeReply = z.output<typeof computeReply>

export const handbookConventionReply = z.object({
  key: z.string(), title: z.string(), source: z.string(), beyond: z.string(), isDefault: z.boolean(),
  constants: z.array(z.object({ name: z.string(), symbolHtml: z.string(), label: z.string(), value: z.string() })),
  closes: z.string(),
  variants: z.array(z.object({ key: z.string(), quantity: z.string(), variant: z.string(), isNamed: z.boolean() })),
  accepted: z.array(z.object({ label: z.string(), group: z.string(), changes: z.string() })),
})
export type HandbookConvention = z.output<typeof handbookConventionReply>

/** A key column, pasted from a sheet: one column an input and one with the values that the sheet's author holds for right. */
export const compareBody = z.object({
  quantity: z.string().min(1, 'Choose a quantity.').max(80),
  variant: z.string().max(60).default(''),
  /** UCUM code in which the key column stands. */
  unit: z.string().max(40),
  pasted: z.string().min(1, 'Paste the rows of the sheet here.').max(200_000, 'At most 200,000 characters.'),
  /** What each pasted column holds, from the left: an input by its name with the unit it stands in, `key`, or nothing. */
  columns: z.array(z.object({ holds: z.string().max(60), unit: z.string().max(40) })).min(1).max(40),
})
export type CompareBody = z.input<typeof compareBody>

export const compareCause = z.enum(['same', 'variant', 'constant', 'slip', 'none', 'not_read', 'not_computed'])
export type CompareCause = z.output<typeof compareCause>
export const compareReply = z.object({
  quantity: z.string(), unit: z.string(), convention: z.string(),
  rows: z.array(z.object({ line: z.number(), key: z.string(), reference: z.string(), difference: z.string(), cause: compareCause, words: z.string() })),
  causes: z.array(z.object({ cause: compareCause, words: z.string(), rows: z.number() })),
})
export type CompareReply = z.output<typeof compareReply>
