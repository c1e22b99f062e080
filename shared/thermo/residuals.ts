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
