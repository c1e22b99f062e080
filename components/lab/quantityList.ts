import type { z } from 'zod'
import type { flightListReply, labEditReply, quantityListReply } from '#shared/schemas/labReplies'

export type ListedQuantity = z.output<typeof quantityListReply>['quantities'][number]
export type QuantityInput = ListedQuantity['inputs'][number]
export type ListedFlight = z.output<typeof flightListReply>['flights'][number]
export type EditedLab = z.output<typeof labEditReply>

/** What a number can be bound to, and what is wrong so far: the same for a step and for a column of a table. */
export interface BindingGround {
  quantities: readonly ListedQuantity[]
  columns: readonly { quantity: string, label: string }[]
  constants: readonly string[]
  earlier: readonly { key: string, title: string }[]
  problems: readonly { path: string, message: string }[]
}

/** How a value is read from a share, as an author reads it. */
export const readingWords: Record<string, string> = {
  layer: 'every row of the layer',
  lowest: 'in the lowest row',
  highest: 'in the highest row',
  mean: 'mean over the layer',
  lowBound: 'the layer’s base',
  highBound: 'the layer’s top',
  row: 'in this row of the table',
}

/** The readings that fit an input: a series takes the layer, a number one value. */
export const readingsFor = (input: QuantityInput, isTable = false): string[] => input.shape === 'series' ? ['layer'] : [...(isTable ? ['row'] : []), 'lowest', 'highest', 'mean', ...(input.unit === 'm' ? ['lowBound', 'highBound'] : [])]
