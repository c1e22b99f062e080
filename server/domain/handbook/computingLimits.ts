import { createHash } from 'node:crypto'
import { refuse } from '#shared/errors'
import type { Counters } from '../../db/counters'

export interface ComputingLimits {
  /** Counts one question of this person to the calculator. @throws {DomainError} `too_many_requests` */
  compute: (personId: string) => Promise<void>
  /** Counts one pasted sheet of this person. @throws {DomainError} `too_many_requests` */
  compare: (personId: string) => Promise<void>
}

/** Two questions a second for a minute: the calculator asks a quarter of a second after the last key, so that a fast typist stays below. A sheet may have two thousand rows. */
const questionsAMinute = 120
const sheetsAMinute = 12

/** What the reference may be asked to compute for one account: it answers in the thread in which a class hands in. */
export function computingLimits(counters: Counters): ComputingLimits {
  const counted = (name: string, most: number) => {
    const counter = counters.counter(name, most, 60)
    return async (personId: string) => {
      const seconds = await counter.take(createHash('sha256').update(personId).digest('base64url'))
      if (seconds !== null) refuse('too_many_requests', { seconds })
    }
  }
  return { compute: counted('compute', questionsAMinute), compare: counted('compare', sheetsAMinute) }
}
