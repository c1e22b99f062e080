/**
 * Student's t and the normal distribution: their distribution functions and quantiles.
 *
 *   P(T ≤ t) = 1 − ½ I_x(ν/2, ½),  x = ν/(ν + t²),  for t ≥ 0
 *
 * Source: Abramowitz and Stegun (1964), 26.7.1 and 26.5.8 (continued fraction of the incomplete beta function); Lanczos (1964) for ln Γ with the
 * coefficients g = 7, n = 9 (common practice). Agrees with the GUM's Table G.2 to its last digit in the test.
 */
import { exp, log } from './elementary'

/** Lanczos’ coefficients of ln Γ. */
export const lanczos: readonly number[] = [0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059, 12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7]
const halfLogOfTwoPi = 0.9189385332046727

/** ln Γ(x) for x > 0. */
export function logGamma(x: number, coefficients: readonly number[] = lanczos): number {
  // below ½ by Γ(x) = Γ(x + 1)/x
  if (x < 0.5) return logGamma(x + 1, coefficients) - log(x)
  let sum = coefficients[0] ?? 0
  for (let n = 1; n < coefficients.length; n++) sum += (coefficients[n] ?? 0) / (x - 1 + n)
  const t = x + 6.5
  return halfLogOfTwoPi + (x - 0.5) * log(t) - t + log(sum)
}

/** The regularized incomplete beta function I_x(a, b), 0 ≤ x ≤ 1. */
export function incompleteBeta(x: number, a: number, b: number): number {
  if (!(x > 0)) return 0
  if (!(x < 1)) return 1
  // the continued fraction converges fast on this side; on the other I_x(a, b) = 1 − I_(1−x)(b, a)
  if (x > (a + 1) / (a + b + 2)) return 1 - incompleteBeta(1 - x, b, a)
  const front = exp(a * log(x) + b * log(1 - x) + logGamma(a + b) - logGamma(a) - logGamma(b)) / a
  const tiny = 1e-300
  let c = 1, d = 1 - (a + b) * x / (a + 1)
  d = 1 / (Math.abs(d) < tiny ? tiny : d)
  let fraction = d
  for (let m = 1; m <= 500; m++) {
    const even = m * (b - m) * x / ((a + 2 * m - 1) * (a + 2 * m))
    d = 1 + even * d
    c = 1 + even / c
    d = 1 / (Math.abs(d) < tiny ? tiny : d)
    if (Math.abs(c) < tiny) c = tiny
    fraction *= d * c
    const odd = -(a + m) * (a + b + m) * x / ((a + 2 * m) * (a + 2 * m + 1))
    d = 1 + odd * d
    c = 1 + odd / c
    d = 1 / (Math.abs(d) < tiny ? tiny : d)
    if (Math.abs(c) < tiny) c = tiny
    const change = d * c
    fraction *= change
    if (Math.abs(change - 1) < 1e-15) break
  }
  return front * fraction
}

/** Beyond so many degrees of freedom Student's t is taken as the normal distribution: k is then off by 2e-7. */
const asNormal = 1e7

/** P(Z ≤ z) of the normal distribution: ½ + φ(z)(z + z³/3 + z⁵/(3·5) + …), Abramowitz and Stegun (1964), 26.2.11. */
export function standardNormal(z: number): number {
  if (z < 0) return 1 - standardNormal(-z)
  if (z > 9) return 1
  let term = z, sum = z
  for (let n = 3; term > 1e-17 * sum; n += 2) {
    term *= z * z / n
    sum += term
  }
  return 0.5 + exp(-z * z / 2) * 0.3989422804014327 * sum
}

/** P(T ≤ t) with ν degrees of freedom, not necessarily whole; the normal distribution for Infinity. */
export function studentT(t: number, degreesOfFreedom: number): number {
  if (!(degreesOfFreedom > 0)) throw new RangeError(`${degreesOfFreedom} degrees of freedom are none`)
  const nu = degreesOfFreedom
  if (nu > asNormal) return standardNormal(t)
  const tail = 0.5 * incompleteBeta(nu / (nu + t * t), nu / 2, 0.5)
  return t >= 0 ? 1 - tail : tail
}

/**
 * The t that P(T ≤ t) is a probability at, by bisection.
 * @example studentTQuantile(0.975, 10) // 2.2281
 */
export function studentTQuantile(probability: number, degreesOfFreedom: number): number {
  if (!(probability > 0 && probability < 1)) throw new RangeError(`${probability} is no probability between 0 and 1`)
  if (probability < 0.5) return -studentTQuantile(1 - probability, degreesOfFreedom)
  let low = 0, high = 1
  while (studentT(high, degreesOfFreedom) < probability && high < 1e12) high *= 2
  for (let n = 0; n < 200; n++) {
    const middle = (low + high) / 2
    if (middle <= low || middle >= high) break
    if (studentT(middle, degreesOfFreedom) < probability) low = middle
    else high = middle
  }
  return (low + high) / 2
}

/**
 * The factor k of an expanded uncertainty: P(−k ≤ T ≤ k) is the coverage.
 * @example coverageFactor(0.99, 16) // 2.92
 */
export const coverageFactor = (coverage: number, degreesOfFreedom: number): number => studentTQuantile((1 + coverage) / 2, degreesOfFreedom)
