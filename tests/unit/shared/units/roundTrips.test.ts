/** Units there and back, in exact arithmetic: what is typed in any unit of a kind is the same value in every other. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { absolute, compare, fromDecimal, fromDouble, minus, rational, times, toDecimal, toDouble } from '#shared/numerics/rational'
import { quantities } from '#shared/thermo/registry'
import { formatUnit } from '#shared/units/formatQuantity'
import { readQuantity, type Ask } from '#shared/units/readQuantity'
import { fromSi, getUnit, isCommensurable, toSi } from '#shared/units/ucum'

const codes = ['m', 'km', 'hm', 'cm', 'mm', '[ft_i]', '[in_i]', '[mi_i]', '[nmi_i]', 'kg', 'g', '[lb_av]', 's', 'min', 'h', 'Pa', 'hPa', 'kPa', 'mbar', 'atm', 'mm[Hg]', '[in_i\'Hg]', '[psi]', 'J', 'kJ', 'MJ', 'cal', 'm/s', 'km/h', '[kn_i]', 'K', 'Cel', '[degF]',
  'K/m', 'K/km', 'K/hm', 'J/kg', 'kJ/kg', 'J/(kg.K)', 'kJ/(kg.K)', 'kg/m3', 'g/m3', 'm3/kg', 'g/kg', '%', '[ppth]', 's-1', 's-2', 'K/s', 'K/h', 'Pa/s', 'hPa/h', 'deg', 'rad']
const pairs = codes.flatMap(from => codes.filter(to => to !== from && isCommensurable(getUnit(from), getUnit(to))).map(to => [from, to] as const))
const decimals = fc.tuple(fc.integer({ min: -9_999_999, max: 9_999_999 }), fc.integer({ min: 0, max: 6 })).map(([whole, places]) => (whole / 10 ** places).toFixed(places))

describe('a value in one unit, put into another and back', () => {
  it('goes through every pair of a kind that there is', () => expect(pairs.length).toBeGreaterThan(150))
  it.each(pairs)('%s by way of %s is the same to the last digit, as a value and as a difference', (from, to) => {
    fc.assert(fc.property(decimals, fc.boolean(), (text, isDifference) => {
      const value = fromDecimal(text)
      if (!value) throw new Error(text)
      const there = fromSi(toSi(value, getUnit(from), isDifference), getUnit(to), isDifference)
      expect(compare(fromSi(toSi(there, getUnit(to), isDifference), getUnit(from), isDifference), value)).toBe(0)
    }), { numRuns: 20 })
  })
})

/** Every unit of the kinds in which quantities are asked. */
const asks = [...new Map(quantities.filter(one => one.kind !== 'class').map(({ shownUnit, kind, name }) => [`${shownUnit} ${kind}`, { unit: shownUnit, kind, quantityName: name } satisfies Ask])).values()]

/** Below absolute zero a temperature is told as such and not read. */
const isAboveZero = (text: string, unit: string): boolean => compare(toSi(fromDecimal(text) ?? rational(0n), getUnit(unit), false), rational(0n)) > 0

describe('a number typed with the unit that an answer shows', () => {
  it.each(asks.map(ask => [ask.unit, ask.kind, ask] as const))('in %s (%s) is read as that number', (unit, kind, ask) => {
    fc.assert(fc.property(decimals, (text) => {
      fc.pre(kind !== 'temperature' || isAboveZero(text, unit))
      const read = readQuantity(`${text} ${formatUnit(unit)}`, ask)
      expect(read.reading, read.message).toBe('ok')
      const exact = toSi(fromDecimal(text) ?? rational(0n), getUnit(unit), kind !== 'temperature')
      expect(read.valueSi).toBe(toDouble(exact))
      expect(read.decimal === null ? NaN : Number(read.decimal)).toBe(Number(text))
    }), { numRuns: 20 })
  })
  it.each(asks.flatMap(ask => codes.filter(code => code !== ask.unit && code !== '1' && isCommensurable(getUnit(code), getUnit(ask.unit))).map(code => [code, ask.unit, ask.kind, ask] as const)))('%s for %s (%s) is the same value', (code, unit, kind, ask) => {
    fc.assert(fc.property(decimals, (text) => {
      fc.pre(kind !== 'temperature' || isAboveZero(text, unit))
      const isDifference = kind !== 'temperature', value = fromDecimal(text) ?? rational(0n)
      // in the other unit, to forty digits as an exact value is kept
      const shown = fromSi(toSi(value, getUnit(unit), isDifference), getUnit(code), isDifference)
      const read = readQuantity(`${toDecimal(shown, 40)} ${formatUnit(code)}`, ask)
      expect(read.reading, read.message).toBe('ok')
      const got = fromDouble(read.valueSi ?? NaN), right = toSi(value, getUnit(unit), isDifference)
      expect(compare(absolute(minus(got, right)), times(absolute(right), rational(1n, 1_000_000_000_000n)))).toBeLessThanOrEqual(0)
    }), { numRuns: 10 })
  })
})
