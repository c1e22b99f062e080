import { describe, expect, it } from 'vitest'
import { checkBand } from '#shared/marking/proof'
import { conventionFaults } from '#shared/thermo/conventions/closes'
import { defaultConvention } from '#shared/thermo/conventions/index'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import type { Constants, Inputs } from '#shared/thermo/definition'
import { findQuantity } from '#shared/thermo/registry'
import { judgeTyped, reading, stepOf } from '../../fixtures/marking/ask'
import { resolveWallTime, wallTimeAt } from '../../../server/domain/terms/wallClock'

function value(quantity: string, inputs: Inputs, constants: Constants = defaultConvention.constants): number {
  const definition = findQuantity(quantity)
  if (!definition) throw new Error(quantity)
  const outcome = evaluateQuantity(definition, inputs, constants)
  return outcome.is === 'value' ? outcome.value : NaN
}
const slips = (quantity: string, inputs: Inputs) => Object.fromEntries(judgeTyped(stepOf(quantity, inputs), '').slipValues.map(slip => [slip.key, slip.value]))
const t1: Inputs = { temperature: 293.15, pressure: 85_000 }
const heating: Inputs = { temperatureStart: 283.15, temperatureEnd: 293.15 }
const expansion: Inputs = { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }

describe('traps T: first law, θ, parcels without cloud', () => {
  it('T1: θ refers to 1000 hPa: 20 °C, 850 hPa give 307.08 K; 308.24 (1013.25) and 304.87 (975 hPa) are slips', () => {
    expect(Math.abs(value('potential-temperature', t1) - 307.08)).toBeLessThan(0.06)
    const made = slips('potential-temperature', { ...t1, stationPressure: 97_500 })
    expect(Math.abs((made['standard-pressure'] ?? 0) - 308.24)).toBeLessThan(0.06)
    expect(Math.abs((made['station-pressure'] ?? 0) - 304.87)).toBeLessThan(0.06)
    expect(judgeTyped(stepOf('potential-temperature', t1), '308.24 K')).toMatchObject({ isAccepted: false, slip: { key: 'standard-pressure' } })
    expect(judgeTyped(stepOf('potential-temperature', { ...t1, stationPressure: 97_500 }), '304.87 K')).toMatchObject({ isAccepted: false, slip: { key: 'station-pressure' } })
  })
  it('T2: Celsius in Poisson is a slip: 20.95; right 33.93 °C; inverted ratio 279.85 K', () => {
    const made = slips('potential-temperature', t1)
    expect(Math.abs((made['celsius-for-kelvin'] ?? 0) - 273.15 - 20.95)).toBeLessThan(0.01)
    expect(Math.abs((made['inverted-ratio'] ?? 0) - 279.85)).toBeLessThan(0.06)
    expect(judgeTyped(stepOf('potential-temperature', t1, { unit: 'Cel' }), '20.95 °C').slip?.key).toBe('celsius-for-kelvin')
    expect(judgeTyped(stepOf('potential-temperature', t1), '20.95 K').slip?.key).toBe('celsius-for-kelvin-as-kelvin')
    expect(judgeTyped(stepOf('potential-temperature', t1, { unit: 'Cel' }), '33.93 °C').isAccepted).toBe(true)
  })
  it.each([0.2854, 2 / 7, 0.286, 0.28591])('T3: κ %d is accepted for T1', (kappa) => {
    const theta = 293.15 * Math.pow(1000 / 850, kappa)
    expect(theta).toBeGreaterThan(307.066)
    expect(judgeTyped(stepOf('potential-temperature', t1, { digits: 5 }), `${theta.toFixed(3)} K`).isAccepted).toBe(true)
  })
  it('T4: 273 for 273.15 one way is never covered by width: 306.93 K is not accepted for T1', () => {
    expect(judgeTyped(stepOf('potential-temperature', t1), '306.93 K')).toMatchObject({ isAccepted: false, slip: { key: 'zero-273' } })
    expect(judgeTyped(stepOf('potential-temperature', t1, { unit: 'Cel' }), '33.926 °C').isAccepted).toBe(true)
  })
  it('T5: a relative width on a temperature is refused, in the proof and by the judge', () => {
    const step = stepOf('potential-temperature', t1, { granted: { relative: 0.01 } })
    expect(checkBand(step).ok).toBe(false)
    expect(judgeTyped(step, '307.1 K')).toMatchObject({ outcome: 'refused', refusalCode: 'grant_invalid', isAccepted: false })
  })
  it('T6: an answer of exactly 0 has an absolute band; "0", "0.0", "-0" are equal', () => {
    for (const typed of ['0', '0.0', '-0', '0 J/kg', '−0.00 kJ/kg']) expect(judgeTyped(stepOf('adiabatic-heat', expansion), typed).isAccepted, typed).toBe(true)
    const wide = stepOf('adiabatic-heat-of-mass', { mass: 1, ...expansion }, { granted: { absoluteSi: 10 } })
    expect(judgeTyped(wide, '0.01 kJ').isAccepted).toBe(true)
    expect(judgeTyped(wide, '0.1 kJ').isAccepted).toBe(false)
    expect(checkBand(wide)).toEqual({ ok: true, reasons: [] })
    expect(checkBand(stepOf('adiabatic-heat', expansion, { granted: { relative: 0.1 } })).ok).toBe(false)
    expect(judgeTyped(stepOf('adiabatic-heat', expansion), '-28.5').slip?.key).toBe('enthalpy-for-heat')
  })
  it('T7: 1 kg, +10 K, isobaric: q 10.04, w 2.87, Δu 7.17 kJ, and q = Δu + w', () => {
    const q = value('isobaric-heat', heating), w = value('isobaric-work', heating), u = value('isobaric-internal-energy-change', heating)
    expect([q, w, u].map(one => Math.round(one) / 1000)).toEqual([10.04, 2.87, 7.17])
    expect(q - u - w).toBeCloseTo(0, 9)
    expect(judgeTyped(stepOf('isobaric-work', heating), '-2.87 kJ/kg').slip?.key).toBe('sign')
  })
  it('T8: adiabatic expansion: w > 0, Δh < 0, q = 0: 20.37 and −28.5 kJ/kg', () => {
    expect(Math.abs(value('adiabatic-work', expansion) / 1000 - 20.37)).toBeLessThan(0.15)
    expect(Math.abs(value('adiabatic-enthalpy-change', expansion) / 1000 + 28.5)).toBeLessThan(0.2)
    expect(value('adiabatic-heat', expansion)).toBe(0)
    expect(value('adiabatic-work', expansion) + value('adiabatic-internal-energy-change', expansion)).toBeCloseTo(0, 9)
  })
  it('T9: cp, cv, R close in every convention; 1004 / 717 / 287.05 is refused', () => {
    expect(conventionFaults({ constants: { ...defaultConvention.constants, R: 287.05 }, accepted: [] })).not.toEqual([])
    expect(conventionFaults(defaultConvention)).toEqual([])
  })
  it('T10: per kilogram and total are different dimensions, told before submission: 2 kg, +25 K: 50.2 kJ, not 25.1 kJ/kg', () => {
    const inputs = { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 }
    expect(judgeTyped(stepOf('isobaric-heat-of-mass', inputs), '50.2 kJ').isAccepted).toBe(true)
    expect(reading('isobaric-heat-of-mass', '25.1 kJ/kg').reading).toBe('wrong_dimension')
    expect(reading('isobaric-heat', '50.2 kJ').reading).toBe('wrong_dimension')
    expect(judgeTyped(stepOf('isobaric-heat-of-mass', inputs), '25.1 kJ')).toMatchObject({ isAccepted: false, slip: { key: 'mass-left-out' } })
  })
  it('T11: the universal gas constant with masses in kg is a slip, by a factor of M', () => {
    const inputs = { pressure: 101_325, temperature: 298.15 }
    expect((slips('density', inputs)['universal-gas-constant'] ?? 0) / value('density', inputs)).toBeCloseTo(287 / 8.314462618, 9)
    expect(8.31446 / 0.0289647).toBeCloseTo(287.06, 1)
  })
  it('T12: by height and by pressure are two quantities: 15 °C from 1000 to 900 hPa is 6.46 °C; lifted by 878 m it cools by Γd alone', () => {
    const lifted = { temperatureStart: 288.15, pressureStart: 100_000, pressureEnd: 90_000 }
    expect(Math.abs(value('parcel-temperature-by-pressure', lifted) - 273.15 - 6.46)).toBeLessThan(0.06)
    expect(judgeTyped(stepOf('parcel-temperature-by-pressure', lifted), '6.46 °C').isAccepted).toBe(true)
    // the height from which 6.46 °C would come is not that of 100 hPa in this column
    expect(value('parcel-temperature-by-height', { temperature: 288.15, heightDifference: 878 }) - 273.15).toBeCloseTo(15 - 878 * 9.81 / 1004, 9)
    expect(judgeTyped(stepOf('parcel-temperature-by-pressure', lifted), `${(15 - 9.771).toFixed(2)} °C`).isAccepted).toBe(false)
  })
  it('T13: the parcel cools at Γd whatever its surroundings: no factor Tp/Te unless asked', () => {
    const inputs = { temperature: 290, heightDifference: 1000 }
    expect(judgeTyped(stepOf('parcel-temperature-by-height', inputs), `${(290 - 9.77 - 273.15).toFixed(2)} °C`).isAccepted).toBe(true)
    // asked for with the factor, it is a quantity of its own: 290 K in 280 K
    const asked = { parcelTemperature: 290, environmentTemperature: 280 }
    expect(value('parcel-lapse-rate-in-environment', asked) * 1000).toBeCloseTo(10.12, 2)
    expect(judgeTyped(stepOf('parcel-lapse-rate-in-environment', asked), '9.77 K/km')).toMatchObject({ isAccepted: false, slip: { key: 'factor-left-out' } })
  })
  it('T14: moist, unsaturated air has another rate: w 15 g/kg: 9.65 K/km, and neither is accepted for the other', () => {
    expect(value('moist-unsaturated-lapse-rate', { mixingRatio: 0.015 }) * 1000).toBeCloseTo(9.65, 2)
    expect(judgeTyped(stepOf('moist-unsaturated-lapse-rate', { mixingRatio: 0.015 }), '9.77 K/km').isAccepted).toBe(false)
    expect(judgeTyped(stepOf('dry-adiabatic-lapse-rate', {}), '9.65 K/km').isAccepted).toBe(false)
  })
  it.each(['9.8', '9.77', '9.76', '9.75'])('T15: Γd %s K/km is correct', typed => expect(judgeTyped(stepOf('dry-adiabatic-lapse-rate', {}), `${typed} K/km`).isAccepted).toBe(true))
  it.each(['9.7', '9.9', '10', '9.74'])('T15: Γd %s K/km is not', typed => expect(judgeTyped(stepOf('dry-adiabatic-lapse-rate', {}), `${typed} K/km`).isAccepted).toBe(false))
  it('T16: enthalpy with geopotential, adiabatic: cp ΔT + g Δz = 0: 1 km cools by 9.771 K', () => {
    expect(value('temperature-change-from-heat-and-height-change', { heat: 0, heightDifference: 1000 })).toBeCloseTo(-9.771, 3)
    expect(value('heat-from-enthalpy-and-geopotential', { temperatureChange: -9.81 * 1000 / 1004, heightDifference: 1000 })).toBeCloseTo(0, 9)
    expect(judgeTyped(stepOf('temperature-change-from-heat-and-height-change', { heat: 0, heightDifference: 1000 }), '9.77 K').slip?.key).toBe('sign')
  })
  it('T17: heating from an observed change of temperature states its assumption in the ask', () => {
    for (const key of ['heating-rate', 'specific-heating-rate']) expect(findQuantity(key)?.ask).toMatch(/neither advection nor vertical motion/)
  })
  it('T18: a rate over a clock change takes the elapsed time in UTC: 01:30 (first) to 03:30 on the autumn night are 3 h', () => {
    const start = Date.parse('2026-11-01T01:30:00-05:00'), end = resolveWallTime('2026-11-01T03:30', 'America/Chicago').at
    expect(wallTimeAt(start, 'America/Chicago')).toBe('2026-11-01T01:30')
    const timeBetween = (end - start) / 1000
    expect(timeBetween).toBe(3 * 3600)
    const inputs = { temperatureStart: 285.15, temperatureEnd: 282.15, timeBetween }
    expect(value('heating-rate', inputs) * 3600).toBeCloseTo(-1, 12)
    expect(judgeTyped(stepOf('heating-rate', inputs), '-1.50 K/h')).toMatchObject({ isAccepted: false, slip: { key: 'clock-hour' } })
  })
  it('T19: a lowered parcel warms along the dry adiabat, whatever it was at the start', () => {
    const lowered = { temperatureStart: 273.15, pressureStart: 70_000, pressureEnd: 100_000 }
    expect(value('parcel-temperature-by-pressure', lowered)).toBeGreaterThan(273.15)
    expect(value('parcel-temperature-by-pressure', lowered)).toBeCloseTo(value('potential-temperature', { temperature: 273.15, pressure: 70_000 }), 9)
    expect(value('parcel-temperature-by-height', { temperature: 273.15, heightDifference: -1000 })).toBeCloseTo(273.15 + 9.771, 3)
  })
})

