import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { judgeTyped, kelvins, reading, setS, stepOf } from '../../fixtures/marking/ask'
import { checkBand } from '#shared/marking/proof'
import { readQuantity } from '#shared/units/readQuantity'

const rate = (typed: string) => readQuantity(typed, { unit: 'K/km', kind: 'difference', quantityName: 'lapse rate' })
const temperature = (typed: string, unit = 'Cel') => readQuantity(typed, { unit, kind: 'temperature', quantityName: 'temperature' })
const pressure = (typed: string) => readQuantity(typed, { unit: 'hPa', kind: 'ratio', quantityName: 'pressure' })
const humidity = (typed: string, unit = '%') => readQuantity(typed, { unit, kind: 'fraction', quantityName: 'relative humidity' })
const energy = (typed: string) => readQuantity(typed, { unit: 'kJ/kg', kind: 'difference', quantityName: 'heat' })

describe('traps U: entry, units, digits', () => {
  it('U1: °C/km equals K/km; 5 °C is 5 K as a difference and 278.15 K as a temperature', () => {
    expect(rate('9.8 °C/km')).toMatchObject({ reading: 'ok', decimal: '9.8' })
    expect(readQuantity('5 °C', { unit: 'K', kind: 'difference', quantityName: 'difference' })).toMatchObject({ decimal: '5', valueSi: 5 })
    expect(temperature('5 °C', 'K')).toMatchObject({ decimal: '278.15', valueSi: 278.15 })
  })
  it.each(['0.98 K/100 m', '0.98 °C/100m', '0.98 K hm^-1', '0.98 K per 100 m', '0.98 K (100 m)⁻¹', '0.98 K/(100 m)'])('U2: "%s" is 9.8 K/km', (typed) => {
    expect(rate(typed)).toMatchObject({ reading: 'ok', decimal: '9.8' })
  })
  it('U3: 5.38 °F/1000 ft is a difference: 9.806 K/km', () => {
    expect(Number(rate('5.38 °F/1000 ft').decimal)).toBeCloseTo(9.806, 3)
    expect(Number(rate('5.377 °F/1000 ft').decimal)).toBeCloseTo(9.8, 2)
  })
  it('U4: 0.01 K/m is 10 K/km and its half unit of 5 K/km widens nothing: wrong with 6.5 as reference', () => {
    const layer = { height: [0, 100, 200], temperature: kelvins(15, 14.35, 13.7) }
    expect(rate('0.01 K/m')).toMatchObject({ decimal: '10', halfUnitSi: 0.005 })
    expect(judgeTyped(stepOf('lapse-rate-least-squares', layer), '0.01 K/m').isAccepted).toBe(false)
  })
  it('U5: 10 has two digits in the student’s favor, and is never ± 5', () => {
    expect(rate('10')).toMatchObject({ digits: 2, halfUnitSi: 0.0005 })
  })
  it('U6: an edge is in the band: |9.7 − 9.8| ≤ 0.1 although doubles deny it', () => {
    expect(Math.abs(9.7 - 9.8) <= 0.1).toBe(false)
    const layer = { height: [0, 1000], temperature: [290, 280.2] }
    const step = stepOf('lapse-rate-end-points', layer, { granted: { absoluteSi: 0.000095 } })
    // 9.8 ± (0.095 granted + 0.005 rounding)
    expect(judgeTyped(step, '9.7').isAccepted).toBe(true)
    expect(judgeTyped(step, '9.9').isAccepted).toBe(true)
    expect(judgeTyped(step, '9.699999').isAccepted).toBe(false)
    expect(judgeTyped(step, '9.900001').isAccepted).toBe(false)
  })
  it('U7: 1,013 hPa is asked; 1.013,25, 1 013,25 with any space and 9,8 are read', () => {
    expect(pressure('1,013 hPa')).toMatchObject({ reading: 'ambiguous', valueSi: null })
    expect(pressure('1,013 hPa').message).toContain('1013 or 1.013')
    for (const typed of ['1.013,25 hPa', '1 013,25 hPa', '1\u202F013,25 hPa', '1\u00A0013,25 hPa', '1\u2009013.25 hPa', '1,013.25 hPa', '1013,25', '1’013.25 hPa']) expect(pressure(typed), typed).toMatchObject({ reading: 'ok', decimal: '1013.25' })
    expect(rate('9,8')).toMatchObject({ decimal: '9.8' })
    expect(rate('0,985')).toMatchObject({ decimal: '0.985' })
  })
  it('U8: U+2212, raised digits, powers of ten, notebooks and copied units are read', () => {
    for (const [typed, decimal] of [['−6.5 K/km', '-6.5'], ['9.8 K km⁻¹', '9.8'], ['9.8×10⁻³ K m⁻¹', '9.8'], ['np.float64(9.77)', '9.77'], ['9.77 K·km⁻¹', '9.77'], ['[9.77]', '9.77'], ['\'9.77', '9.77'], ['Γ = 9.77 K/km', '9.77'], ['9.8 K km^{-1}', '9.8'], ['9.8e-3 K m**-1', '9.8'], ['9.8 K/km.', '9.8'], ['98e-1', '9.8'], ['０.98×10^1', '9.8']] as const) {
      expect(rate(typed), typed).toMatchObject({ reading: 'ok', decimal })
    }
    for (const typed of ['2.5×10^6 J/kg', '2.5×10⁶ J/kg', '2.5e6 J kg-1', '2.5 x 10^6 J·kg⁻¹', '2.5 MJ/kg', '2500']) expect(energy(typed), typed).toMatchObject({ reading: 'ok', decimal: '2500' })
  })
  it('U8: what a spreadsheet leaves behind is named as what it is', () => {
    expect(rate('#DIV/0!').message).toContain('a division by zero')
    expect(rate('#VALUE!').message).toContain('spreadsheet’s error')
    expect(rate('9-Aug').message).toContain('is a date')
    expect(rate('Aug-09').message).toContain('is a date')
    expect(rate('8/9/2026').message).toContain('is a date')
    expect(rate('1e999').message).toContain('too large')
    expect(rate('1e-999').message).toContain('too small')
    expect(rate('NaN').message).toContain('missing number')
    expect(rate('Infinity').message).toContain('division by zero')
    expect(rate('=A1/B2').message).toContain('formula')
    for (const typed of ['#DIV/0!', '9-Aug', '1e999', 'NaN', 'Infinity', '-inf', '=A1/B2', '0x10', '####']) expect(rate(typed), typed).toMatchObject({ reading: 'unreadable', valueSi: null, decimal: null })
  })
  it('U9: long digits from a notebook are read whole', () => expect(rate('9.765625000001')).toMatchObject({ decimal: '9.765625000001', digits: 13 }))
  it('U10: trailing zeros count', () => {
    expect(rate('9.80').digits).toBe(3)
    expect(rate('0.00980 K/m').digits).toBe(3)
    expect(rate('9.80').message).toBe('read as 9.80 K km⁻¹')
  })
  it('U11: a bare 15 is asked where °C or K is possible; 288.15 K is accepted for °C', () => {
    expect(temperature('15')).toMatchObject({ reading: 'ambiguous' })
    expect(temperature('15').message).toBe('15: in °C or in K? Type the unit with it.')
    expect(temperature('288.15 K')).toMatchObject({ reading: 'ok', decimal: '15' })
    expect(temperature('-300 °C').message).toContain('absolute zero')
  })
  it('U12: 55 % is read, a bare 0.55 is asked', () => {
    expect(humidity('55 %')).toMatchObject({ reading: 'ok', valueSi: 0.55 })
    expect(humidity('55%')).toMatchObject({ reading: 'ok', valueSi: 0.55 })
    expect(humidity('55')).toMatchObject({ reading: 'ok', valueSi: 0.55 })
    expect(humidity('0.55')).toMatchObject({ reading: 'ambiguous' })
    expect(humidity('0.55', '1')).toMatchObject({ reading: 'ambiguous' })
  })
  it('U13: mb is hPa, kt a knot, C °C; hpa, Kg, M and k are tolerated where one unit fits', () => {
    for (const typed of ['1013.25 mb', '1013.25 hpa', '1013.25 HPA', '101325 pa', '1013.25 mbar']) expect(pressure(typed), typed).toMatchObject({ decimal: '1013.25' })
    expect(temperature('15 C')).toMatchObject({ decimal: '15' })
    expect(rate('9.8 k/KM')).toMatchObject({ decimal: '9.8' })
    expect(rate('0.0098 K/M')).toMatchObject({ decimal: '9.8' })
    expect(energy('25.1 kJ/Kg')).toMatchObject({ decimal: '25.1' })
    expect(Number(readQuantity('10 kt', { unit: 'm/s', kind: 'ratio', quantityName: 'wind speed' }).decimal)).toBeCloseTo(5.1444, 4)
    // MPa and mPa differ: neither is guessed
    expect(pressure('0.1 mpa').reading).toBe('unreadable')
  })
  it('U14: rounding is half a unit of the last digit asked, in the asked unit', () => {
    const { band } = judgeTyped(stepOf('lapse-rate-least-squares', setS), '')
    expect(band?.parts).toEqual([{ key: 'rounding', label: 'rounding at the digits asked', below: 0.00005, above: 0.00005 }])
  })
  it('U17: the accuracy of sensors is no part of a band: 7.0 is not accepted for 9.8 over 100 m', () => {
    const layer = { height: [0, 100], temperature: [290, 289.02] }
    expect(judgeTyped(stepOf('lapse-rate-end-points', layer), '7.0').isAccepted).toBe(false)
  })
  it('U18: formula spread is one-sided: the hull of Γd is 9.751 to 9.80', () => {
    const { band } = judgeTyped(stepOf('dry-adiabatic-lapse-rate', {}), '')
    const hull = band?.parts.find(part => part.key === 'formulae')
    expect((band?.center ?? 0) * 1000 - (hull?.below ?? 0) * 1000).toBeCloseTo(9.751, 3)
    expect((band?.center ?? 0) * 1000 + (hull?.above ?? 0) * 1000).toBeCloseTo(9.8, 9)
  })
  it('U19: a band wider than half the way to the nearest slip is refused before posting, with the slip', () => {
    const dry = stepOf('dry-adiabatic-lapse-rate', {}, { granted: { absoluteSi: 0.002 } })
    const { ok, reasons } = checkBand(dry)
    expect(ok).toBe(false)
    expect(reasons.join(' ')).toMatch(/more than half the way from .* which is the slip “6.5 K km⁻¹”/)
    expect(checkBand(stepOf('dry-adiabatic-lapse-rate', {}, { granted: { absoluteSi: 0.0005 } }))).toEqual({ ok: true, reasons: [] })
  })
  it('the wrong dimension is named in a sentence, with what is asked', () => {
    expect(rate('9.8 K').message).toBe('K is a temperature; the lapse rate is a temperature per length, such as K km⁻¹.')
    expect(rate('9.8 hPa/km').reading).toBe('wrong_dimension')
    expect(reading('lapse-rate-least-squares', '9.8 K/s').reading).toBe('wrong_dimension')
  })
  it('words that are answers are read as such', () => {
    expect(rate('none').reading).toBe('none')
    expect(rate('Not reached.').reading).toBe('not_reached')
    expect(rate('not defined').reading).toBe('not_defined')
    expect(rate('  ').reading).toBe('empty')
  })
  it('lengths have limits, and nothing typed throws', () => {
    expect(rate('9'.repeat(201))).toMatchObject({ reading: 'unreadable' })
    expect(rate('9'.repeat(100))).toMatchObject({ reading: 'unreadable' })
    fc.assert(fc.property(fc.oneof(fc.string({ maxLength: 60 }), fc.string({ unit: 'binary', maxLength: 40 }), fc.stringMatching(/^[0-9.,eE+\-^*/() KkmCJgPa°⁻¹×%]{0,30}$/)), (typed) => {
      const read = rate(typed)
      if (read.reading === 'ok') {
        expect(Number.isFinite(read.valueSi)).toBe(true)
        expect(read.decimal).toMatch(/^-?\d+(\.\d+)?$/)
      }
      else expect(read.valueSi).toBeNull()
    }), { numRuns: 2000 })
  })
  it('a value survives every unit it is typed in', () => {
    fc.assert(fc.property(fc.integer({ min: -40_000, max: 40_000 }), (thousandths) => {
      const value = thousandths / 1000
      for (const typed of [`${value} K/km`, `${value / 10} K/100 m`, `${value} °C km^-1`, `${String(value).replace('.', ',')} K km⁻¹`.replace(/^(-?\d{1,3}),(\d{3}) /, '$1,$20 ')]) {
        const read = rate(typed)
        if (read.reading === 'ok') expect(Math.abs((read.valueSi ?? 0) - value / 1000)).toBeLessThan(1e-15)
        else expect(read.reading).toBe('ambiguous')
      }
    }))
  })
})
