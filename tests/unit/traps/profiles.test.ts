import { describe, expect, it } from 'vitest'
import { checkBand } from '#shared/marking/proof'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs, Outcome } from '#shared/thermo/definition'
import { inflation } from '#shared/thermo/residuals'
import { findQuantity } from '#shared/thermo/registry'
import { randomSource, seedFromNumber, shuffled, fraction } from '#shared/numerics/random'
import { judgeTyped, kelvins, setS, stepOf } from '../../fixtures/marking/ask'
import { describeWithShared, sharedTable } from '../../fixtures/sharedFolder'

function outcome(quantity: string, inputs: Inputs): Outcome {
  const definition = findQuantity(quantity)
  if (!definition) throw new Error(quantity)
  return evaluateQuantity(definition, inputs, defaultConvention.constants)
}
function value(quantity: string, inputs: Inputs): number {
  const found = outcome(quantity, inputs)
  return found.is === 'value' ? found.value : NaN
}
const slips = (quantity: string, inputs: Inputs) => Object.fromEntries(judgeTyped(stepOf(quantity, inputs), '').slipValues.map(slip => [slip.key, slip.value]))
const degrees = (...directions: number[]): number[] => directions.map(d => d * Math.PI / 180)

describe('traps L: three rates, their errors, stratification, layers', () => {
  it('L6, L7: end points, least squares and Theil–Sen are three quantities: S gives 10.50, 10.20, 9.50', () => {
    expect(value('lapse-rate-theil-sen', setS) * 1000).toBeCloseTo(9.5, 9)
    expect(judgeTyped(stepOf('lapse-rate-theil-sen', setS, { digits: 4 }), '10.20')).toMatchObject({ isAccepted: false, slip: { key: 'least-squares' } })
    expect(judgeTyped(stepOf('lapse-rate-theil-sen', setS), '10.50')).toMatchObject({ isAccepted: false, slip: { key: 'end-points' } })
    expect(judgeTyped(stepOf('lapse-rate-theil-sen', setS), '9.50').isAccepted).toBe(true)
  })
  it('L7: one wild row of twenty moves the fit and leaves the median where it was', () => {
    const height = Array.from({ length: 20 }, (_, at) => 10 * at), temperature = height.map(z => 290 - 0.0065 * z)
    temperature[19] = 310
    expect(Math.abs(value('lapse-rate-theil-sen', { height, temperature }) - 0.0065)).toBeLessThan(1e-12)
    expect(Math.abs(value('lapse-rate-least-squares', { height, temperature }) - 0.0065)).toBeGreaterThan(0.01)
  })
  it('L12: the median needs no order either', () => {
    const source = randomSource(seedFromNumber(7)), order = shuffled(source, 31)
    const z = Array.from({ length: 31 }, (_, at) => 5 + 9 * at), T = z.map(height => 285 - 0.007 * height + 0.3 * fraction(source))
    expect(value('lapse-rate-theil-sen', { height: order.map(at => z[at] ?? 0), temperature: order.map(at => T[at] ?? 0) })).toBe(value('lapse-rate-theil-sen', { height: z, temperature: T }))
  })
  it('L14: autocorrelated residuals: r₁ = 0.9 inflates by 4.36; a seeded series with 0.9 gives its r₁ back, independent noise gives none', () => {
    expect(inflation(0.9)).toBeCloseTo(4.36, 2)
    const source = randomSource(seedFromNumber(14))
    const normal = () => Array.from({ length: 12 }, () => fraction(source)).reduce((sum, one) => sum + one, -6)
    const z = Array.from({ length: 3000 }, (_, at) => at), red: number[] = [], white: number[] = []
    let before = 0
    for (const height of z) {
      before = 0.9 * before + normal()
      red.push(290 - 0.0065 * height + 0.05 * before)
      white.push(290 - 0.0065 * height + 0.05 * normal())
    }
    const inputs = { height: z, temperature: red }
    expect(Math.abs(value('lapse-rate-lag-one-correlation', inputs) - 0.9)).toBeLessThan(0.03)
    expect(Math.abs(value('lapse-rate-lag-one-correlation', { height: z, temperature: white }))).toBeLessThan(0.05)
    const ratio = value('lapse-rate-inflated-standard-error', inputs) / value('lapse-rate-standard-error', inputs)
    expect(ratio).toBeGreaterThan(3.6)
    expect(ratio).toBeLessThan(5.2)
  })
  it('L18: dθ/dz = (θ/T)(Γd − Γ): T 290, θ 293, Γ 6.5 give 3.30 K/km', () => {
    const inputs = { temperature: 290, potentialTemperature: 293, lapseRate: 0.0065 }
    expect(judgeTyped(stepOf('potential-temperature-gradient', inputs), '3.30 K/km').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('potential-temperature-gradient', inputs), '-3.30 K/km').slip?.key).toBe('sign')
  })
  it('L23: N² < 0 is the answer, N is not defined: θ 300 K, −0.5 K over 50 m: −3.27e-4 s⁻²', () => {
    const inputs = { potentialTemperatureBottom: 300, potentialTemperatureTop: 299.5, depth: 50 }
    expect(value('brunt-vaisala-frequency-squared', inputs)).toBeCloseTo(-3.27e-4, 6)
    expect(outcome('brunt-vaisala-frequency', inputs)).toMatchObject({ is: 'not_defined' })
    expect(judgeTyped(stepOf('brunt-vaisala-frequency', inputs), 'not defined').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('brunt-vaisala-frequency', inputs), '0.0181').isAccepted).toBe(false)
    expect(judgeTyped(stepOf('brunt-vaisala-frequency-squared', inputs), '0.01809')).toMatchObject({ isAccepted: false, slip: { key: 'root-of-size' } })
  })
  it('L24: the wind difference is that of vectors: 5 m/s from 200° and from 260°: 5.0 m/s, not 0', () => {
    const [d1 = 0, d2 = 0] = degrees(200, 260), winds = { windSpeedBottom: 5, windDirectionBottom: d1, windSpeedTop: 5, windDirectionTop: d2 }
    expect(value('vector-wind-difference', winds)).toBeCloseTo(5, 9)
    expect(judgeTyped(stepOf('vector-wind-difference', winds), '0 m/s')).toMatchObject({ isAccepted: false, slip: { key: 'speeds-subtracted' } })
    const air = { virtualPotentialTemperatureBottom: 298, virtualPotentialTemperatureTop: 299.2, depth: 100 }
    expect(value('bulk-richardson-number-from-winds', { ...air, ...winds })).toBeCloseTo(9.81 / 298.6 * 1.2 * 100 / 25, 9)
    expect(outcome('bulk-richardson-number-from-winds', { ...air, ...winds, windDirectionTop: d1 })).toMatchObject({ is: 'not_defined' })
  })
  const morning = { height: [2, 20, 40, 60, 80, 100, 150], temperature: kelvins(8.0, 8.6, 8.6, 9.4, 9.4, 9.1, 8.7) }
  it('L25: inversion: base, top, strength > 0; isothermal steps inside count and at the ends do not; a minimum depth is stated', () => {
    expect(value('inversion-base', { ...morning, minimumDepth: 20 })).toBe(2)
    expect(value('inversion-top', { ...morning, minimumDepth: 20 })).toBe(60)
    expect(value('inversion-strength', { ...morning, minimumDepth: 20 })).toBeCloseTo(1.4, 9)
    expect(judgeTyped(stepOf('inversion-strength', { ...morning, minimumDepth: 20 }), '-1.40 K')).toMatchObject({ isAccepted: false, slip: { key: 'sign' } })
    expect(judgeTyped(stepOf('inversion-base', { ...morning, minimumDepth: 59 }), 'none').isAccepted).toBe(true)
    expect(outcome('inversion-top', { height: [0, 50, 100], temperature: kelvins(10, 10, 9), minimumDepth: 0 })).toMatchObject({ is: 'none' })
    expect(findQuantity('inversion-strength')?.ask).toContain('isothermal')
  })
  it('L26: mixed-layer depth by three methods, above ground; above the flight’s top it is "not reached", which can be typed', () => {
    const day = { height: [2, 100, 500, 800, 1000], potentialTemperature: [300, 299.8, 299.8, 300.2, 303] }
    // by hand: 800 + 0.3/2.8 · 200; 800 + (0.25 − 0.1065)/(1.5297 − 0.1065) · 200; between 800 and 1000
    expect(value('mixed-layer-depth-parcel', { ...day, excess: 0.5 })).toBeCloseTo(821.43, 2)
    expect(value('mixed-layer-depth-bulk-richardson', { ...day, windSpeed: [2, 5, 6, 7, 8], criticalRichardsonNumber: 0.25 })).toBeCloseTo(820.2, 1)
    expect(value('mixed-layer-depth-gradient', { ...day, leastGradient: 0.005 })).toBe(900)
    const short = { height: [2, 100, 300], potentialTemperature: [300, 299.8, 299.8] }
    expect(judgeTyped(stepOf('mixed-layer-depth-parcel', { ...short, excess: 0 }), 'not reached')).toMatchObject({ outcome: 'not_reached', isAccepted: true })
    expect(outcome('mixed-layer-depth-bulk-richardson', { ...short, windSpeed: [2, 5, 6], criticalRichardsonNumber: 0.25 })).toMatchObject({ is: 'not_reached' })
    expect(outcome('mixed-layer-depth-gradient', { ...short, leastGradient: 0.005 })).toMatchObject({ is: 'not_reached' })
  })
  it('L26: calm air that is warmer in θ ends the mixed layer at its row and gives no NaN', () => {
    expect(value('mixed-layer-depth-bulk-richardson', { height: [2, 100, 200], potentialTemperature: [300, 300, 301], windSpeed: [0, 3, 0], criticalRichardsonNumber: 0.25 })).toBe(200)
  })
  it('the freezing level is the lowest fall through 0 °C: "none" where all is colder, "not reached" where the data end before', () => {
    expect(value('freezing-level', { height: [100, 600, 1100], temperature: kelvins(5, 2, -1) })).toBeCloseTo(933.33, 2)
    expect(outcome('freezing-level', { height: [100, 600], temperature: kelvins(-1, -5) })).toMatchObject({ is: 'none' })
    expect(outcome('freezing-level', { height: [100, 600], temperature: kelvins(9, 5) })).toMatchObject({ is: 'not_reached' })
    expect(() => outcome('freezing-level', { height: [100, 100], temperature: kelvins(9, -5) })).toThrow('height: the values have to rise')
  })
  it('a share of six rows on one straight line has an error of 0 and no correlation', () => {
    const line = { height: [0, 10, 20, 30, 40, 50], temperature: [290, 289.9, 289.8, 289.7, 289.6, 289.5] }
    expect(outcome('lapse-rate-lag-one-correlation', line)).toMatchObject({ is: 'not_defined' })
    expect(value('lapse-rate-inflated-standard-error', line)).toBeLessThan(1e-9)
    expect(checkBand(stepOf('lapse-rate-theil-sen', line))).toEqual({ ok: true, reasons: [] })
  })
  it('too few rows for an interval by ranks: "not defined", never a number', () => expect(outcome('lapse-rate-theil-sen-standard-error', setS)).toMatchObject({ is: 'not_defined' }))
  it('more rows than can be paired are refused, naming the input', () => {
    const height = Array.from({ length: 3001 }, (_, at) => at)
    expect(() => outcome('lapse-rate-theil-sen', { height, temperature: height.map(() => 280) })).toThrow('height: 3001 rows; at most 3000')
  })
})

describeWithShared('traps L on a real sounding', () => {
  it('L7: Theil–Sen on 850–500 hPa of 22 May 2011 gives 7.594 K/km, least squares 7.832', () => {
    const rows = sharedTable('checks/soundings/metpy_20110522_OUN_12Z.csv').filter(row => Number(row.pressure_hPa) >= 500 && Number(row.pressure_hPa) <= 850)
    const layer = { height: rows.map(row => Number(row.height_m)), temperature: kelvins(...rows.map(row => Number(row.temperature_degC))) }
    expect(value('lapse-rate-theil-sen', layer) * 1000).toBeCloseTo(7.594, 3)
    expect(slips('lapse-rate-theil-sen', layer)['least-squares'] ?? 0).toBeCloseTo(0.007832, 6)
  })
})
