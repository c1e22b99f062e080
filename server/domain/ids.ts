import { randomFillSync } from 'node:crypto'
import { v7 } from 'uuid'

/** Random bytes for 256 identifiers at a time: asking the system for each cost more than the rest of it. None is given out twice. */
const pool = new Uint8Array(16 * 256)
let given = pool.length

function sixteenBytes(): Uint8Array {
  if (given === pool.length) {
    randomFillSync(pool)
    given = 0
  }
  given += 16
  return pool.subarray(given - 16, given)
}

/** A new identifier (UUIDv7). Order never comes from it: `seq` columns say what came first. */
export const newId = (now: number): string => v7({ msecs: now, random: sixteenBytes() })
