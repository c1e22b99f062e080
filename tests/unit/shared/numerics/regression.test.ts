import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { straightLine } from '#shared/numerics/regression'

/** NIST/ITL Statistical Reference Datasets, linear regression, Norris ("Calibration of Ozone Monitors"): data and certified values. */
const norris = {
  x: [0.2, 337.4, 118.2, 884.6, 10.1, 226.5, 666.3, 996.3, 448.6, 777.0, 558.2, 0.4, 0.6, 775.5, 666.9, 338.0, 447.5, 11.6, 556.0, 228.1, 995.8, 887.6, 120.2, 0.3, 0.3, 556.8, 339.1, 887.2, 999.0, 779.0, 11.1, 118.3, 229.2, 669.1, 448.9, 0.5],
  y: [0.1, 338.8, 118.1, 888.0, 9.2, 228.1, 668.5, 998.5, 449.1, 778.9, 559.2, 0.3, 0.1, 778.1, 668.8, 339.3, 448.9, 10.8, 557.7, 228.3, 998.0, 888.8, 119.6, 0.3, 0.6, 557.6, 339.3, 888.0, 998.5, 778.9, 10.2, 117.6, 228.9, 668.4, 449.2, 0.2],
  slope: 1.00211681802045, slopeError: 0.000429796848199937,
  intercept: -0.262323073774029, interceptError: 0.232818234301152,
  residualDeviation: 0.884796396144373, rSquared: 0.999993745883712,
}

describe('a straight line by least squares', () => {
  const line = straightLine(norris.x, norris.y)
  it.each(['slope', 'slopeError', 'intercept', 'interceptError', 'residualDeviation', 'rSquared'] as const)('%s agrees with NIST StRD Norris to 1e-12 (verified)', (name) => {
    expect(Math.abs((line?.[name] ?? NaN) / norris[name] - 1)).toBeLessThan(1e-12)
  })
  it('is not determined by one point, by unequal series, or by points above each other', () => {
    expect(straightLine([1], [2])).toBeNull()
    expect(straightLine([], [])).toBeNull()
    expect(straightLine([1, 2], [1])).toBeNull()
    expect(straightLine([3, 3, 3], [1, 2, 3])).toBeNull()
  })
  it('has no standard error with two points', () => {
    expect(straightLine([0, 1], [0, 2])).toMatchObject({ slope: 2, intercept: 0, slopeError: null, residualDeviation: null })
  })
  it('does not depend on the order of the points (to 1e-12), nor its slope on the origin', () => {
    const points = fc.array(fc.tuple(fc.double({ min: 0, max: 1000, noNaN: true }), fc.double({ min: -20, max: 30, noNaN: true })), { minLength: 3, maxLength: 60 })
    fc.assert(fc.property(points, fc.integer({ min: 0, max: 5000 }), (rows, shift) => {
      const first = straightLine(rows.map(r => r[0]), rows.map(r => r[1]))
      fc.pre(first !== null && first.sumXX > 1)
      const turned = [...rows].reverse()
      const second = straightLine(turned.map(r => r[0] + shift), turned.map(r => r[1]))
      expect(Math.abs((first?.slope ?? 0) - (second?.slope ?? 1))).toBeLessThan(1e-9 * (1 + Math.abs(first?.slope ?? 0)))
    }))
  })
})
