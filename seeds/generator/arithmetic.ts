/** Functions and random numbers of the generator, in one place: the committed files must come out the same on every engine. */
export const { exp, log, pow, sin, cos, sqrt, atan2 } = Math

export interface Random { uniform: () => number, normal: () => number }

/** A stream of numbers from a name: the same name gives the same stream. */
export function randomFrom(name: string): Random {
  let a = 0x9e3779b9
  for (const letter of name) a = Math.imul(a ^ letter.codePointAt(0)!, 0x85ebca6b) >>> 0
  const uniform = () => {
    a = (a + 0x6d2b79f5) >>> 0
    let t = Math.imul(a ^ (a >>> 15), 1 | a)
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296
  }
  return { uniform, normal: () => sqrt(-2 * log(1 - uniform())) * cos(2 * Math.PI * uniform()) }
}
