import { describe, expect, it } from 'vitest'
import { checkBand } from '#shared/marking/proof'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs } from '#shared/thermo/definition'
import { findQuantity } from '#shared/thermo/registry'
import { straightLine } from '#shared/numerics/regression'
import { randomSource, seedFromNumber, shuffled } from '#shared/numerics/random'
import { judgeTyped, kelvins, reading, setS, stepOf } from '../../fixtures/marking/ask'
import { describeWithShared, hasShared, sharedTable } from '../../fixtures/sharedFolder'

function rate(quantity: string, inputs: Inputs): number {
  const definition = findQuantity(quantity)
  if (!definition) throw new Error(quantity)
  const outcome = evaluateQuantity(definition, inputs, defaultConvention.constants)
  return outcome.is === 'value' ? outcome.value * 1000 : NaN
}
const fit = (inputs: Inputs) => rate('lapse-rate-least-squares', inputs)
const ends = (inputs: Inputs) => rate('lapse-rate-end-points', inputs)
function slipValue(quantity: string, inputs: Inputs, key: string): number {
  return (judgeTyped(stepOf(quantity, inputs), '').slipValues.find(slip => slip.key === key)?.value ?? NaN) * 1000
}
const heights = (inputs: Inputs) => (Array.isArray(inputs.height) ? inputs.height : [])
const temperatures = (inputs: Inputs) => (Array.isArray(inputs.temperature) ? inputs.temperature : [])

