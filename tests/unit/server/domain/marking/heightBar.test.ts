import { describe, expect, it } from 'vitest'
import type { Band, Judgement } from '#shared/marking/types'
import { heightBarOf, judgedAs, offsetInHalfWidths } from '../../../../../server/domain/marking/heightBar'

/** 9.6 K/km, accepted from 9.3 to 10.1: wider above than below. */
const band: Band = {
  center: 0.0096, low: 0.0093, high: 0.0101, lowDecimal: '9.3', highDecimal: '10.1', unit: 'K/km',
  parts: [{ key: 'granted', label: 'granted', below: 0.00025, above: 0.00025 }, { key: 'formulae', label: 'formulae', below: 0, above: 0.0002 }, { key: 'rounding', label: 'rounding', below: 0.00005, above: 0.00005 }],
}
/** 15.0 °C, accepted from 14.9 to 15.2: a scale with another zero. */
const celsius: Band = { center: 288.15, low: 288.05, high: 288.35, lowDecimal: '14.9', highDecimal: '15.2', unit: 'Cel', parts: [{ key: 'rounding', label: 'rounding', below: 0.05, above: 0.05 }] }

describe('a height bar', () => {
  it('shows center, edges and parts in the unit of the step', () => {
    const bar = heightBarOf(band, { decimal: '9.8' })
    expect(bar).toMatchObject({ unit: 'K/km', low: 9.3, high: 10.1, value: 9.8, digits: 2 })
    expect(bar.center).toBeCloseTo(9.6, 9)
    expect(bar.parts.map(part => [part.below, part.above].map(width => Number(width.toFixed(9))))).toEqual([[0.25, 0.25], [0, 0.2], [0.05, 0.05]])
  })

  it('carries over a scale with another zero', () => {
    const bar = heightBarOf(celsius, { decimal: null }, { key: 's', label: 'a slip', sentence: '', value: 290.15 })
    expect(bar.center).toBeCloseTo(15, 9)
    expect(bar.ghosts[0]?.value).toBeCloseTo(17, 9)
    expect(bar.value).toBeNull()
  })

  it('measures a value in half-widths of the side on which it lies, an edge being 1', () => {
    const at = (valueSi: number) => offsetInHalfWidths(band, { reading: 'ok', valueSi })
    expect([at(0.0096), at(0.0093), at(0.0101), at(0.0106)].map(offset => Number(offset?.toFixed(9)))).toEqual([0, -1, 1, 2])
    expect(offsetInHalfWidths(band, { reading: 'none', valueSi: null })).toBeNull()
  })
})

describe('the word for how a value came out', () => {
  const judgement = (given: Partial<Judgement>): Judgement => ({ outcome: 'value', refusalCode: null, reason: null, classes: [], band, carriedBand: null, carriedNote: null, isAccepted: false, acceptedBy: null, slip: null, slipValues: [], pointsMilli: 0, trace: [], notes: [], ...given })
  it.each([
    ['within', judgement({ isAccepted: true, acceptedBy: 'band' }), 'ok', 0.0098],
    ['within', judgement({ isAccepted: true, acceptedBy: 'carried' }), 'ok', 0.02],
    ['accepted', judgement({ isAccepted: true, acceptedBy: 'ruling' }), 'ok', -0.0096],
    ['above', judgement({}), 'ok', 0.012],
    ['below', judgement({}), 'ok', -0.0096],
    ['right', judgement({ outcome: 'none', band: null, isAccepted: true, acceptedBy: 'word' }), 'none', null],
    ['wrong', judgement({ outcome: 'none', band: null }), 'ok', 1],
    ['wrong', judgement({}), 'none', null],
    ['empty', judgement({}), 'empty', null],
    ['not_read', judgement({}), 'wrong_dimension', null],
    ['not_judged', judgement({ outcome: 'refused', refusalCode: 'out_of_range', band: null }), 'ok', 1],
  ] as const)('is "%s"', (word, given, reading, valueSi) => {
    expect(judgedAs(given, { reading, valueSi })).toBe(word)
  })
})
