import { z } from 'zod'
import { describeDemo } from '../domain/people/describeDemo'
import { defineApiHandler } from '../utils/defineApiHandler'
import { isDemo } from '../utils/isDemo'
import { useStores } from '../utils/useStores'

export default defineApiHandler({
  action: 'house:demo',
  summary: 'Sign-ins of the invented department; only where the demo is on',
  reply: z.object({ people: z.array(z.object({ name: z.string(), email: z.string(), password: z.string(), roles: z.array(z.string()) })) }),
  handle: () => describeDemo(useStores().read, isDemo()),
})
