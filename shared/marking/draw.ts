/**
 * The draw `d1`: holder number k takes the item perm[k mod n] of the supply in its canonical order. The order is shuffled anew for each round,
 * and the first of a round changes places with the next where it would repeat the item before it. The same seed gives the same draw, and a
 * late holder takes the next place without moving anybody.
 */
import { randomSource, seedFromHex, shuffled } from '../numerics/random'

export const drawAlgorithm = 'd1'

/**
 * The supply number of the first `count` holders.
 * @param seed 128 bits as 32 hexadecimal digits
 */
export function drawOrdinals(seed: string, supplyCount: number, count: number): number[] {
  if (!Number.isSafeInteger(supplyCount) || supplyCount < 1) throw new Error('a draw needs a supply')
  if (!Number.isSafeInteger(count) || count < 0 || count > 1_000_000) throw new Error(`cannot draw ${count} shares`)
  const source = randomSource(seedFromHex(seed))
  const drawn: number[] = []
  while (drawn.length < count) {
    const order = shuffled(source, supplyCount)
    const [first, next] = order
    if (first !== undefined && next !== undefined && first === drawn[drawn.length - 1]) {
      order[0] = next
      order[1] = first
    }
    for (const item of order) {
      if (drawn.length < count) drawn.push(item)
    }
  }
  return drawn
}