describe('traps L: lapse rates, fits, stability', () => {
  it('L1: a lapse rate is −dT/dz, positive where T falls with height: 18.0 °C at 20 m, 16.2 °C at 220 m give +9.0 K/km', () => {
    expect(ends({ height: [20, 220], temperature: kelvins(18.0, 16.2) })).toBeCloseTo(9, 9)
    expect(findQuantity('lapse-rate-end-points')?.ask).toContain('positive where temperature falls with height')
  })
  it('L2: −0.0098 °C m⁻¹ for a lapse rate is read as −9.8 K/km and named a sign slip, never accepted', () => {
    const judgement = judgeTyped(stepOf('dry-adiabatic-lapse-rate', {}), '-0.0098 °C m^-1')
    expect(reading('dry-adiabatic-lapse-rate', '-0.0098 °C m^-1').message).toBe('read as −9.8 K km⁻¹')
    expect(judgement).toMatchObject({ isAccepted: false, slip: { key: 'sign' } })
  })
  it('L4: T is fitted on z; the inverse fit is a slip equal to the slope over r²: S gives 10.20 and 10.40, r² 0.98077', () => {
    expect(fit(setS)).toBeCloseTo(10.2, 9)
    expect(slipValue('lapse-rate-least-squares', setS, 'inverse-fit')).toBeCloseTo(10.4, 9)
    expect(straightLine(heights(setS), temperatures(setS))?.rSquared).toBeCloseTo(0.98077, 5)
    expect(judgeTyped(stepOf('lapse-rate-least-squares', setS), '10.40 K/km')).toMatchObject({ isAccepted: false, slip: { key: 'inverse-fit' } })
  })
  it('L5: x and y swapped is in m/K: −96.15 m/K is another kind of quantity, told and not converted', () => {
    expect(reading('lapse-rate-least-squares', '-96.15 m/K')).toMatchObject({ reading: 'wrong_dimension', valueSi: null })
    expect(reading('lapse-rate-least-squares', '-96.15 m/K').message).toContain('a length per temperature')
    expect(slipValue('lapse-rate-least-squares', setS, 'swapped-arguments')).toBeCloseTo(-96.15, 2)
    expect(judgeTyped(stepOf('lapse-rate-least-squares', setS), '-96.15').slip?.key).toBe('swapped-arguments')
  })
  it('L6: end points and least squares are two quantities, never bridged by width: S gives 10.50 and 10.20', () => {
    expect(ends(setS)).toBeCloseTo(10.5, 9)
    expect(judgeTyped(stepOf('lapse-rate-least-squares', setS), '10.50 K/km')).toMatchObject({ isAccepted: false, slip: { key: 'end-points' } })
    expect(judgeTyped(stepOf('lapse-rate-end-points', setS), '10.20 K/km')).toMatchObject({ isAccepted: false, slip: { key: 'least-squares' } })
    expect(checkBand(stepOf('lapse-rate-least-squares', setS, { granted: { absoluteSi: 0.0003 } }))).toMatchObject({ ok: false })
    expect(checkBand(stepOf('lapse-rate-least-squares', setS))).toEqual({ ok: true, reasons: [] })
  })
  it('L8: S closed gives 10.20, half-open 8.80 K/km', () => {
    const halfOpen = { height: heights(setS).slice(0, 4), temperature: temperatures(setS).slice(0, 4) }
    expect(fit(halfOpen)).toBeCloseTo(8.8, 9)
  })
  it('L9: end points divide by the heights of the rows used', () => {
    const inputs = { height: [103, 297], temperature: kelvins(15, 13.06) }
    expect(ends(inputs)).toBeCloseTo(10, 9)
    const outcome = evaluateQuantity(findQuantity('lapse-rate-end-points') ?? (() => { throw new Error() })(), inputs, defaultConvention.constants)
    expect(outcome).toMatchObject({ more: { lowHeight: 103, highHeight: 297 } })
  })
  it('L10: end points are chosen by height, never by the order of rows', () => {
    const both = { height: [100, 300, 200, 110], temperature: kelvins(15, 13, 14, 18) }
    expect(ends(both)).toBeCloseTo(10, 9)
    expect(slipValue('lapse-rate-end-points', both, 'first-and-last-row')).toBeCloseTo(-300, 6)
  })
  it('L11: rows are fitted as served: S with 60 rows at (150 m, 14.4 °C) gives 9.13 K/km, 9.81 after a mean per level', () => {
    const raw = { height: [...heights(setS), ...Array.from({ length: 60 }, () => 150)], temperature: [...temperatures(setS), ...Array.from({ length: 60 }, () => 287.55)] }
    expect(fit(raw)).toBeCloseTo(9.13, 2)
    const mean = (14.6 + 60 * 14.4) / 61
    expect(fit({ height: heights(setS), temperature: kelvins(15.0, mean, 14.1, 13.7, 12.9) })).toBeCloseTo(9.81, 2)
  })
  it('L12: a fit needs no order: shuffled rows give the fit of sorted rows to 1e-12', () => {
    const order = shuffled(randomSource(seedFromNumber(12)), 40)
    const z = Array.from({ length: 40 }, (_, at) => 100 + 7.3 * at), T = z.map((height, at) => 290 - 0.0081 * height + 0.1 * ((at * 7) % 5))
    const sorted = fit({ height: z, temperature: T }), mixed = fit({ height: order.map(at => z[at] ?? 0), temperature: order.map(at => T[at] ?? 0) })
    expect(Math.abs(mixed / sorted - 1)).toBeLessThan(1e-12)
  })
  it('L13: the standard error has n − 2 degrees of freedom: S gives 0.825; n − 1 gives 0.714, n gives 0.639 K/km', () => {
    expect(rate('lapse-rate-standard-error', setS)).toBeCloseTo(0.825, 3)
    expect(slipValue('lapse-rate-standard-error', setS, 'n-minus-1')).toBeCloseTo(0.714, 3)
    expect(slipValue('lapse-rate-standard-error', setS, 'n')).toBeCloseTo(0.639, 3)
  })
  it('L15: the slope does not depend on the height origin; the intercept does: 16.10 and 19.36 °C', () => {
    const moved = { ...setS, height: heights(setS).map(z => z + 320) }
    expect(fit(moved)).toBeCloseTo(fit(setS), 9)
    expect((straightLine(heights(setS), temperatures(setS))?.intercept ?? 0) - 273.15).toBeCloseTo(16.10, 2)
    expect((straightLine(heights(moved), temperatures(moved))?.intercept ?? 0) - 273.15).toBeCloseTo(19.36, 2)
  })
  it('L17: the plain mean of sub-layer rates is a slip: 8.33 right, 13.0 the plain mean', () => {
    const inputs = { height: [0, 50, 300], temperature: kelvins(20, 19, 17.5) }
    expect(ends(inputs)).toBeCloseTo(8.333, 3)
    expect(slipValue('lapse-rate-end-points', inputs, 'mean-of-parts')).toBeCloseTo(13, 9)
  })
  it('L18: θ gradient from Γ: dθ/dz = (θ/T)(Γd − Γ): T 290, θ 293, Γ 6.5 give 3.30 K/km, as θ at two heights of one column does', () => {
    const dry = 9.81 / 1004 * 1000
    expect(293 / 290 * (dry - 6.5)).toBeCloseTo(3.30, 1)
    // the same from the reference's θ over 10 m, with pressure falling hydrostatically
    const definition = findQuantity('potential-temperature')
    if (!definition) throw new Error()
    const p = 100_000 * Math.pow(290 / 293, 1004 / 287)
    const theta = (T: number, pressure: number) => {
      const outcome = evaluateQuantity(definition, { temperature: T, pressure }, defaultConvention.constants)
      return outcome.is === 'value' ? outcome.value : NaN
    }
    const above = p * Math.exp(-9.81 * 10 / (287 * (290 - 0.0325)))
    expect((theta(290 - 0.065, above) - theta(290, p)) * 100).toBeCloseTo(293 / 290 * (dry - 6.5), 2)
  })
  it('L20, for unsaturated layers against Γd alone: superadiabatic is one class, neutral has a printed tolerance', () => {
    const classOf = (K_km: number) => judgeTyped(stepOf('static-stability', { lapseRate: K_km / 1000 }), '').classes
    expect(classOf(5)).toEqual(['stable'])
    expect(classOf(-10)).toEqual(['stable'])
    expect(classOf(9.8)).toEqual(['dry-neutral'])
    expect(classOf(12)).toEqual(['superadiabatic'])
    expect(judgeTyped(stepOf('static-stability', { lapseRate: 0.012 }), 'Absolutely unstable').isAccepted).toBe(true)
    expect(findQuantity('static-stability')?.ask).toContain('0.1 K/km')
  })
  it('L27: a relative width on a near-zero lapse rate is refused, an absolute one is not', () => {
    const flat = { height: [100, 200, 300, 400], temperature: kelvins(15.0, 15.01, 14.98, 14.97) }
    expect(Math.abs(fit(flat))).toBeLessThan(0.3)
    expect(checkBand(stepOf('lapse-rate-least-squares', flat, { granted: { relative: 0.02 } })).reasons.join()).toContain('near zero')
  })
  it('L28: a share whose sign slip lies inside its band is refused: Γ 0.2 ± 0.3 K/km', () => {
    const flat = { height: [100, 200], temperature: kelvins(15.0, 14.98) }
    const check = checkBand(stepOf('lapse-rate-end-points', flat, { granted: { absoluteSi: 0.0003 } }))
    expect(check.ok).toBe(false)
    expect(check.reasons.join()).toContain('sign turned round')
  })
})

