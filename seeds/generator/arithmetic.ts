import { fraction, randomSource, seedFromNumber } from '#shared/numerics/random'

/** Functions and random numbers of the generator, in one place: the committed files come out the same on every engine. */
export { exp, log, pow } from '#shared/numerics/elementary'
export { atan2, cos, sin } from '#shared/numerics/angles'
export const sqrt = Math.sqrt

export interface Random { uniform: () => number, normal: () => number }

/** A stream of numbers from a name: the same name gives the same stream. */
export function randomFrom(name: string): Random {
  let number = 0x811C9DC5 // FNV-1a, over the letters' code points
  for (const letter of name) number = Math.imul(number ^ (letter.codePointAt(0) ?? 0), 0x01000193) >>> 0
  const source = randomSource(seedFromNumber(number))
  const uniform = () => fraction(source)
  // Twelve uniform numbers added up: mean 6, variance 1, and none beyond six deviations. Weather needs no longer tails.
  const normal = () => {
    let sum = -6
    for (let drawn = 0; drawn < 12; drawn++) sum += source.next() / 4294967296
    return sum
  }
  return { uniform, normal }
}
