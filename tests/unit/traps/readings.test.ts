import { describe, expect, it } from 'vitest'
import { checkBand } from '#shared/marking/proof'
import { judgeTyped, stepOf } from '../../fixtures/marking/ask'

/** 8 K/km between two readings off a plot with divisions of 0.5 K and 10 m. */
const readOff = { lowerTemperature: 0.25, upperTemperature: 0.25, lowerHeight: 5, upperHeight: 5 }
const rate = (depth: number) => stepOf('lapse-rate-of-two-readings', { lowerHeight: 1000, lowerTemperature: 290, upperHeight: 1000 + depth, upperTemperature: 290 - 0.008 * depth }, { unit: 'K/km', digits: 4, readOff })
const readingWidth = (depth: number) => (judgeTyped(rate(depth), '8').band?.parts ?? []).filter(part => part.key === 'reading').reduce((sum, part) => sum + part.above, 0) * 1000

describe('traps U: readings off a plot', () => {
  it('U15: the width of a slope is (δT₁ + δT₂)/Δz + |Γ|(δz₁ + δz₂)/Δz: 2.9 K/km over 200 m, 1 K/km over 580 m', () => {
    expect(readingWidth(200)).toBeCloseTo(2.9, 1)
    expect(readingWidth(580)).toBeCloseTo(1, 1)
    expect(readingWidth(200)).toBeGreaterThan(2.85)
  })
  it('U15: a layer too thin to be read is refused before posting, a deep one is not', () => {
    expect(checkBand(rate(200)).ok).toBe(false)
    expect(checkBand(rate(200)).reasons.join()).toContain('half the way')
    expect(checkBand(rate(2000)).ok).toBe(true)
  })
})
