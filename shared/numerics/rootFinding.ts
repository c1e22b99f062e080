/** Roots by a bracket: the same bits everywhere, and an error where there is none. */

/** The function has one sign at both ends, or is no number there. */
export class BracketError extends Error {
  override readonly name = 'BracketError'
  constructor(readonly low: number, readonly high: number) {
    super(`no change of sign between ${low} and ${high}`)
  }
}

/**
 * The root of a continuous function between two ends of opposite sign, by Chandrupatla's method: inverse quadratic steps where they are safe,
 * halves of the bracket otherwise.
 *
 * Source: Chandrupatla (1997), Advances in Engineering Software 28, 145–149. At most 100 steps; a bracket of 1e300 is halved in fewer.
 *
 * @throws {BracketError} where the ends have one sign
 * @example findRoot(x => x * x - 2, 0, 2) // 1.41421356…
 */
export function findRoot(f: (x: number) => number, low: number, high: number, tolerance = 1e-12): number {
  let b = low, a = high, c = high
  let fb = f(b), fa = f(a), fc = fa
  if (fb === 0) return b
  if (fa === 0) return a
  if (!(fa > 0 && fb < 0) && !(fa < 0 && fb > 0)) throw new BracketError(low, high)
  let t = 0.5
  for (let n = 0; n < 100; n++) {
    const x = a + t * (b - a)
    const fx = f(x)
    if (fx !== fx) throw new BracketError(low, high)
    if ((fx > 0) === (fa > 0)) {
      c = a
      fc = fa
    }
    else {
      c = b
      b = a
      fc = fb
      fb = fa
    }
    a = x
    fa = fx
    const isFirstBest = Math.abs(fa) < Math.abs(fb)
    const best = isFirstBest ? a : b
    const width = Math.abs(b - a)
    const limit = tolerance * Math.abs(best) + 1e-300
    if (fa === 0 || width <= 2 * limit) return best
    const xi = (a - b) / (c - b), phi = (fa - fb) / (fc - fb)
    const isSafe = phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi
    const guess = isSafe ? fa / (fb - fa) * fc / (fb - fc) + (c - a) / (b - a) * fa / (fc - fa) * fb / (fc - fb) : 0.5
    const edge = limit / width
    t = Math.min(1 - edge, Math.max(edge, guess))
  }
  return Math.abs(fa) < Math.abs(fb) ? a : b
}
