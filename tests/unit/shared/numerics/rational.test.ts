import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { compare, fromDecimal, fromDouble, leadingExponent, over, plus, rational, times, toDecimal, toDouble, toPlace } from '#shared/numerics/rational'

const doubles = fc.double({ noNaN: true, noDefaultInfinity: true })

describe('fractions', () => {
  it('a double survives the way there and back', () => {
    fc.assert(fc.property(doubles, (value) => {
      expect(toDouble(fromDouble(value))).toBe(value === 0 ? 0 : value)
    }))
  })
  it('a decimal is exact: 0.1 + 0.2 is 0.3', () => {
    const [a, b, c] = [fromDecimal('0.1'), fromDecimal('0.2'), fromDecimal('0.3')]
    if (!a || !b || !c) throw new Error('not read')
    expect(compare(plus(a, b), c)).toBe(0)
    expect(compare(plus(fromDouble(0.1), fromDouble(0.2)), fromDouble(0.3))).not.toBe(0)
  })
  it('rounds to a place down, up and half away from zero', () => {
    const third = rational(1n, 3n)
    expect(toPlace(third, -3, 'down')).toBe('0.333')
    expect(toPlace(third, -3, 'up')).toBe('0.334')
    expect(toPlace(times(third, rational(-1n)), -3, 'down')).toBe('-0.334')
    expect(toPlace(rational(25n, 10n), 0)).toBe('3')
    expect(toPlace(rational(-25n, 10n), 0)).toBe('-3')
    expect(toPlace(rational(1250n), 2)).toBe('1300')
    expect(toPlace(rational(0n), 2)).toBe('0')
  })
  it('knows the leading digit', () => {
    for (const [text, exponent] of [['9.8', 0], ['1013', 3], ['0.5', -1], ['10', 1], ['0.00999', -3], ['-100', 2]] as const) {
      const value = fromDecimal(text)
      expect(value && leadingExponent(value), text).toBe(exponent)
    }
  })
  it('writes a decimal without loss, and a third rounded', () => {
    expect(toDecimal(rational(98n, 10n), 30)).toBe('9.8')
    expect(toDecimal(over(rational(1n), rational(3n)), 5)).toBe('0.33333')
    expect(toDecimal(rational(0n), 5)).toBe('0')
    expect(toDecimal(rational(1200n), 30)).toBe('1200')
  })
  it('refuses what is no decimal, and exponents without end', () => {
    for (const text of ['', '.', 'e5', '1e999999', '1e99999999', 'abc', '1.2.3', 'Infinity', '0x10']) expect(fromDecimal(text), text).toBeNull()
  })
})
