import { z } from 'zod'
import type { Accepted } from '#shared/marking/types'
import type { AcceptedTable } from '../../db/schema/labs'

/** What a ruling added to a step, as `accepted.body_json` holds it. */
export const acceptedBody = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('slip'), slip: z.string().min(1), ruling: z.string() }),
  z.object({ kind: z.literal('value'), lowSi: z.number(), highSi: z.number(), ruling: z.string() }),
  z.object({ kind: z.literal('variant'), variant: z.string().min(1), ruling: z.string() }),
])

/** What counts as right in one step beside its band, in the order in which rulings added it. */
export function acceptedOf(rows: readonly Pick<AcceptedTable, 'step_key' | 'body_json'>[], stepKey: string): Accepted[] {
  return rows.filter(row => row.step_key === stepKey).map(row => acceptedBody.parse(JSON.parse(row.body_json)))
}
