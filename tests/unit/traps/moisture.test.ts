import { describe, expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Formulae, Inputs, Outcome } from '#shared/thermo/definition'
import { evaluateQuantity, plainFormulae } from '#shared/thermo/evaluate'
import { findQuantity } from '#shared/thermo/registry'
import { judgeTyped, reading, stepOf } from '../../fixtures/marking/ask'

const constants = defaultConvention.constants
const K = (celsius: number) => Number((celsius + 273.15).toFixed(6))
function outcome(quantity: string, inputs: Inputs, variant?: string, formulae: Formulae = plainFormulae): Outcome {
  const definition = findQuantity(quantity)
  if (!definition) throw new Error(quantity)
  return evaluateQuantity(definition, inputs, constants, variant, formulae)
}
function value(quantity: string, inputs: Inputs, variant?: string, formulae?: Formulae): number {
  const found = outcome(quantity, inputs, variant, formulae)
  return found.is === 'value' ? found.value : NaN
}
const notesOf = (found: Outcome): string => ('notes' in found ? found.notes ?? [] : []).join(' ')
const slipOf = (quantity: string, inputs: Inputs, key: string): number => judgeTyped(stepOf(quantity, inputs), '').slipValues.find(slip => slip.key === key)?.value ?? NaN
const askOf = (quantity: string): string => findQuantity(quantity)?.ask ?? ''
const constantHeat: Formulae = { ...plainFormulae, variants: { 'latent-heat-of-vaporization': 'constant' } }

