import { mkdirSync } from 'node:fs'
import { openCounters, type Counters } from '../db/counters'
import { computingLimits, type ComputingLimits } from '../domain/handbook/computingLimits'
import { signInLimits, type SignInLimits } from '../domain/people/signInLimits'
import { dataDir } from './useStores'

let opened: { counters: Counters, signIn: SignInLimits, computing: ComputingLimits } | undefined

/** The counts of tries, opened at the first use. */
function open() {
  if (!opened) {
    mkdirSync(dataDir(), { recursive: true })
    const counters = openCounters(dataDir())
    opened = { counters, signIn: signInLimits(counters), computing: computingLimits(counters) }
  }
  return opened
}

export const useLimits = (): SignInLimits => open().signIn
export const useComputingLimits = (): ComputingLimits => open().computing

export function closeLimits(): void {
  opened?.counters.close()
  opened = undefined
}
