import { describe, expect, it } from 'vitest'
import { atan2, cos, sin } from '#shared/numerics/angles'
import { exp, log, log10, pow } from '#shared/numerics/elementary'
import { unitsInLastPlace } from '../../../fixtures/numerics/unitsInLastPlace'
import fixture from '../../../fixtures/numerics/elementary.json'

/** The worst distance over the fixture's rows. Values: mpmath 1.3.0 with 60 to 1200 digits (tests/fixtures/numerics/elementary.py). */
function worst(rows: string[][], of: (...numbers: number[]) => number): number {
  let most = 0
  for (const row of rows) {
    const args = row.slice(0, -1).map(Number)
    most = Math.max(most, unitsInLastPlace(of(...args), row[row.length - 1] ?? ''))
  }
  return most
}

describe('elementary functions against 40-digit values', () => {
  it('exp is within 0.52 units in the last place', () => expect(worst(fixture.exp, exp)).toBeLessThan(0.52))
  it('log is within 0.51', () => expect(worst(fixture.log, log)).toBeLessThan(0.51))
  it('log10 is within 0.52', () => expect(worst(fixture.log10, log10)).toBeLessThan(0.52))
  it('pow is within 0.52', () => expect(worst(fixture.pow, pow)).toBeLessThan(0.52))
  it('sin is within 0.8, for arguments of any size', () => expect(worst(fixture.sin, sin)).toBeLessThan(0.8))
  it('cos is within 0.8, for arguments of any size', () => expect(worst(fixture.cos, cos)).toBeLessThan(0.8))
  it('atan2 is within 0.8', () => expect(worst(fixture.atan2, atan2)).toBeLessThan(0.8))
  it('the measure itself sees one unit', () => {
    expect(unitsInLastPlace(1 + 2 ** -52, '1.0')).toBe(1)
    expect(unitsInLastPlace(1, '1.0')).toBe(0)
    expect(worst(fixture.exp, x => exp(x) * (1 + 2 ** -51))).toBeGreaterThan(1)
  })
})

describe('special cases are those of the language', () => {
  const odd = [0, -0, 1, -1, 0.5, -0.5, 2, 3, -2, -3, 1e308, -1e308, 5e-324, Infinity, -Infinity, NaN, 2 ** 53, 2 ** 53 + 2, 1e300, 710, -746]
  // where two doubles around a result are both right to 0.52 units, the engine's own may be the other one
  const close = (a: number, b: number) => Object.is(a, b) || Math.abs(a - b) <= 1e-15 * Math.abs(b)
  it('pow', () => {
    for (const x of odd) for (const y of odd) expect(close(pow(x, y), Math.pow(x, y)), `pow(${x}, ${y}) = ${pow(x, y)}, not ${Math.pow(x, y)}`).toBe(true)
  })
  it('atan2', () => {
    for (const y of odd) for (const x of odd) expect(close(atan2(y, x), Math.atan2(y, x)), `atan2(${y}, ${x}) = ${atan2(y, x)}, not ${Math.atan2(y, x)}`).toBe(true)
  })
  it('exp, log, log10, sin, cos', () => {
    for (const [name, ours, theirs] of [['exp', exp, Math.exp], ['log', log, Math.log], ['log10', log10, Math.log10], ['sin', sin, Math.sin], ['cos', cos, Math.cos]] as const) {
      for (const x of odd) expect(close(ours(x), theirs(x)), `${name}(${x}) = ${ours(x)}, not ${theirs(x)}`).toBe(true)
    }
  })
  it('powers of ten have whole logarithms', () => {
    for (let n = -300; n <= 300; n++) expect(log10(Number(`1e${n}`))).toBe(n)
  })
})
