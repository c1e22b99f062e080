import { z } from 'zod'
import { refuse } from '#shared/errors'
import { describeSelf } from '../domain/people/describeSelf'
import { defineApiHandler } from '../utils/defineApiHandler'
import { useStores } from '../utils/useStores'

export const selfReply = z.object({
  id: z.string(), name: z.string(), email: z.string(),
  courses: z.array(z.object({
    id: z.string(), code: z.string(), title: z.string(), state: z.enum(['draft', 'open', 'settled', 'closed']), term: z.string(), termState: z.enum(['planned', 'running', 'closed']), zone: z.string(),
    role: z.enum(['lead', 'instructor', 'ta', 'student']), sections: z.array(z.object({ id: z.string(), name: z.string() })),
  })),
  department: z.array(z.enum(['admin', 'technician', 'visitor'])),
})

export default defineApiHandler({
  action: 'self:read',
  summary: 'Who is signed in, and in which courses and roles',
  reply: selfReply,
  handle: ({ actor }) => describeSelf(useStores().read, actor ?? refuse('not_signed_in')),
})
