import { describe, expect, it } from 'vitest'
import { isSameDimension, siFromText, siWidth } from '../../../../../server/domain/shares/units'

describe('units of served digits and granted widths', () => {
  it.each([['20.0', 'Cel', 'temperature', 293.15], ['68', '[degF]', 'temperature', 293.15], ['5', 'Cel', 'difference', 5], ['987.8', 'hPa', 'ratio', 98_780], ['1000', '[ft_i]', 'difference', 304.8]] as const)('%s %s as a %s is %d', (text, unit, kind, si) => {
    // by definition of the units: 0 °C = 273.15 K, 1 °F = 5/9 K, 1 ft = 0.3048 m
    expect(siFromText(text, unit, kind)).toBe(si)
  })
  it('takes a granted degree as a step', () => {
    expect(siWidth(0.2, 'Cel')).toBe(0.2)
    expect(siWidth(0.9, '[degF]')).toBe(0.5)
    expect(siWidth(0.05, 'K/km')).toBe(0.00005)
  })
  it('tells kinds apart and has no value for what is none', () => {
    expect(isSameDimension('K/km', 'Cel')).toBe(false)
    expect(isSameDimension('hPa', '[in_i\'Hg]')).toBe(true)
    expect(isSameDimension('furlong', 'm')).toBe(false)
    expect(siFromText('', 'm', 'difference')).toBeNull()
    expect(siFromText('#DIV/0!', 'm', 'difference')).toBeNull()
  })
})
