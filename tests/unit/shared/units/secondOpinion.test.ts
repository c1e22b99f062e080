import { createRequire } from 'node:module'
import { describe, expect, it } from 'vitest'
import { toDouble } from '#shared/numerics/rational'
import { quantities } from '#shared/thermo/registry'
import { readQuantity, type Ask } from '#shared/units/readQuantity'
import { findUnit, getUnit, isCommensurable } from '#shared/units/ucum'

/** @lhncbc/ucum-lhc, a reader of UCUM codes that shares nothing with ours. */
interface Converted { status: string, toVal: number | null }
interface Reader { convertUnitTo: (from: string, value: number, to: string) => Converted }
const loaded: { UcumLhcUtils: { getInstance: () => Reader } } = createRequire(import.meta.url)('@lhncbc/ucum-lhc')
const reader = loaded.UcumLhcUtils.getInstance()

function converted(from: string, value: number, to: string): number {
  const { status, toVal } = reader.convertUnitTo(from, value, to)
  if (status !== 'succeeded' || toVal === null) throw new Error(`${from} to ${to}: ${status}`)
  return toVal
}
const near = (got: number, wanted: number, relative = 1e-9) => expect(Math.abs(got - wanted), `${got} for ${wanted}`).toBeLessThanOrEqual(relative * Math.abs(wanted) + 1e-300)

const siOf: readonly [string, readonly string[]][] = [
  ['m', ['km', 'hm', 'dam', 'cm', 'mm', 'um', '[ft_i]', '[in_i]', '[mi_i]', '[nmi_i]']], ['kg', ['g', 'mg', 'ug', '[lb_av]']], ['s', ['ms', 'min', 'h', 'd']],
  ['Pa', ['hPa', 'kPa', 'MPa', 'mPa', 'daPa', 'bar', 'mbar', 'atm', 'mm[Hg]', '[in_i\'Hg]', '[psi]']], ['J', ['kJ', 'MJ', 'GJ', 'mJ', 'cal', 'kcal']], ['W', ['kW', 'MW', 'mW']], ['N', ['kN']], ['m3', ['L', 'mL']],
  ['m/s', ['km/h', '[kn_i]', '[mi_i]/h']], ['1', ['%', '[ppth]', '[ppm]']], ['rad', ['deg']], ['mol', ['kmol', 'mmol']],
  ['K/m', ['K/km', 'K/hm', 'mK/m']], ['J/(kg.K)', ['kJ/(kg.K)', 'J/kg/K', 'J.kg-1.K-1', 'cal/(g.K)']], ['W/m2', ['kW/m2', 'J/(s.m2)']], ['Pa/s', ['hPa/h']], ['K/s', ['K/h', 'K/d']],
]

describe('UCUM codes, beside a second reader', () => {
  it.each(siOf.flatMap(([si, codes]) => codes.map(code => [code, si] as const)))('one %s is as many %s', (code, si) => {
    const ours = getUnit(code), base = getUnit(si)
    expect(isCommensurable(ours, base)).toBe(true)
    near(toDouble(ours.factor) / toDouble(base.factor), converted(code, 1, si))
  })
  it.each([['Cel', 20], ['Cel', -40], ['[degF]', 68], ['[degF]', -459.67]] as const)('%s at %d is as many kelvin', (code, value) => {
    const unit = getUnit(code)
    expect(Math.abs(toDouble(unit.factor) * value + toDouble(unit.offset) - converted(code, value, 'K'))).toBeLessThan(1e-9)
  })
  it('reads every unit of every quantity as we do, inside and shown', () => {
    const pairs = new Set(quantities.flatMap(one => [one, ...one.inputs]).filter(one => one.unit !== '1' && one.kind !== 'temperature').map(one => `${one.shownUnit} ${one.unit}`))
    expect(pairs.size).toBeGreaterThan(10)
    for (const pair of pairs) {
      const [shown = '', si = ''] = pair.split(' ')
      near(toDouble(getUnit(shown).factor) / toDouble(getUnit(si).factor), converted(shown, 1, si))
    }
  })
  it.each(['foo', 'K//m', 'm^2', '(m', 'K/', 'Kelvins', 'kkm'])('neither of us takes “%s” for a code', (code) => {
    expect(findUnit(code)).toBeNull()
    expect(reader.convertUnitTo(code, 1, code).status).not.toBe('succeeded')
  })
})

const rate: Ask = { unit: 'K/km', kind: 'difference', quantityName: 'lapse rate' }
const heat: Ask = { unit: 'J/(kg.K)', kind: 'ratio', quantityName: 'specific heat' }
const latent: Ask = { unit: 'J/kg', kind: 'ratio', quantityName: 'latent heat' }
const pressure: Ask = { unit: 'hPa', kind: 'ratio', quantityName: 'pressure' }
const wind: Ask = { unit: 'm/s', kind: 'ratio', quantityName: 'wind speed' }

