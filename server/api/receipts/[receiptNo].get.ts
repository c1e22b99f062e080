import { z } from 'zod'
import { receipt } from '#shared/schemas/work'
import { readReceipt } from '../../domain/submissions/readReceipt'
import { defineApiHandler } from '../../utils/defineApiHandler'
import { useStores } from '../../utils/useStores'

export default defineApiHandler({
  action: 'receipt:read',
  summary: 'The receipt of a submission: number, time, and the digest of its entry in the ledger',
  params: z.object({ receiptNo: z.string().max(60) }),
  reply: receipt,
  handle: ({ params }) => readReceipt(useStores().read, params.receiptNo),
})
