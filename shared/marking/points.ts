/** Marks in whole thousandths: split, kept in bounds, and rounded once, for display. */

/** Splits a total by weights so that the parts add up to it exactly: largest remainder, the earlier part first where remainders are equal. */
export function splitMilli(totalMilli: number, weights: readonly number[]): number[] {
  assertWhole(totalMilli)
  if (weights.length === 0) return []
  let sum = 0
  for (const weight of weights) {
    if (!(weight >= 0 && Number.isFinite(weight))) throw new Error(`a weight of ${weight} cannot be`)
    sum += weight
  }
  const shares = weights.map(weight => (sum > 0 ? totalMilli * weight / sum : totalMilli / weights.length))
  const parts = shares.map(Math.floor)
  let left = totalMilli
  for (const part of parts) left -= part
  const order = shares.map((share, at) => ({ at, rest: share - Math.floor(share) })).sort((a, b) => b.rest - a.rest || a.at - b.at)
  for (let n = 0; n < left; n++) {
    const at = order[n % order.length]?.at ?? 0
    parts[at] = (parts[at] ?? 0) + 1
  }
  return parts
}

/** Within 0 and the step's maximum, after everything that adds or takes. */
export function withinStep(pointsMilli: number, maxMilli: number): number {
  assertWhole(pointsMilli)
  assertWhole(maxMilli)
  return Math.min(Math.max(pointsMilli, 0), Math.max(maxMilli, 0))
}

/** What a value earns: the whole, less the digits' part where they are missing; else what the author gives for a named slip or a near miss. */
export function earnedMilli(of: { maxMilli: number, digitsMilli?: number, slipMilli?: number, near?: { milli: number } }, value: { isAccepted: boolean, hasDigits: boolean, isSlip: boolean, isNear: boolean }): number {
  if (value.isAccepted) return withinStep(of.maxMilli - (value.hasDigits ? 0 : of.digitsMilli ?? 0), of.maxMilli)
  if (value.isSlip) return withinStep(of.slipMilli ?? 0, of.maxMilli)
  return withinStep(value.isNear ? of.near?.milli ?? 0 : 0, of.maxMilli)
}

/** Thousandths as a decimal with some places, half away from zero: the one rounding, for display. Thresholds compare thousandths. */
export function showMilli(milli: number, places: 0 | 1 | 2 | 3): string {
  assertWhole(milli)
  const step = [1000, 100, 10, 1][places] ?? 1
  const size = Math.abs(milli)
  const whole = Math.floor((2 * size + step) / (2 * step))
  const digits = String(whole).padStart(places + 1, '0')
  const sign = milli < 0 && whole > 0 ? '−' : ''
  return places === 0 ? `${sign}${digits}` : `${sign}${digits.slice(0, -places)}.${digits.slice(-places)}`
}

function assertWhole(milli: number): void {
  if (!Number.isSafeInteger(milli)) throw new Error(`${milli} is no whole number of thousandths`)
}
