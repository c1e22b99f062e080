import { afterEach, beforeEach, expect, it, vi } from 'vitest'
import { openCounters, type Counters } from '../../../server/db/counters'
import { computingLimits } from '../../../server/domain/handbook/computingLimits'
import { openTemporary } from '../../fixtures/openTemporary'

let stores: Awaited<ReturnType<typeof openTemporary>>
let counters: Counters
beforeEach(async () => {
  stores = await openTemporary()
  counters = openCounters(stores.dataDir)
})
afterEach(async () => {
  counters.close()
  await stores.remove()
  vi.useRealTimers()
})

it.each([['compute', 120], ['compare', 12]] as const)('%s: one account has %d a minute, and another its own', async (kind, most) => {
  const limits = computingLimits(counters)
  for (let times = 0; times < most; times++) await limits[kind]('person-1')
  await expect(limits[kind]('person-1')).rejects.toMatchObject({ code: 'too_many_requests' })
  await limits[kind]('person-2')
  vi.useFakeTimers({ now: Date.now() + 61_000, toFake: ['Date'] })
  await limits[kind]('person-1')
})
