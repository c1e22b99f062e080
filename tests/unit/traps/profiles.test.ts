import { describe, expect, it } from 'vitest'
import { checkBand } from '#shared/marking/proof'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs, Outcome } from '#shared/thermo/definition'
import { binnedRows } from '#shared/thermo/bins'
import { effectiveRows, inflation } from '#shared/thermo/residuals'
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
  it('L16: bins stand at the mean height of their rows, an empty bin is absent, no row counts twice and none is lost', () => {
    const source = randomSource(seedFromNumber(16))
    const height = Array.from({ length: 200 }, () => Math.round(4000 * fraction(source)) / 10).filter(z => z < 120 || z >= 160), temperature = height.map(z => 290 - 0.0075 * z + 0.2 * (fraction(source) - 0.5))
    const bins = binnedRows({ height, temperature, binDepth: 40, binStart: 0 })
    expect(bins.counts.reduce((sum, one) => sum + one, 0)).toBe(height.length)
    expect(bins.centers).not.toContain(140)
    expect(bins.emptyBetween).toEqual([140])
    bins.centers.forEach((center, at) => {
      const rows = height.map((z, row) => ({ z, T: temperature[row] ?? NaN })).filter(({ z }) => z >= center - 20 && z < center + 20)
      expect(bins.counts[at]).toBe(rows.length)
      expect(bins.height[at]).toBeCloseTo(rows.reduce((sum, { z }) => sum + z, 0) / rows.length, 9)
      expect(bins.temperature[at]).toBeCloseTo(rows.reduce((sum, { T }) => sum + T, 0) / rows.length, 9)
    })
    // a row on a bound belongs to the bin above, also where doubles miss the bound: 0.3 is not 3 · 0.1
    expect(binnedRows({ height: [0, 40, 79.9, 80], temperature: [280, 281, 282, 283], binDepth: 40, binStart: 0 }).counts).toEqual([1, 2, 1])
    expect(binnedRows({ height: [0.2, 0.7, 1.2], temperature: [280, 281, 282], binDepth: 0.5, binStart: 0.2 }).counts).toEqual([1, 1, 1])
  })
  it('L16, L11: the fit over bins is a quantity of its own: S with 60 rows at (150 m, 14.4 °C) gives 9.81, as served 9.13', () => {
    const [heights, temperatures] = [setS.height, setS.temperature]
    if (!Array.isArray(heights) || !Array.isArray(temperatures)) throw new Error('set S has its rows')
    const sixty = Array.from({ length: 60 })
    const rows = { height: [...heights, ...sixty.map(() => 150)], temperature: [...temperatures, ...sixty.map(() => 287.55)] }
    const binned = { ...rows, binDepth: 50, binStart: 75 }
    expect(value('lapse-rate-binned-least-squares', binned) * 1000).toBeCloseTo(9.81, 2)
    expect(judgeTyped(stepOf('lapse-rate-binned-least-squares', binned), '9.81').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('lapse-rate-binned-least-squares', binned), '9.13')).toMatchObject({ isAccepted: false, slip: { key: 'as-served' } })
    expect(judgeTyped(stepOf('lapse-rate-least-squares', rows), '9.81').isAccepted).toBe(false)
    // bins from another height: the rows of one level stay together, the means of height do not lie at centers
    const lower = { height: [100, 120, 190, 260, 290], temperature: kelvins(15, 14.9, 14.2, 13.5, 13.3), binDepth: 100, binStart: 100 }
    expect(value('lapse-rate-binned-least-squares', lower) * 1000).toBeCloseTo((14.7 - 13.4) / (275 - 410 / 3) * 1000, 9)
    expect(slips('lapse-rate-binned-least-squares', lower)['bin-centers']).toBeCloseTo((14.7 - 13.4) / 100, 9)
    expect(() => outcome('lapse-rate-binned-least-squares', { ...lower, binDepth: 1000 })).toThrow('height: all rows lie in one bin')
  })
  it('L16: a bin without rows taken for 0 °C is a slip', () => {
    const gap = { height: [0, 10, 100, 110], temperature: kelvins(15, 14.9, 14.0, 13.9), binDepth: 50, binStart: 0 }
    expect(value('lapse-rate-binned-least-squares', gap) * 1000).toBeCloseTo(10, 9)
    expect(outcome('lapse-rate-binned-least-squares', gap)).toMatchObject({ notes: ['1 bin has no row and is left out.'], more: { bins: 2, rows: 4 } })
    expect(Math.abs((slips('lapse-rate-binned-least-squares', gap)['empty-as-zero'] ?? 0) * 1000 - 10)).toBeGreaterThan(0.5)
  })
  it('L19: the lapse rate of virtual temperature is a quantity of its own: w 12 → 8 g/kg, T 15 → 11 °C over 500 m give 9.41 and 8.00 K/km', () => {
    const plain = { height: [0, 500], temperature: kelvins(15, 11) }, moist = { ...plain, mixingRatio: [0.012, 0.008] }
    expect(value('lapse-rate-end-points', plain) * 1000).toBeCloseTo(8, 9)
    expect(value('virtual-temperature-lapse-rate-end-points', moist) * 1000).toBeCloseTo(9.41, 2)
    expect(judgeTyped(stepOf('virtual-temperature-lapse-rate-end-points', moist), '9.41').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('virtual-temperature-lapse-rate-end-points', moist), '8.00')).toMatchObject({ isAccepted: false, slip: { key: 'plain-temperature' } })
    expect(judgeTyped(stepOf('lapse-rate-end-points', plain), '9.41').isAccepted).toBe(false)
    const rows = { height: [0, 100, 300, 500], temperature: kelvins(15, 14.4, 12.5, 11), mixingRatio: [0.012, 0.0113, 0.0094, 0.008] }
    for (const method of ['end-points', 'least-squares', 'theil-sen']) {
      const dry = { ...rows, mixingRatio: [0, 0, 0, 0] }, { mixingRatio: _left, ...without } = rows
      expect(value(`virtual-temperature-lapse-rate-${method}`, dry)).toBe(value(`lapse-rate-${method}`, without))
      expect(value(`virtual-temperature-lapse-rate-${method}`, rows) - value(`lapse-rate-${method}`, without)).toBeGreaterThan(0.001)
    }
  })
  it('L19: static stability with moisture goes by Tv: a layer that is stable in T can be superadiabatic in Tv, as θv of its ends says', () => {
    const T = [288.15, 283.6], w = [0.014, 0.009], z = [0, 500], gravity = 9.81, R = 287, Rv = 461.5, cp = 1004
    const Tv = T.map((one, at) => one * (1 + (w[at] ?? 0) * Rv / R) / (1 + (w[at] ?? 0)))
    const plain = value('lapse-rate-end-points', { height: z, temperature: T }), virtual = value('virtual-temperature-lapse-rate-end-points', { height: z, temperature: T, mixingRatio: w })
    expect(outcome('static-stability', { lapseRate: plain })).toMatchObject({ key: 'stable' })
    expect(outcome('static-stability-by-virtual-temperature', { virtualLapseRate: virtual })).toMatchObject({ key: 'superadiabatic' })
    // by hand, from θv at both ends with a hydrostatic pressure between them; κ of dry air
    const [low = 0, high = 0] = Tv, mean = (low + high) / 2, above = 100_000 * Math.exp(-gravity * 500 / (R * mean))
    const thetaLow = low, thetaHigh = high * Math.pow(100_000 / above, R / cp)
    expect(thetaHigh).toBeLessThan(thetaLow)
    const middle = { virtualTemperature: mean, virtualPotentialTemperature: (thetaLow + thetaHigh) / 2, virtualLapseRate: virtual }
    expect(Math.abs(value('virtual-potential-temperature-gradient', middle) - (thetaHigh - thetaLow) / 500)).toBeLessThan(1e-6)
    const squared = value('brunt-vaisala-frequency-squared', { potentialTemperatureBottom: thetaLow, potentialTemperatureTop: thetaHigh, depth: 500 })
    expect(squared).toBeLessThan(0)
    expect(Math.abs(value('brunt-vaisala-frequency-squared-from-virtual-lapse-rate', { virtualTemperature: mean, virtualLapseRate: virtual }) - squared)).toBeLessThan(1e-7)
    expect(value('brunt-vaisala-frequency-squared-from-lapse-rate', { temperature: 286, lapseRate: plain })).toBeGreaterThan(0)
  })
  it('L14: all three rates have their lag-1 correlation and inflated error; a seeded series with 0.9 gives its r₁ back by each', () => {
    const source = randomSource(seedFromNumber(141)), z = Array.from({ length: 1500 }, (_, at) => at), T: number[] = []
    let before = 0
    for (const height of z) {
      before = 0.9 * before + Array.from({ length: 12 }, () => fraction(source)).reduce((sum, one) => sum + one, -6)
      T.push(290 - 0.0065 * height + 0.05 * before)
    }
    const rows = { height: z, temperature: T }
    for (const key of ['lapse-rate-lag-one-correlation', 'lapse-rate-end-points-lag-one-correlation', 'lapse-rate-theil-sen-lag-one-correlation']) expect(Math.abs(value(key, rows) - 0.9), key).toBeLessThan(0.04)
    const r = value('lapse-rate-theil-sen-lag-one-correlation', rows)
    expect(value('lapse-rate-theil-sen-inflated-standard-error', rows) / value('lapse-rate-theil-sen-standard-error', rows)).toBeCloseTo(Math.sqrt((1 + r) / (1 - r)), 9)
    // the end rows are single readings here: they lose nothing by correlation, and it is said
    expect(outcome('lapse-rate-end-points-inflated-standard-error', { ...rows, readingDeviation: 0.1 })).toMatchObject({ value: value('lapse-rate-end-points-standard-error', { ...rows, readingDeviation: 0.1 }), notes: ['Each end is a single reading: correlation takes nothing from it.'] })
  })
  it('L14: the ends’ means lose by correlation, down to what one reading says and no farther', () => {
    expect(effectiveRows(10, 0.5)).toBeCloseTo(10 / 3, 12)
    expect(effectiveRows(10, 0.95)).toBe(1)
    expect(effectiveRows(10, -0.5)).toBe(10)
    const stops = { height: [10, 10, 10, 10, 60, 110, 160, 210, 210, 210, 210], temperature: [290.0, 290.1, 290.2, 290.1, 289.9, 289.3, 288.6, 288.2, 288.1, 288.0, 288.1], readingDeviation: 0.1 }
    const plain = value('lapse-rate-end-points-standard-error', stops), inflated = value('lapse-rate-end-points-inflated-standard-error', stops)
    expect(inflated).toBeGreaterThan(plain)
    expect(inflated).toBeLessThan(0.1 * Math.sqrt(2) / 200)
    expect(judgeTyped(stepOf('lapse-rate-end-points-inflated-standard-error', stops), '0.354')).toMatchObject({ isAccepted: false, slip: { key: 'not-inflated' } })
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
