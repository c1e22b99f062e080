/** What the rows leave about their line, and how much neighbors have in common. */
import type { Inputs } from './definition'
import { heightsOf, lineOf, temperaturesOf } from './layer'

/** Rows closer to their line than this leave nothing to correlate, K: rounding of doubles about 300 K is 1e-13. */
const noScatter = 1e-9

/**
 * Lag-1 correlation of the residuals of T about its line, in the order of the rows.
 *
 *   r₁ = Σᵢ eᵢ eᵢ₊₁ / Σᵢ eᵢ²,   e = T − T̂
 *
 * Source: Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., Eq. 3.32, with the mean of the residuals, which is 0 (from memory).
 * Null where the rows lie on their line.
 *
 * @example lagOneCorrelation({ height: [0, 1, 2, 3], temperature: [280, 281, 280, 281] }) // −0.75
 */
export function lagOneCorrelation(inputs: Inputs): number | null {
  const line = lineOf(inputs)
  if (!((line.residualDeviation ?? 0) > noScatter)) return null
  const z = heightsOf(inputs), T = temperaturesOf(inputs)
  let squares = 0, products = 0, before = 0
  for (let at = 0; at < z.length; at++) {
    const residual = ((T[at] ?? 0) - line.meanY) - line.slope * ((z[at] ?? 0) - line.meanX)
    squares += residual * residual
    if (at > 0) products += residual * before
    before = residual
  }
  return products / squares
}

/**
 * Lag-1 correlation of what the rows leave about a straight line of any rate, in the order of the rows.
 *
 *   r₁ = Σᵢ (eᵢ − ē)(eᵢ₊₁ − ē) / Σᵢ (eᵢ − ē)²,   e = T + Γ z     the line's height above its origin falls out with the mean
 *
 * Source: Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., Eq. 3.32 (from memory). Null where the rows lie on one such line.
 *
 * @example lagOneCorrelationAbout({ height: [0, 1, 2, 3], temperature: [280, 281, 280, 281] }, 0) // −0.75
 */
export function lagOneCorrelationAbout(inputs: Inputs, rate: number): number | null {
  const z = heightsOf(inputs), T = temperaturesOf(inputs), bottom = z[0] ?? 0, first = T[0] ?? 0
  const rest = T.map((one, at) => (one - first) + rate * ((z[at] ?? 0) - bottom))
  const mean = rest.reduce((sum, one) => sum + one, 0) / rest.length
  let squares = 0, products = 0, before = 0
  rest.forEach((one, at) => {
    const residual = one - mean
    squares += residual * residual
    if (at > 0) products += residual * before
    before = residual
  })
  return Math.sqrt(squares / rest.length) > noScatter ? products / squares : null
}

/**
 * How many independent rows the mean of `count` neighbors is worth: one at least, and never more than there are.
 *
 *   n′ = n (1 − r₁)/(1 + r₁)     n where r₁ is negative, 1 where it comes out below 1
 *
 * Source: Wilks (2011), section 5.2.4 (from memory).
 * @example effectiveRows(10, 0.5) // 3.333
 */
export function effectiveRows(count: number, correlation: number): number {
  if (correlation <= 0) return count
  return Math.max(1, count * (1 - correlation) / (1 + correlation))
}

/**
 * By what the standard error of a slope grows where residuals follow a first-order autoregression.
 *
 *   √[(1 + r₁)/(1 − r₁)]     1 where r₁ is negative: an error is never made smaller by it
 *
 * Source: Wilks (2011), section 5.2.4, effective sample size n(1 − r₁)/(1 + r₁) (from memory). Null for r₁ ≥ 1.
 * @example inflation(0.9) // 4.36
 */
export function inflation(correlation: number): number | null {
  if (!(correlation < 1)) return null
  return correlation <= 0 ? 1 : Math.sqrt((1 + correlation) / (1 - correlation))
}
