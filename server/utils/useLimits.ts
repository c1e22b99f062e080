import { mkdirSync } from 'node:fs'
import { openCounters, type Counters } from '../db/counters'
import { signInLimits, type SignInLimits } from '../domain/people/signInLimits'
import { dataDir } from './useStores'

let opened: { counters: Counters, limits: SignInLimits } | undefined

/** The counts of tries, opened at the first use. */
export function useLimits(): SignInLimits {
  if (!opened) {
    mkdirSync(dataDir(), { recursive: true })
    const counters = openCounters(dataDir())
    opened = { counters, limits: signInLimits(counters) }
  }
  return opened.limits
}

export function closeLimits(): void {
  opened?.counters.close()
  opened = undefined
}
