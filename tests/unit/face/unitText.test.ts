import { describe, expect, it } from 'vitest'
import { marksText, numberText, textParts, unitText } from '../../../components/sheet/unitText'

describe('numbers and units as they are set', () => {
  it.each([
    ['K/km', 'K\u202fkm^-1'], ['K.km-1', 'K\u202fkm^-1'], ['m/s', 'm\u202fs^-1'], ['m/s2', 'm\u202fs^-2'], ['m2.s-2', 'm^2\u202fs^-2'], ['W/m2', 'W\u202fm^-2'],
    ['Cel', '°C'], ['[degF]', '°F'], ['hPa', 'hPa'], ['%', '%'], ['g/kg', 'g\u202fkg^-1'], ['1', ''], ['J/(kg.K)', 'J\u202fkg^-1\u202fK^-1'], ['J/kg/K', 'J\u202fkg^-1\u202fK^-1'], ['K/km.s', 'K\u202fkm^-1\u202fs'], ['/s', 's^-1'], ['K km^-1', 'K\u202fkm^-1'], ['Cel/km', '°C\u202fkm^-1'],
  ])('writes %s as %s', (ucum, written) => expect(unitText(ucum)).toBe(written))

  it('raises exponents however they were written', () => {
    expect(textParts('−9.6 K km⁻¹')).toEqual([{ text: '−9.6 K km', set: 'line' }, { text: '−1', set: 'raised' }])
    expect(textParts('m^2 s^-2')).toEqual([{ text: 'm', set: 'line' }, { text: '2', set: 'raised' }, { text: ' s', set: 'line' }, { text: '−2', set: 'raised' }])
  })

  it('lowers the index of a symbol, and leaves the underscores of names', () => {
    const lowered = (line: string) => textParts(line).filter(part => part.set === 'lowered').map(part => part.text)
    expect(textParts('T_d')).toEqual([{ text: 'T', set: 'line' }, { text: 'd', set: 'lowered' }])
    expect(lowered('CAPE = R ∫ (T_p − T_e) d ln p, Ri_B, γ_min, u_*, dT_i/dt, θ_s(z)')).toEqual(['p', 'e', 'B', 'min', '*', 'i', 's'])
    expect(lowered('flight_a.csv a_longer x_1_2 air_temperature _x')).toEqual([])
    expect(textParts('a flight_a b').map(part => part.text).join('')).toBe('a flight_a b')
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
