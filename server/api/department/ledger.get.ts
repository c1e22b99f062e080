import { z } from 'zod'
import { ledgerPage } from '#shared/schemas/departmentReplies'
import { listLedger } from '../../domain/ledger/listLedger'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'department:ledger',
  summary: 'Entries of a ledger chain, the newest first',
  query: z.object({ chain: z.string().max(80).default('department'), action: z.string().max(60).default(''), before: z.coerce.number().int().min(1).optional() }),
  reply: ledgerPage,
  handle: ({ query }) => listLedger(useStores().read, { chain: query.chain, action: query.action, before: query.before ?? null }),
})
