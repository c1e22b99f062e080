import { z } from 'zod'
import { listLedger } from '../../domain/ledger/listLedger'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'department:ledger',
  summary: 'Entries of a ledger chain, the newest first',
  query: z.object({ chain: z.string().max(80).default('department'), action: z.string().max(60).default(''), before: z.coerce.number().int().min(1).optional() }),
  reply: z.object({
    chains: z.array(z.object({ id: z.string(), label: z.string(), seq: z.number().int() })),
    head: z.object({ seq: z.number().int(), digest: z.string() }).nullable(),
    actions: z.array(z.string()),
    entries: z.array(z.object({ seq: z.number().int(), at: z.string(), action: z.string(), by: z.string(), facts: z.string(), digest: z.string(), hasPrivateText: z.boolean() })),
    next: z.number().int().nullable(),
  }),
  handle: ({ query }) => listLedger(useStores().read, { chain: query.chain, action: query.action, before: query.before ?? null }),
})
