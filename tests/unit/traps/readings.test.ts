import { describe, expect, it } from 'vitest'
import { checkBand } from '#shared/marking/proof'
import { quantities } from '#shared/thermo/registry'
import { toHalfDivision } from '../../../components/plot/toHalfDivision'
import { judgeTyped, kelvins, stepOf } from '../../fixtures/marking/ask'

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
  it('U16: the plot in words gives every level to half a division, which the same band accepts and which says no more than the plot', () => {
    const division = 0.5
    for (let tenths = -40; tenths <= 400; tenths += 7) {
      const celsius = tenths / 10 + 0.03
      const told = toHalfDivision(celsius, division)
      expect(Math.abs(told / (division / 2) - Math.round(told / (division / 2)))).toBeLessThan(1e-9) // no finer than the plot
      const step = stepOf('profile-temperature-at-height', { height: [100, 200], temperature: kelvins(celsius, celsius), level: 150 }, { unit: 'Cel', readOff: { result: division / 2 } })
      expect(judgeTyped(step, `${told.toFixed(2)} °C`).isAccepted, `${celsius} told as ${told}`).toBe(true)
    }
  })
})

describe('traps C and M: what a diagram and the sky tell', () => {
  it('C16: w is read at the dewpoint; at the temperature it is the saturation mixing ratio, which is the named slip (P050)', () => {
    // University of Wyoming sounding archive, 72357 OUN 00Z 4 May 1999: 959.0 hPa, 22.2 °C, dewpoint 19.0 °C, MIXR 14.64 g/kg
    const [temperature, dewpoint] = kelvins(22.2, 19.0)
    const step = stepOf('mixing-ratio', { pressure: 95_900, temperature: temperature!, dewpoint: dewpoint! }, { unit: 'g/kg' })
    expect(judgeTyped(step, '14.6 g/kg').isAccepted).toBe(true)
    const atTemperature = judgeTyped(step, '17.8 g/kg')
    expect(atTemperature.isAccepted).toBe(false)
    expect(atTemperature.slip?.key).toBe('temperature-for-dewpoint')
  })
  it('M23: a cloud base that somebody saw is compared with the LCL and never marked by it: no quantity asks for it', () => {
    const asked = quantities.map(({ key, name, ask }) => `${key} ${name} ${ask}`).filter(words => /cloud[- ]base|observed.*condensation|condensation.*(observed|seen)/i.test(words))
    expect(asked).toEqual([])
  })
})