describe('traps H: heights and pressure', () => {
  it('H2: the anchor is the station pressure: 975 to 940 hPa at 10 °C: 303.0 m; from 1013.25: 621.9 m, a slip', () => {
    const inputs = { pressureBottom: 97_500, pressureTop: 94_000, meanVirtualTemperature: 283.15 }
    expect(Math.abs(value('hypsometric-thickness', inputs) - 303.0)).toBeLessThan(0.3)
    expect(Math.abs((slips('hypsometric-thickness', inputs)['standard-pressure'] ?? 0) - 621.9)).toBeLessThan(0.6)
    expect(judgeTyped(stepOf('hypsometric-thickness', inputs), '621.9 m')).toMatchObject({ isAccepted: false, slip: { key: 'standard-pressure' } })
  })
  it('H6: the mean goes in in kelvin: 1000–700 hPa, 10 °C: 2956 m; Celsius gives 104 m, a slip', () => {
    const inputs = { pressureBottom: 100_000, pressureTop: 70_000, meanVirtualTemperature: 283.15 }
    expect(Math.abs(value('hypsometric-thickness', inputs) / 2956 - 1)).toBeLessThan(0.001)
    expect(Math.abs((slips('hypsometric-thickness', inputs)['celsius-for-kelvin'] ?? 0) - 104)).toBeLessThan(1)
    expect(judgeTyped(stepOf('hypsometric-thickness', inputs), '104 m')).toMatchObject({ isAccepted: false, slip: { key: 'celsius-for-kelvin' } })
  })
  it('H13: g/R is 34.2 K/km, autoconvective, a slip for Γd', () => {
    expect((slips('dry-adiabatic-lapse-rate', {}).autoconvective ?? 0) * 1000).toBeCloseTo(34.18, 1)
    expect(judgeTyped(stepOf('dry-adiabatic-lapse-rate', {}), '34.2 K/km').slip?.key).toBe('autoconvective')
  })
})
