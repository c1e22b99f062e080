import { describe, expect, it } from 'vitest'
import { polynomialFit } from '#shared/numerics/polynomial'
import { coverageFactor, incompleteBeta, logGamma, standardNormal, studentT, studentTQuantile } from '#shared/numerics/studentT'

// JCGM 100:2008, Table G.2: factors for 95 % and 99 % (from memory; printed to two digits after the point)
const table = [[1, 12.71, 63.66], [2, 4.3, 9.92], [3, 3.18, 5.84], [5, 2.57, 4.03], [8, 2.31, 3.36], [10, 2.23, 3.17], [16, 2.12, 2.92], [20, 2.09, 2.85], [50, 2.01, 2.68], [100, 1.984, 2.626], [Infinity, 1.96, 2.576]] as const

describe('Student’s t', () => {
  it.each(table)('with %d degrees of freedom has the factors %d and %d of the GUM’s table', (degrees, for95, for99) => {
    expect(Math.abs(coverageFactor(0.95, degrees) - for95)).toBeLessThan(0.00501)
    expect(Math.abs(coverageFactor(0.99, degrees) - for99)).toBeLessThan(0.00501)
  })
  it('has the closed forms of one and two degrees of freedom', () => {
    for (const p of [0.6, 0.9, 0.975, 0.999]) {
      expect(studentTQuantile(p, 1)).toBeCloseTo(Math.tan(Math.PI * (p - 0.5)), 9)
      expect(studentTQuantile(p, 2)).toBeCloseTo((2 * p - 1) / Math.sqrt(2 * p * (1 - p)), 9)
      expect(studentTQuantile(1 - p, 5)).toBeCloseTo(-studentTQuantile(p, 5), 9)
      expect(studentT(studentTQuantile(p, 7.5), 7.5)).toBeCloseTo(p, 12)
    }
  })
  it('goes over into the normal distribution', () => {
    expect(coverageFactor(0.95, Infinity)).toBeCloseTo(1.959963984540054, 9)
    expect(standardNormal(1)).toBeCloseTo(0.8413447460685429, 14)
    expect(studentT(1.5, 5e6)).toBeCloseTo(standardNormal(1.5), 6)
  })
  it('stands on Γ and the incomplete beta function', () => {
    expect(logGamma(0.5)).toBeCloseTo(Math.log(Math.PI) / 2, 13)
    expect(logGamma(11)).toBeCloseTo(Math.log(3_628_800), 12)
    expect(incompleteBeta(0.3, 1, 1)).toBeCloseTo(0.3, 14)
    expect(incompleteBeta(0.5, 4, 4)).toBeCloseTo(0.5, 13)
    expect(incompleteBeta(0, 2, 3)).toBe(0)
    expect(incompleteBeta(1, 2, 3)).toBe(1)
  })
  it('refuses what is no probability and no degree of freedom', () => {
    expect(() => studentTQuantile(1, 5)).toThrow('no probability')
    expect(() => studentT(1, 0)).toThrow('degrees of freedom')
  })
})

describe('a polynomial by least squares', () => {
  it('finds what the points were made of', () => expect(polynomialFit([0, 1, 2], [1, 2, 5], 2)?.coefficients.map(one => Math.round(one * 1e12) / 1e12 + 0)).toEqual([1, 0, 1]))
  it('has none where the points determine none', () => {
    expect(polynomialFit([1, 2], [1, 2], 2)).toBeNull()
    expect(polynomialFit([3, 3, 3, 3], [1, 2, 3, 4], 1)).toBeNull()
    expect(polynomialFit([0, 0], [1, 2], 1)).toBeNull()
  })
  it('has no errors without a point to spare', () => expect(polynomialFit([0, 1, 2], [1, 2, 5], 2)).toMatchObject({ errors: null, residualDeviation: null }))
})
