import { describe, expect, it } from 'vitest'
import { marksText, numberText, supParts, unitText } from '../../../components/sheet/unitText'

describe('numbers and units as they are set', () => {
  it.each([
    ['K/km', 'K\u202fkm^-1'], ['K.km-1', 'K\u202fkm^-1'], ['m/s', 'm\u202fs^-1'], ['m/s2', 'm\u202fs^-2'], ['m2.s-2', 'm^2\u202fs^-2'], ['W/m2', 'W\u202fm^-2'],
    ['Cel', '°C'], ['[degF]', '°F'], ['hPa', 'hPa'], ['%', '%'], ['g/kg', 'g\u202fkg^-1'], ['1', ''], ['J/(kg.K)', 'J\u202fkg^-1\u202fK^-1'], ['J/kg/K', 'J\u202fkg^-1\u202fK^-1'], ['K/km.s', 'K\u202fkm^-1\u202fs'], ['/s', 's^-1'], ['K km^-1', 'K\u202fkm^-1'], ['Cel/km', '°C\u202fkm^-1'],
  ])('writes %s as %s', (ucum, written) => expect(unitText(ucum)).toBe(written))

  it('raises exponents however they were written', () => {
    expect(supParts('−9.6 K km⁻¹')).toEqual([{ text: '−9.6 K km', raised: false }, { text: '−1', raised: true }])
    expect(supParts('m^2 s^-2')).toEqual([{ text: 'm', raised: false }, { text: '2', raised: true }, { text: ' s', raised: false }, { text: '−2', raised: true }])
  })

  it('uses the true minus, never before a zero, and groups from five digits on', () => {
    expect(numberText(-9.62, 1)).toBe('−9.6')
    expect(numberText(-0.04, 1)).toBe('0.0')
    expect(numberText(1040, 0)).toBe('1040')
    expect(numberText(101325, 1)).toBe('101\u202f325.0')
  })

  it('shows thousandths of a mark without idle zeros', () => {
    expect([2500, 3000, 1, 0, 333].map(marksText)).toEqual(['2.5', '3', '0.001', '0', '0.333'])
  })
})