/** As people type it: number and unit apart, so that the second reader converts the same number. */
const typedForms: readonly [string, number, Ask][] = [
  ['9.8 K/km', 9.8, rate], ['0.0098 °C m^-1', 0.0098, rate], ['0.0098 °C m⁻¹', 0.0098, rate], ['0.98 K/100 m', 0.98, rate], ['0.98 °C/100m', 0.98, rate], ['0.98 K/(100 m)', 0.98, rate], ['9.8 K per km', 9.8, rate], ['5.38 °F/1000 ft', 5.38, rate], ['−6.5 K km⁻¹', -6.5, rate], ['9,8 K/km', 9.8, rate], ['9.8 K·km⁻¹', 9.8, rate], ['0.98 K hm-1', 0.98, rate], ['9.8 K km**-1', 9.8, rate],
  ['1004 J kg-1 K-1', 1004, heat], ['1004 J/(kg K)', 1004, heat], ['1004 J/kg/K', 1004, heat], ['1004 J/kg K', 1004, heat], ['1004 J kg⁻¹ K⁻¹', 1004, heat], ['1.004 kJ/(kg·K)', 1.004, heat], ['0.24 cal/(g °C)', 0.24, heat], ['1004 J/(kg.K)', 1004, heat],
  ['2.5×10^6 J/kg', 2.5e6, latent], ['2.5×10⁶ J·kg⁻¹', 2.5e6, latent], ['2.5 MJ/kg', 2.5, latent], ['2.5e6 J kg^-1', 2.5e6, latent], ['2 500 000 J/kg', 2.5e6, latent], ['2\u202F500\u202F000 J/kg', 2.5e6, latent], ['597 cal/g', 597, latent],
  ['1013.25 mb', 1013.25, pressure], ['101325 Pa', 101_325, pressure], ['29.92 inHg', 29.92, pressure], ['760 mmHg', 760, pressure], ['1 atm', 1, pressure], ['14.7 psi', 14.7, pressure], ['1.013,25 hPa', 1013.25, pressure], ['1\u00A0013,25 hPa', 1013.25, pressure],
  ['10 kt', 10, wind], ['36 km/h', 36, wind], ['22 mph', 22, wind], ['10 m s-1', 10, wind], ['10 m/s', 10, wind],
]

describe('what people type, and what a second reader makes of the code that we read', () => {
  it.each(typedForms)('“%s”', (typed, number, ask) => {
    const read = readQuantity(typed, ask)
    expect(read.reading, read.message).toBe('ok')
    // what is stored can be read again
    expect(findUnit(read.unitUcum ?? ''), read.unitUcum ?? '').not.toBeNull()
    near(Number(read.decimal), converted(read.unitUcum ?? '', number, ask.unit))
  })
  it('a temperature or a difference by the question', () => {
    const asTemperature = readQuantity('5 °F', { unit: 'K', kind: 'temperature', quantityName: 'temperature' }), asDifference = readQuantity('5 °F', { unit: 'K', kind: 'difference', quantityName: 'difference' })
    expect(Math.abs(Number(asTemperature.decimal) - converted('[degF]', 5, 'K'))).toBeLessThan(1e-9)
    near(Number(asDifference.decimal), converted('[degF]', 5, 'K') - converted('[degF]', 0, 'K'))
  })
  it('what could be two things is asked, and what is none is named', () => {
    expect(readQuantity('1,013 hPa', pressure).reading).toBe('ambiguous')
    expect(readQuantity('0.55', { unit: '%', kind: 'fraction', quantityName: 'relative humidity' }).reading).toBe('ambiguous')
    for (const [typed, named] of [['#DIV/0!', 'division by zero'], ['9-Aug', 'a date'], ['1e999', 'too large']] as const) expect(readQuantity(typed, rate)).toMatchObject({ reading: 'unreadable', message: expect.stringContaining(named) })
    expect(readQuantity(`9.8 ${'K'.repeat(300)}`, rate)).toMatchObject({ reading: 'unreadable', message: expect.stringContaining('Too long') })
    expect(readQuantity(`9.8 K/km${'/m'.repeat(90)}`, rate).reading).toBe('unreadable')
  })
  it.each([['1004 J/kg', heat, 'an energy per mass'], ['9.8 m/s2', rate, 'an acceleration'], ['3 W/kg', rate, 'a power per mass'], ['2 hPa/h', pressure, 'a pressure per time']] as const)('“%s” is named by its dimension', (typed, ask, dimension) => {
    expect(readQuantity(typed, ask)).toMatchObject({ reading: 'wrong_dimension', message: expect.stringContaining(dimension) })
  })
})
