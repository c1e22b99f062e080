/**
 * A straight line y = intercept + slope · x by ordinary least squares, and its standard errors with n − 2 degrees of freedom.
 *
 *   slope = Σ(x − x̄)(y − ȳ) / Σ(x − x̄)²     s² = Σ(y − ŷ)² / (n − 2)     se(slope) = s / √Σ(x − x̄)²
 *
 * Source: common practice; agrees with NIST StRD (Norris) to 1e-12 in the test.
 * Limits: errors of x are taken as none, and neighbors as independent: with correlated residuals the standard error is too small.
 */
export interface Line {
  slope: number
  intercept: number
  /** Of the points about the line; null with fewer than three points. */
  residualDeviation: number | null
  slopeError: number | null
  interceptError: number | null
  /** Share of the variance of y that the line explains; null where y does not vary. */
  rSquared: number | null
  meanX: number
  meanY: number
  sumXX: number
  sumXY: number
  sumYY: number
  count: number
}

/** Null where no line is determined: fewer than two points, series of unequal length, or all x alike. */
export function straightLine(x: readonly number[], y: readonly number[]): Line | null {
  const count = x.length
  if (count < 2 || y.length !== count) return null
  const meanX = mean(x)
  const meanY = mean(y)
  let sumXX = 0, sumXY = 0, sumYY = 0
  for (let at = 0; at < count; at++) {
    const dx = (x[at] ?? 0) - meanX
    const dy = (y[at] ?? 0) - meanY
    sumXX += dx * dx
    sumXY += dx * dy
    sumYY += dy * dy
  }
  if (!(sumXX > 0) || !Number.isFinite(sumXX + sumYY)) return null
  const slope = sumXY / sumXX
  let squares = 0
  for (let at = 0; at < count; at++) {
    const residual = ((y[at] ?? 0) - meanY) - slope * ((x[at] ?? 0) - meanX)
    squares += residual * residual
  }
  const residualDeviation = count > 2 ? Math.sqrt(squares / (count - 2)) : null
  return {
    slope,
    intercept: meanY - slope * meanX,
    residualDeviation,
    slopeError: residualDeviation === null ? null : residualDeviation / Math.sqrt(sumXX),
    interceptError: residualDeviation === null ? null : residualDeviation * Math.sqrt(1 / count + meanX * meanX / sumXX),
    rSquared: sumYY > 0 ? Math.max(0, 1 - squares / sumYY) : null,
    meanX, meanY, sumXX, sumXY, sumYY, count,
  }
}

/** The mean, with a second pass that takes off what rounding left. */
export function mean(values: readonly number[]): number {
  let sum = 0
  for (const value of values) sum += value
  const first = sum / values.length
  let rest = 0
  for (const value of values) rest += value - first
  return first + rest / values.length
}
