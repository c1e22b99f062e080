/**
 * Random numbers that can be drawn again: xoshiro128** on 32-bit whole numbers, from a 128-bit seed.
 * Source: Blackman and Vigna (2021), ACM Trans. Math. Softw. 47, 36; vectors of their program are in the test.
 * Whole numbers without bias: Lemire (2019), ACM Trans. Model. Comput. Simul. 29, 3, by rejection.
 */
export interface RandomSource {
  /** The next 32 bits, 0 to 2³² − 1. */
  next: () => number
}

export type Seed = readonly [number, number, number, number]

/** 32 hexadecimal digits as four words, the first digits in the first word. */
export function seedFromHex(hex: string): Seed {
  if (!/^[0-9a-f]{32}$/i.test(hex)) throw new Error(`a seed is 32 hexadecimal digits, not "${hex.slice(0, 40)}"`)
  const word = (at: number) => parseInt(hex.slice(at * 8, at * 8 + 8), 16)
  return [word(0), word(1), word(2), word(3)]
}

/** A seed spread out from one small whole number by splitmix64 (Steele, Lea and Flood 2014), for tests and invented data. */
export function seedFromNumber(value: number): Seed {
  const next = splitmix64(BigInt(value))
  const a = next()
  const b = next()
  return [Number(a >> 32n), Number(a & 0xFFFFFFFFn), Number(b >> 32n), Number(b & 0xFFFFFFFFn)]
}

/** splitmix64: each call gives the next 64 bits. */
export function splitmix64(seed: bigint): () => bigint {
  const mask = 0xFFFFFFFFFFFFFFFFn
  let state = seed & mask
  return () => {
    state = (state + 0x9E3779B97F4A7C15n) & mask
    let z = state
    z = ((z ^ (z >> 30n)) * 0xBF58476D1CE4E5B9n) & mask
    z = ((z ^ (z >> 27n)) * 0x94D049BB133111EBn) & mask
    return z ^ (z >> 31n)
  }
}

const turned = (x: number, by: number): number => (x << by) | (x >>> (32 - by))

export function randomSource(seed: Seed): RandomSource {
  let [a, b, c, d] = seed
  // the one state that never moves
  if ((a | b | c | d) === 0) a = 1
  return {
    next() {
      const result = Math.imul(turned(Math.imul(b, 5), 7), 9) >>> 0
      const t = b << 9
      c ^= a
      d ^= b
      b ^= c
      a ^= d
      c ^= t
      d = turned(d, 11)
      return result
    },
  }
}

/** The upper and the lower 32 bits of a product of two 32-bit numbers. */
function wideProduct(x: number, y: number): { high: number, low: number } {
  const xHigh = x >>> 16, xLow = x & 0xFFFF
  const yHigh = y >>> 16, yLow = y & 0xFFFF
  const lowest = xLow * yLow
  const cross = xHigh * yLow + Math.floor(lowest / 65536)
  const middle = xLow * yHigh + (cross % 65536)
  return { high: xHigh * yHigh + Math.floor(cross / 65536) + Math.floor(middle / 65536), low: (((middle % 65536) << 16) | (lowest & 0xFFFF)) >>> 0 }
}

/** A whole number from 0 to `count` − 1, each as likely as the others; 1 ≤ count ≤ 2³² − 1. */
export function below(source: RandomSource, count: number): number {
  if (!(Number.isInteger(count) && count >= 1 && count <= 0xFFFFFFFF)) throw new Error(`cannot draw below ${count}`)
  const unfair = 4294967296 % count
  for (;;) {
    const { high, low } = wideProduct(source.next(), count)
    if (low >= unfair) return high
  }
}

/** A double from 0 up to but not including 1, in steps of 2⁻⁵³. */
export function fraction(source: RandomSource): number {
  const high = source.next() >>> 5
  const low = source.next() >>> 6
  return (high * 67108864 + low) / 9007199254740992
}

/** The numbers 0 to `count` − 1 in random order (Fisher and Yates; Durstenfeld 1964). */
export function shuffled(source: RandomSource, count: number): number[] {
  const order = Array.from({ length: count }, (_, at) => at)
  for (let at = count - 1; at > 0; at--) {
    const other = below(source, at + 1)
    const moved = order[at] ?? 0
    order[at] = order[other] ?? 0
    order[other] = moved
  }
  return order
}