describeWithShared('traps L on real profiles', () => {
  const rows = hasShared ? sharedTable('data/profiles/up_and_down_constructed.csv').map(row => ({ z: Number(row.height_m_msl), T: Number(row.temp_C) })) : []
  const top = rows.reduce((best, row, at) => (row.z > (rows[best]?.z ?? -1) ? at : best), 0)
  const layer = (from: { z: number, T: number }[], low: number, high: number): Inputs => {
    const kept = from.filter(row => row.z >= low && row.z <= high)
    return { height: kept.map(row => row.z), temperature: kelvins(...kept.map(row => row.T)) }
  }
  const up = rows.slice(0, top + 1)
  it('L3: an inversion’s lapse rate is negative and right: 600–800 m, up leg: −10.23 K/km', () => {
    const inversion = layer(up, 600, 800)
    expect(fit(inversion)).toBeCloseTo(-10.23, 2)
    expect(judgeTyped(stepOf('lapse-rate-least-squares', inversion), '-10.2').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('lapse-rate-least-squares', inversion), '10.2')).toMatchObject({ isAccepted: false, slip: { key: 'sign' } })
  })
  it('L4: 600–800 m, up leg: −10.23 right, −15.27 inverse', () => expect(slipValue('lapse-rate-least-squares', layer(up, 600, 800), 'inverse-fit')).toBeCloseTo(-15.27, 2))
  it('L6: 600–800 m, up leg: −6.29 by end points', () => expect(ends(layer(up, 600, 800))).toBeCloseTo(-6.29, 2))
  it('L10: 800–1000 m: 7.03 on the up leg; first and last of both legs together are nonsense', () => {
    expect(ends(layer(up, 800, 1000))).toBeCloseTo(7.03, 2)
    expect(Math.abs(slipValue('lapse-rate-end-points', layer(rows, 800, 1000), 'first-and-last-row'))).toBeGreaterThan(500)
  })
  it('L4, L6, L8 on the sounding of 22 May 2011: 7.832, inverse 7.962, end points 7.669; open bounds 7.875', () => {
    const sounding = hasShared ? sharedTable('checks/soundings/metpy_20110522_OUN_12Z.csv').map(row => ({ p: Number(row.pressure_hPa), z: Number(row.height_m), T: Number(row.temperature_degC) })) : []
    const of = (kept: typeof sounding): Inputs => ({ height: kept.map(row => row.z), temperature: kelvins(...kept.map(row => row.T)) })
    const closed = of(sounding.filter(row => row.p >= 500 && row.p <= 850)), open = of(sounding.filter(row => row.p > 500 && row.p < 850))
    expect(heights(closed).length).toBe(22)
    expect(fit(closed)).toBeCloseTo(7.832, 3)
    expect(slipValue('lapse-rate-least-squares', closed, 'inverse-fit')).toBeCloseTo(7.962, 3)
    expect(ends(closed)).toBeCloseTo(7.669, 3)
    expect(fit(open)).toBeCloseTo(7.875, 3)
  })
})