describe('traps M: moisture', () => {
  it('M1: below 0 °C liquid water is the default, ice only when asked: −10 °C 2.87 and 2.60 hPa; 90 % over water is 99.4 % over ice', () => {
    expect(value('saturation-vapor-pressure', { temperature: K(-10) }) / 100).toBeCloseTo(2.87, 2)
    expect(value('saturation-vapor-pressure-over-ice', { temperature: K(-10) }) / 100).toBeCloseTo(2.60, 2)
    expect(askOf('saturation-vapor-pressure')).toContain('liquid water')
    expect(askOf('relative-humidity')).toContain('over liquid water')
    const dewpoint = value('dewpoint-from-relative-humidity', { temperature: K(-10), relativeHumidity: 0.9 })
    expect(Math.abs(100 * value('relative-humidity-over-ice', { temperature: K(-10), dewpoint }) - 99.4)).toBeLessThan(0.25)
  })
  it('M2: dewpoint and frost point are two quantities: −10 °C, 70 %: −14.4 and −12.9 °C; each names the other as a slip', () => {
    const air = { temperature: K(-10), relativeHumidity: 0.7 }
    expect(value('dewpoint-from-relative-humidity', air) - 273.15).toBeCloseTo(-14.4, 1)
    expect(value('frost-point-from-relative-humidity', air) - 273.15).toBeCloseTo(-12.9, 1)
    expect(judgeTyped(stepOf('dewpoint-from-relative-humidity', air), '-12.9 °C')).toMatchObject({ isAccepted: false, slip: { key: 'frost-point' } })
    expect(judgeTyped(stepOf('frost-point-from-relative-humidity', air), '-14.4 °C')).toMatchObject({ isAccepted: false, slip: { key: 'dewpoint' } })
    expect(outcome('frost-point-from-relative-humidity', { temperature: K(20), relativeHumidity: 0.7 }).is).toBe('not_defined')
  })
  it('M3: e/es and w/ws are two quantities: 30 °C, 1000 hPa, e/es 50 %: w/ws 48.9 %, accepted for neither', () => {
    const dewpoint = value('dewpoint-from-relative-humidity', { temperature: K(30), relativeHumidity: 0.5 })
    expect(100 * value('relative-humidity', { temperature: K(30), dewpoint })).toBeCloseTo(50, 6)
    expect(100 * value('relative-humidity-by-mixing-ratio', { pressure: 100_000, temperature: K(30), dewpoint })).toBeCloseTo(48.9, 1)
    expect(judgeTyped(stepOf('relative-humidity', { temperature: K(30), dewpoint }), '48.9 %').isAccepted).toBe(false)
    expect(judgeTyped(stepOf('relative-humidity-by-mixing-ratio', { pressure: 100_000, temperature: K(30), dewpoint }), '50.0 %')).toMatchObject({ isAccepted: false, slip: { key: 'vapor-pressures' } })
  })
  it('M4: w is not q: 15 g/kg of w are 14.778 g/kg of q; the moist static energy takes q', () => {
    expect(1000 * value('specific-humidity', { mixingRatio: 0.015 })).toBeCloseTo(14.778, 3)
    expect(judgeTyped(stepOf('specific-humidity', { mixingRatio: 0.015 }), '15.0 g/kg')).toMatchObject({ isAccepted: false, slip: { key: 'mixing-ratio' } })
    expect(askOf('moist-static-energy')).toContain('specific humidity')
  })
  it('M5: w in kg/kg, the virtual factor on kelvin: 30 °C, 20 g/kg: 33.61 exact, 33.70 with 0.61 w, 30.37 by °C', () => {
    const air = { temperature: K(30), mixingRatio: 0.02 }
    expect(value('virtual-temperature', air) - 273.15).toBeCloseTo(33.61, 2)
    expect(value('virtual-temperature', air, 'linear') - 273.15).toBeCloseTo(33.70, 2)
    expect(slipOf('virtual-temperature', air, 'celsius-for-kelvin') - 273.15).toBeCloseTo(30.36, 1)
    expect(judgeTyped(stepOf('virtual-temperature', air, { digits: 4 }), '33.70 °C').isAccepted).toBe(false)
    expect(judgeTyped(stepOf('virtual-temperature', air, { digits: 4, convention: { ...defaultConvention, variants: { 'virtual-temperature': 'linear' } } }), '33.70 °C').isAccepted).toBe(true)
  })
  it('M6: vapor is averaged, not RH or dewpoint: (10 °C, 90 %) and (30 °C, 30 %) have Td 9.53 °C from the mean e; 12.01 from mean T and RH; 9.50 from mean Td', () => {
    const mixture = { massFirst: 1, temperatureFirst: K(10), relativeHumidityFirst: 0.9, massSecond: 1, temperatureSecond: K(30), relativeHumiditySecond: 0.3, pressure: 100_000 }
    const fromMean = value('dewpoint', { vaporPressure: value('isobaric-mixing-vapor-pressure', mixture, 'mean-vapor-pressure') })
    expect(Math.abs(fromMean - 273.15 - 9.53)).toBeLessThan(0.12)
    expect(Math.abs(value('dewpoint', { vaporPressure: value('isobaric-mixing-vapor-pressure', mixture) }) - 273.15 - 9.53)).toBeLessThan(0.12)
    const fromHumidity = value('dewpoint', { vaporPressure: slipOf('isobaric-mixing-vapor-pressure', mixture, 'mean-humidity') })
    expect(Math.abs(fromHumidity - 273.15 - 12.01)).toBeLessThan(0.12)
    const meanDewpoint = (value('dewpoint-from-relative-humidity', { temperature: K(10), relativeHumidity: 0.9 }) + value('dewpoint-from-relative-humidity', { temperature: K(30), relativeHumidity: 0.3 })) / 2
    expect(Math.abs(meanDewpoint - 273.15 - 9.50)).toBeLessThan(0.12)
  })
  it('M7: RH 100–104 % and a dewpoint just above the temperature are kept, noted, and judged; the level of condensation is then the start', () => {
    const fog = { temperature: K(8), relativeHumidity: 1.03 }
    expect(value('dewpoint-from-relative-humidity', fog)).toBeGreaterThan(K(8))
    expect(notesOf(outcome('dewpoint-from-relative-humidity', fog))).toContain('Supersaturated')
    const sonde = { pressure: 98_000, temperature: K(8), dewpoint: K(8.2) }
    expect(100 * value('relative-humidity', { temperature: K(8), dewpoint: K(8.2) })).toBeGreaterThan(100)
    expect(notesOf(outcome('relative-humidity', { temperature: K(8), dewpoint: K(8.2) }))).toContain('Supersaturated')
    for (const [quantity, is] of [['lifting-condensation-level-temperature', K(8)], ['lifting-condensation-level-pressure', 98_000], ['lifting-condensation-level-height', 0]] as const) {
      for (const { key } of findQuantity(quantity)?.variants ?? []) {
        const found = outcome(quantity, sonde, key)
        expect(found.is === 'value' ? found.value : NaN).toBeCloseTo(is, 6)
        expect(notesOf(found)).toContain('dewpoint lies above the temperature')
      }
    }
    for (const quantity of ['equivalent-potential-temperature', 'wet-bulb-temperature', 'wet-bulb-potential-temperature', 'pseudoadiabatic-wet-bulb-temperature']) expect(outcome(quantity, sonde).is).toBe('value')
  })
  it('M8: isobaric mixing may be supersaturated, and that is the answer: 0 °C saturated with 30 °C, 80 %: 15 °C, e 20.0 hPa, RH 118 %', () => {
    const mixture = { massFirst: 1, temperatureFirst: K(0), massSecond: 1, temperatureSecond: K(30) }
    const moist = { ...mixture, relativeHumidityFirst: 1, relativeHumiditySecond: 0.8, pressure: 100_000 }
    expect(value('isobaric-mixing-temperature', mixture) - 273.15).toBeCloseTo(15, 9)
    expect(judgeTyped(stepOf('isobaric-mixing-vapor-pressure', moist), '20.0 hPa').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('isobaric-mixing-relative-humidity', moist), '118 %').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('isobaric-mixing-relative-humidity', moist), '100 %')).toMatchObject({ isAccepted: false, slip: { key: 'cut-off' } })
    expect(notesOf(outcome('isobaric-mixing-relative-humidity', moist))).toContain('Supersaturated')
  })
  it('M9: air beyond a formula’s stated range is computed with its known error said, by the next form, or refused, as the convention says; the share does not fail', () => {
    const hot = { temperature: K(40) }
    expect(notesOf(outcome('saturation-vapor-pressure', hot))).toContain('+0.14 % at 40 °C')
    expect(notesOf(outcome('relative-humidity', { temperature: K(40), dewpoint: K(20) }))).toContain('Beyond the stated range')
    expect(value('saturation-vapor-pressure', hot) / value('saturation-vapor-pressure', hot, 'wagner-pruss') - 1).toBeCloseTo(0.0013, 3)
    expect(value('saturation-vapor-pressure', hot, undefined, { variants: {}, beyond: 'next' })).toBe(value('saturation-vapor-pressure', hot, 'wmo'))
    expect(() => outcome('saturation-vapor-pressure', hot, undefined, { variants: {}, beyond: 'refuse' })).toThrow('temperature = 313.15')
    expect(judgeTyped(stepOf('saturation-vapor-pressure', hot), '73.8 hPa').isAccepted).toBe(true)
  })
  it('M10: base-10 coefficients with exp, or the reverse: es(20 °C) 23.4, slip 134 hPa', () => {
    expect(slipOf('saturation-vapor-pressure', { temperature: K(20) }, 'base-ten-for-e') / 100).toBeCloseTo(134, 0)
    expect(judgeTyped(stepOf('saturation-vapor-pressure', { temperature: K(20) }), '134 hPa')).toMatchObject({ isAccepted: false, slip: { key: 'base-ten-for-e' } })
    expect(slipOf('saturation-vapor-pressure', { temperature: K(20) }, 'e-for-base-ten') / 100).toBeCloseTo(10.9, 1)
  })
  it('M11: es(T) and es(Td) swapped: 55.08 % right, 181.7 % the slip', () => {
    const air = { temperature: K(30), dewpoint: K(20) }
    expect(Math.abs(100 * value('relative-humidity', air) - 55.08)).toBeLessThan(0.1)
    expect(Math.abs(100 * slipOf('relative-humidity', air, 'swapped') - 181.7)).toBeLessThan(0.2)
    expect(judgeTyped(stepOf('relative-humidity', air), '181.7 %')).toMatchObject({ isAccepted: false, slip: { key: 'swapped' } })
  })
  it('M12: the coefficient belongs to the ventilation: 20/15 °C, 1000 hPa: e 13.73 and 13.05 hPa, RH 58.8 and 55.8 %', () => {
    const bulbs = { pressure: 100_000, temperature: K(20), wetBulb: K(15) }
    expect(value('vapor-pressure-from-psychrometer', bulbs, 'assmann') / 100).toBeCloseTo(13.73, 2)
    expect(value('vapor-pressure-from-screen-psychrometer', bulbs) / 100).toBeCloseTo(13.05, 1)
    expect(100 * value('relative-humidity-from-psychrometer', bulbs)).toBeCloseTo(58.75, 1)
    expect(100 * value('relative-humidity-from-screen-psychrometer', bulbs)).toBeCloseTo(55.8, 1)
    expect(judgeTyped(stepOf('vapor-pressure-from-psychrometer', bulbs), '13.05 hPa')).toMatchObject({ isAccepted: false, slip: { key: 'screen' } })
    for (const typed of ['13.7', '13.73', '13.71']) expect(judgeTyped(stepOf('vapor-pressure-from-psychrometer', bulbs), typed).isAccepted, typed).toBe(true)
    const ice = { pressure: 90_000, temperature: K(-3), wetBulb: K(-4.5) }
    expect(value('vapor-pressure-from-ice-psychrometer', ice)).toBeLessThan(value('vapor-pressure-from-psychrometer', ice))
  })
  it('M13: absolute humidity is e/(Rv T) in g/m³: 20 °C saturated 17.3', () => {
    expect(1000 * value('absolute-humidity', { temperature: K(20), vaporPressure: value('saturation-vapor-pressure', { temperature: K(20) }) })).toBeCloseTo(17.3, 1)
  })
  it('M14: the height of the condensation level is above the start: 20/12 °C: 1003 m by Bolton and Γd, 1000 m by the rule, which only a convention that names it teaches', () => {
    const air = { pressure: 100_000, temperature: K(20), dewpoint: K(12) }
    expect(value('lifting-condensation-level-height', air, 'bolton')).toBeCloseTo(1003, 0)
    expect(value('lifting-condensation-level-height', air, 'espy')).toBeCloseTo(1000, 9)
    for (const typed of ['1003', '1012']) expect(judgeTyped(stepOf('lifting-condensation-level-height', air), typed).isAccepted).toBe(true)
    expect(askOf('lifting-condensation-level-height')).toContain('above the parcel’s start')
    const drier = { pressure: 100_000, temperature: K(33), dewpoint: K(5) }
    expect(judgeTyped(stepOf('lifting-condensation-level-height', drier), String(125 * 28)).isAccepted).toBe(false)
    expect(judgeTyped(stepOf('lifting-condensation-level-height', drier, { convention: { ...defaultConvention, accepted: [], variants: { 'lifting-condensation-level-height': 'espy' } } }), String(125 * 28)).isAccepted).toBe(true)
  })
  it('M15: the pressure of the condensation level uses κ and kelvin: 943 hPa, 33/28 °C: 877.0 hPa and 26.76 °C', () => {
    const air = { pressure: 94_300, temperature: K(33), dewpoint: K(28) }
    for (const variant of ['bolton', 'romps', 'solved']) {
      expect(Math.abs(value('lifting-condensation-level-pressure', air, variant) / 100 - 877.03)).toBeLessThan(1.2)
      expect(Math.abs(value('lifting-condensation-level-temperature', air, variant) - 273.15 - 26.76)).toBeLessThan(0.12)
    }
    expect(judgeTyped(stepOf('lifting-condensation-level-pressure', air), '877 hPa').isAccepted).toBe(true)
    expect(Number.isFinite(slipOf('lifting-condensation-level-pressure', air, 'celsius-for-kelvin'))).toBe(true)
  })
  it('M16: θe takes the temperature at the condensation level; θ exp(Lw/cpT) is another quantity: 850 hPa, 20/18 °C: 353.9 and 350.2 K', () => {
    const air = { pressure: 85_000, temperature: K(20), dewpoint: K(18) }
    expect(value('equivalent-potential-temperature', air)).toBeCloseTo(353.9, 1)
    expect(value('equivalent-potential-temperature-shortcut', air, undefined, constantHeat)).toBeCloseTo(350.2, 1)
    for (const typed of ['353.9 K', '353.8 K']) expect(judgeTyped(stepOf('equivalent-potential-temperature', air), typed).isAccepted).toBe(true)
    expect(judgeTyped(stepOf('equivalent-potential-temperature', air), '350.2 K')).toMatchObject({ isAccepted: false, slip: { key: 'shortcut' } })
  })
  it('M17: 6 and 6.5 K/km are no saturated rates: 4.31 at 1000 hPa, 20 °C', () => {
    const air = { pressure: 100_000, temperature: K(20) }
    expect(1000 * value('saturated-adiabatic-lapse-rate', air)).toBeCloseTo(4.31, 2)
    expect(judgeTyped(stepOf('saturated-adiabatic-lapse-rate', air), '6')).toMatchObject({ isAccepted: false, slip: { key: 'six' } })
    expect(judgeTyped(stepOf('saturated-adiabatic-lapse-rate', air), '6.5')).toMatchObject({ isAccepted: false, slip: { key: 'six-and-a-half' } })
  })
  it('M18: pseudoadiabatic and reversible are two quantities; the latent heat, constant or by temperature, is a spread: both ends are accepted over 600 hPa', () => {
    const path = { pressureStart: 100_000, temperature: K(20), pressureEnd: 40_000 }
    const linear = value('saturated-ascent-temperature', path), constant = value('saturated-ascent-temperature', path, undefined, constantHeat)
    expect(Math.abs(linear - constant)).toBeGreaterThan(0.05)
    expect(Math.abs(linear - constant)).toBeLessThan(0.7)
    for (const end of [linear, constant]) expect(judgeTyped(stepOf('saturated-ascent-temperature', path), `${(end - 273.15).toFixed(1)} °C`).isAccepted).toBe(true)
    const reversible = value('reversible-ascent-temperature', path)
    expect(reversible - linear).toBeGreaterThan(0.8)
    expect(judgeTyped(stepOf('saturated-ascent-temperature', path), `${(reversible - 273.15).toFixed(1)} °C`).isAccepted).toBe(false)
    expect(askOf('saturated-ascent-temperature')).toContain('condensed water leaves at once')
    expect(askOf('reversible-ascent-temperature')).toContain('stays in the parcel')
  })
  it('M19: 2.45, 2.50 and 2.501 MJ/kg are all taught at 20 °C, 2453.5 is what the tables say', () => {
    expect(Math.abs(value('latent-heat-of-vaporization', { temperature: K(20) }) / 1000 - 2453.5)).toBeLessThan(2.5)
    for (const typed of ['2.45 MJ/kg', '2.50 MJ/kg', '2.501 MJ/kg']) expect(judgeTyped(stepOf('latent-heat-of-vaporization', { temperature: K(20) }), typed).isAccepted, typed).toBe(true)
  })
  it('M20: the moist static energy counts from 0 K and the stated datum: 334.26 kJ/kg; from 0 °C 60.0, named and not accepted', () => {
    const air = { temperature: K(25), heightAboveDatum: 500, specificHumidity: 0.012 }
    expect(Math.abs(value('moist-static-energy', air) / 1000 - 334.26)).toBeLessThan(0.8)
    expect(judgeTyped(stepOf('moist-static-energy', air, { digits: 4 }), '334.3 kJ/kg').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('moist-static-energy', air), `${(slipOf('moist-static-energy', air, 'celsius-for-kelvin') / 1000).toFixed(1)} kJ/kg`)).toMatchObject({ isAccepted: false, slip: { key: 'celsius-for-kelvin' } })
    expect(Math.abs(slipOf('moist-static-energy', air, 'celsius-for-kelvin') / 1000 - 60.0)).toBeLessThan(0.8)
  })
  it('M21: the wet bulb is isobaric or pseudoadiabatic, two quantities up to 0.3 K apart; Stull’s fit only where a convention names it', () => {
    const air = { pressure: 101_325, temperature: K(30), dewpoint: K(10) }
    const isobaric = value('wet-bulb-temperature', air), lifted = value('pseudoadiabatic-wet-bulb-temperature', air)
    expect(isobaric - lifted).toBeGreaterThan(0)
    expect(isobaric - lifted).toBeLessThan(0.6)
    const damp = { pressure: 101_325, temperature: K(20), relativeHumidity: 0.5 }
    expect(value('wet-bulb-temperature-from-relative-humidity', damp, 'stull') - 273.15).toBeCloseTo(13.7, 1)
    expect(Math.abs(value('wet-bulb-temperature-from-relative-humidity', damp) - 273.15 - 13.8)).toBeLessThan(0.05)
    expect(notesOf(outcome('wet-bulb-temperature-from-relative-humidity', { ...damp, pressure: 85_000 }, 'stull'))).toContain('Beyond the stated range')
  })
  it('T19: a lowered parcel warms along the pseudoadiabat only while water evaporates into it, and the ask says so', () => {
    expect(askOf('saturated-descent-temperature')).toContain('air without liquid water warms dry-adiabatically')
    expect(() => outcome('saturated-ascent-temperature', { pressureStart: 80_000, temperature: K(0), pressureEnd: 90_000 })).toThrow('pressureEnd')
    expect(() => outcome('saturated-descent-temperature', { pressureStart: 80_000, temperature: K(0), pressureEnd: 70_000 })).toThrow('pressureEnd')
  })
  it('U12: a humidity typed as 55 % is read, bare 0.55 is asked about', () => {
    expect(reading('relative-humidity', '55 %').reading).toBe('ok')
    expect(reading('relative-humidity', '0.55').reading).toBe('ambiguous')
  })
})
