import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { checkBand } from '#shared/marking/proof'
import { formulaeOf } from '#shared/marking/alternatives'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs, Outcome } from '#shared/thermo/definition'
import { lclFunction } from '#shared/thermo/liftingCondensation'
import { moistAir } from '#shared/thermo/moistAir'
import { dewpointAt, surfaceParcel } from '#shared/thermo/parcel'
import { lift, parcelTemperatureAt } from '#shared/thermo/parcelAscent'
import { exampleSounding } from '#shared/thermo/parcelDefinition'
import { pseudoadiabaticTemperature } from '#shared/thermo/pseudoadiabat'
import { findQuantity } from '#shared/thermo/registry'
import { atPressure, makeSounding } from '#shared/thermo/sounding'
import { judgeTyped, kelvins, stepOf } from '../../fixtures/marking/ask'
import { describeWithShared, hasShared, sharedFile } from '../../fixtures/sharedFolder'
import { soundingInputs, temperatureRows } from '../../fixtures/thermo/soundings'

const constants = defaultConvention.constants, formulae = formulaeOf(defaultConvention)
const air = moistAir(constants, formulae), lclOf = lclFunction(constants, formulae)
function outcome(quantity: string, inputs: Inputs, variant?: string): Outcome {
  const definition = findQuantity(quantity)
  if (!definition) throw new Error(quantity)
  return evaluateQuantity(definition, inputs, constants, variant, formulae)
}
function value(quantity: string, inputs: Inputs, variant?: string): number {
  const found = outcome(quantity, inputs, variant)
  return found.is === 'value' ? found.value : NaN
}
const series = (inputs: Inputs, name: string): readonly number[] => {
  const found = inputs[name]
  return Array.isArray(found) ? found : []
}
const rowsFrom = (inputs: Inputs, from: number, to?: number): Inputs => Object.fromEntries(['pressure', 'temperature', 'dewpoint'].map(name => [name, series(inputs, name).slice(from, to)]))
/** Warmer with height all the way: nothing rises. */
const capped: Inputs = { pressure: [100_000, 85_000, 70_000, 50_000, 30_000, 20_000], temperature: kelvins(10, 12, 8, -8, -30, -40), dewpoint: kelvins(2, -5, -15, -35, -50, -60) }

describe('traps C: parcels, CAPE, CIN, indices', () => {
  it('C1: rows below the ground are left out, and the parcel starts at the lowest row at or above it', () => {
    const withBelow = { pressure: [102_000, ...series(exampleSounding, 'pressure')], temperature: [310, ...series(exampleSounding, 'temperature')], dewpoint: [300, ...series(exampleSounding, 'dewpoint')] }
    expect(value('surface-parcel-cape', { ...withBelow, surfacePressure: 100_000 })).toBe(value('surface-parcel-cape', exampleSounding))
    expect(value('surface-parcel-cape', withBelow)).toBeGreaterThan(value('surface-parcel-cape', exampleSounding))
    // a ground between rows: the parcel is the row above it, never extrapolated to it
    expect(value('surface-parcel-lcl-pressure', { ...withBelow, surfacePressure: 101_000 })).toBe(value('surface-parcel-lcl-pressure', exampleSounding))
  })
  it('C2: the mixed-layer parcel has the means of θ and w by pressure, and starts at the pressure of the ground', () => {
    const inputs = { ...exampleSounding, mixedLayerDepth: 7500 }
    // two rows only: by hand
    const kappa = 287 / 1004, [t0 = 0, t1 = 0] = series(exampleSounding, 'temperature'), [d0 = 0, d1 = 0] = series(exampleSounding, 'dewpoint')
    const es = (T: number) => 611.2 * Math.exp(17.67 * (T - 273.15) / (T - 29.65)), w = (d: number, p: number) => 287 / 461.5 * es(d) / (p - es(d))
    expect(value('mixed-layer-mean-potential-temperature', inputs)).toBeCloseTo((t0 + t1 * Math.pow(1000 / 925, kappa)) / 2, 9)
    expect(value('mixed-layer-mean-mixing-ratio', inputs)).toBeCloseTo((w(d0, 100_000) + w(d1, 92_500)) / 2, 12)
    const stated = { ...exampleSounding, parcelPotentialTemperature: value('mixed-layer-mean-potential-temperature', inputs), parcelMixingRatio: value('mixed-layer-mean-mixing-ratio', inputs) }
    expect(value('mixed-layer-parcel-cape-virtual', inputs)).toBeCloseTo(value('stated-parcel-cape-virtual', stated), 6)
    expect(findQuantity('mixed-layer-parcel-cape')?.ask).toMatch(/means of θ and w.*weighted by pressure.*pressure of the ground/)
    expect(outcome('mixed-layer-parcel-lfc', { ...rowsFrom(exampleSounding, 0, 2), mixedLayerDepth: 10_000 })).toMatchObject({ is: 'not_reached' })
  })
  it('C3: the most unstable parcel has the largest θe within 300 hPa: a warm moist layer above a cold morning', () => {
    const morning: Inputs = { ...exampleSounding, temperature: [290.15, ...series(exampleSounding, 'temperature').slice(1)], dewpoint: [286.15, ...series(exampleSounding, 'dewpoint').slice(1)] }
    expect(value('most-unstable-parcel-lcl-pressure', morning)).toBeCloseTo(lclOf(295.65, 292.65, 92_500).pressure, 6)
    expect(value('surface-parcel-lcl-pressure', morning)).toBeCloseTo(lclOf(290.15, 286.15, 100_000).pressure, 6)
    // moist air above 300 hPa over the ground is not looked at
    const aloft: Inputs = { ...morning, dewpoint: series(morning, 'dewpoint').map((Td, at) => (at === 4 ? 264 : Td)) }
    expect(value('most-unstable-parcel-lcl-pressure', aloft)).toBe(value('most-unstable-parcel-lcl-pressure', morning))
  })
  it('C4: virtual correction on both or on neither: two quantities, each the slip of the other', () => {
    const plain = value('surface-parcel-cape', exampleSounding), virtual = value('surface-parcel-cape-virtual', exampleSounding)
    expect(virtual / plain).toBeGreaterThan(1.05)
    expect(judgeTyped(stepOf('surface-parcel-cape', exampleSounding), `${virtual.toFixed(0)} J/kg`)).toMatchObject({ isAccepted: false })
    expect(judgeTyped(stepOf('surface-parcel-cape-virtual', exampleSounding), `${plain.toFixed(0)} J/kg`)).toMatchObject({ isAccepted: false })
    expect(Math.abs(value('surface-parcel-cin-virtual', exampleSounding))).toBeLessThan(Math.abs(value('surface-parcel-cin', exampleSounding)))
    expect(value('surface-parcel-lfc-virtual', exampleSounding)).toBeGreaterThan(value('surface-parcel-lfc', exampleSounding))
  })
  it('C5: CIN is asked with its sign; its size is a sign slip', () => {
    const cin = value('surface-parcel-cin', exampleSounding)
    expect(cin).toBeLessThan(0)
    expect(judgeTyped(stepOf('surface-parcel-cin', exampleSounding), `${(-cin).toFixed(1)} J/kg`)).toMatchObject({ isAccepted: false, slip: { key: 'sign' } })
    expect(judgeTyped(stepOf('surface-parcel-cin', exampleSounding), `${cin.toFixed(1)} J/kg`).isAccepted).toBe(true)
    expect(findQuantity('surface-parcel-cin')?.ask).toContain('CIN ≤ 0')
  })
  it('C6: negative area above the equilibrium level, and between two positive ones, is no CIN', () => {
    const cin = value('surface-parcel-cin', exampleSounding)
    expect(value('surface-parcel-cin', rowsFrom(exampleSounding, 0, 10))).toBe(cin)
    // a warm lid high up splits the positive area: CAPE is less, CIN the same
    const lid: Inputs = { ...exampleSounding, temperature: series(exampleSounding, 'temperature').map((T, at) => (at === 5 ? T + 12 : T)) }
    expect(value('surface-parcel-cin', lid)).toBe(cin)
    expect(value('surface-parcel-cape', lid)).toBeLessThan(value('surface-parcel-cape', exampleSounding))
    expect(value('surface-parcel-cape', lid)).toBeGreaterThan(0)
  })
  it('C7: no level of free convection: CAPE 0, levels "none", CIN "not defined", each of which can be typed', () => {
    expect(value('surface-parcel-cape', capped)).toBe(0)
    for (const [quantity, typed] of [['surface-parcel-lfc', 'none'], ['surface-parcel-el', 'none'], ['surface-parcel-cin', 'not defined']] as const) {
      expect(judgeTyped(stepOf(quantity, capped), typed), quantity).toMatchObject({ isAccepted: true, pointsMilli: 1000 })
      expect(judgeTyped(stepOf(quantity, capped), '0').isAccepted).toBe(false)
    }
    expect(judgeTyped(stepOf('surface-parcel-cape', capped), '0').isAccepted).toBe(true)
  })
  it('C8: already warmer at the condensation level: that is the level of free convection; the area below it does not count', () => {
    const skin: Inputs = { ...exampleSounding, temperature: [306.15, ...series(exampleSounding, 'temperature').slice(1)] }
    expect(value('surface-parcel-lfc', skin)).toBeCloseTo(value('surface-parcel-lcl-pressure', skin), 6)
    expect(value('surface-parcel-cin', skin)).toBe(0)
    expect(findQuantity('surface-parcel-cape')?.ask).toContain('positive area below the condensation level does not count')
  })
  it('C9: of several levels the lowest of free convection and the highest equilibrium are taken, and CAPE is their sum: stated', () => {
    const lid: Inputs = { ...exampleSounding, temperature: series(exampleSounding, 'temperature').map((T, at) => (at === 5 ? T + 12 : T)) }
    expect(value('surface-parcel-lfc', lid)).toBe(value('surface-parcel-lfc', exampleSounding))
    expect(value('surface-parcel-el', lid)).toBe(value('surface-parcel-el', exampleSounding))
    expect(findQuantity('surface-parcel-lfc')?.ask).toContain('the lowest one')
    expect(findQuantity('surface-parcel-el')?.ask).toContain('the highest one')
    expect(findQuantity('surface-parcel-cape')?.ask).toContain('sum of the positive areas')
  })
  it('C10: data that end below the equilibrium level give no CAPE, "not reached"; the area up to their top is a variant of its own name', () => {
    const short = rowsFrom(exampleSounding, 0, 6)
    for (const quantity of ['surface-parcel-cape', 'surface-parcel-el']) expect(judgeTyped(stepOf(quantity, short), 'not reached'), quantity).toMatchObject({ outcome: 'not_reached', isAccepted: true })
    const toTop = outcome('surface-parcel-cape', short, 'to-data-top')
    expect(toTop).toMatchObject({ is: 'value', notes: ['Up to the top of the data at 400 hPa, below the equilibrium level.'] })
    expect(value('surface-parcel-cape', short, 'to-data-top')).toBeLessThan(value('surface-parcel-cape', exampleSounding))
    // a tethersonde's rows end before anything is known of free convection
    const tethered = rowsFrom(exampleSounding, 0, 2)
    for (const quantity of ['surface-parcel-lfc', 'surface-parcel-cape', 'surface-parcel-cin', 'surface-parcel-lifted-index']) expect(outcome(quantity, tethered), quantity).toMatchObject({ is: 'not_reached' })
  })
  it('C11: in ln p with the crossings as nodes: rows put in between change CAPE and CIN by less than 0.5 %', () => {
    const fine: Record<string, number[]> = { pressure: [], temperature: [], dewpoint: [] }
    const p = series(exampleSounding, 'pressure')
    for (let at = 0; at + 1 < p.length; at++) {
      for (let part = 0; part < 8; part++) {
        const share = part / 8
        fine.pressure?.push(Math.exp(Math.log(p[at] ?? 1) * (1 - share) + Math.log(p[at + 1] ?? 1) * share))
        for (const name of ['temperature', 'dewpoint']) fine[name]?.push((series(exampleSounding, name)[at] ?? 0) * (1 - share) + (series(exampleSounding, name)[at + 1] ?? 0) * share)
      }
    }
    for (const quantity of ['surface-parcel-cape', 'surface-parcel-cin']) expect(Math.abs(value(quantity, fine) / value(quantity, exampleSounding) - 1), quantity).toBeLessThan(0.005)
    // without the crossing as a node, a step across it would cancel areas: a parcel colder by a, then warmer by a, has half of each
    const two = makeSounding([100_000, 95_000], [300, 300 * Math.pow(0.95, air.kappa) - 1], [299.9, 290], air)
    expect(lift(two, surfaceParcel(two), { temperature: 300, pressure: 100_000, heightAboveStart: 0 }, false, air).cape).toBeGreaterThan(0)
  })
  it('C11: the parcel’s temperatures are those of the pseudoadiabat', () => {
    const sounding = makeSounding(series(exampleSounding, 'pressure'), series(exampleSounding, 'temperature'), series(exampleSounding, 'dewpoint'), air)
    const parcel = surfaceParcel(sounding), lcl = lclOf(parcel.temperature, parcel.dewpoint, parcel.pressure)
    for (const p of [85_000, 50_000, 25_000]) expect(Math.abs(parcelTemperatureAt(parcel, lcl, p, false, air) - pseudoadiabaticTemperature(lcl.temperature, lcl.pressure, p, air, 0.001))).toBeLessThan(1e-4)
  })
  it('C12: a small CAPE whose band reaches 0 is refused in the proof', () => {
    const small: Inputs = { ...exampleSounding, temperature: series(exampleSounding, 'temperature').map((T, at) => (at === 0 ? T : T + 7.8)) }
    const cape = value('surface-parcel-cape', small)
    expect(cape).toBeGreaterThan(1)
    expect(cape).toBeLessThan(60)
    expect(checkBand(stepOf('surface-parcel-cape', small, { granted: { absoluteSi: 25 } })).reasons.join()).toContain('no energy found')
  })
  it('C13: the lifted index is surroundings less parcel: negative is unstable; the sign turned is a slip', () => {
    const index = value('surface-parcel-lifted-index', exampleSounding)
    expect(index).toBeLessThan(0)
    expect(judgeTyped(stepOf('surface-parcel-lifted-index', exampleSounding), (-index).toFixed(2))).toMatchObject({ isAccepted: false, slip: { key: 'sign' } })
  })
  it('C14: Showalter, K and total totals need 850, 700 and 500 hPa: a high site and a tethersonde have none', () => {
    for (const quantity of ['showalter-index', 'k-index', 'total-totals-index']) {
      expect(outcome(quantity, rowsFrom(exampleSounding, 3)), quantity).toMatchObject({ is: 'not_defined' })
      expect(outcome(quantity, rowsFrom(exampleSounding, 0, 3)), quantity).toMatchObject({ is: 'not_defined' })
      expect(judgeTyped(stepOf(quantity, rowsFrom(exampleSounding, 3)), 'not defined').isAccepted).toBe(true)
    }
    expect(outcome('surface-parcel-lifted-index', rowsFrom(exampleSounding, 5))).toMatchObject({ is: 'not_defined' })
  })
  it('C15: between rows temperature is linear in ln p, and nothing is extrapolated', () => {
    const sounding = makeSounding([100_000, 50_000], [300, 250], [290, 230], air)
    expect(atPressure(sounding, sounding.temperature, 100_000 / Math.sqrt(2))).toBeCloseTo(275, 9)
    expect(atPressure(sounding, sounding.temperature, 49_999)).toBeNull()
    expect(atPressure(sounding, sounding.temperature, 100_001)).toBeNull()
    expect(findQuantity('k-index')?.ask).toContain('linear in ln p')
  })
  it('gaps where continuity is needed are refused, naming the input; so are rows that do not fall', () => {
    expect(() => outcome('surface-parcel-cape', { pressure: [100_000, 40_000], temperature: [300, 250], dewpoint: [290, 230] })).toThrow('pressure: a gap from 1000 to 400 hPa')
    expect(() => outcome('surface-parcel-cape', { pressure: [100_000, 100_000], temperature: [300, 299], dewpoint: [290, 289] })).toThrow('pressure: the values have to fall')
    expect(() => outcome('surface-parcel-cape', { ...exampleSounding, surfacePressure: 30_000, pressure: series(exampleSounding, 'pressure').map(p => p + 30_000) })).not.toThrow(TypeError)
  })
  it('a dewpoint above the temperature is computed and noted', () => {
    const fog: Inputs = { ...exampleSounding, dewpoint: [301.35, ...series(exampleSounding, 'dewpoint').slice(1)] }
    expect(outcome('surface-parcel-cape', fog)).toMatchObject({ is: 'value', notes: ['In some rows the dewpoint lies above the temperature; they are taken as they stand.'] })
  })
  it('the dewpoint of a vapor pressure is that of eₛ', () => {
    for (const T of [200, 240, 273.15, 293.15, 310]) expect(dewpointAt(air.es(T), air)).toBeCloseTo(T, 8)
    expect(() => dewpointAt(0, air)).toThrow('vaporPressure')
  })
  it('M22: precipitable water of a layer says its layer and takes q: 24.27 mm; w gives 24.46', () => {
    const layer = { mixingRatio: 0.008, pressureBottom: 100_000, pressureTop: 70_000 }
    expect(value('layer-precipitable-water', layer) * 1000).toBeCloseTo(24.27, 2)
    expect(value('layer-precipitable-water-by-mixing-ratio', layer) * 1000).toBeCloseTo(24.46, 2)
    expect(judgeTyped(stepOf('layer-precipitable-water', layer, { digits: 4 }), '24.46 mm')).toMatchObject({ isAccepted: false, slip: { key: 'other-humidity' } })
  })
})

describe('traps L on moist layers', () => {
  it.each([[25, 3.84], [15, 4.68], [-10, 7.56]])('L21: Γm at 950 hPa and %d °C is %d K/km, not 6', (celsius, rate) => {
    const found = outcome('layer-stability', { lapseRate: 0.005, meanTemperature: celsius + 273.15, meanPressure: 95_000 })
    expect((found.is === 'class' ? found.more?.saturatedRate ?? 0 : 0) * 1000).toBeCloseTo(rate, 1)
  })
  const classOf = (K_km: number, celsius = 25, relativeHumidity?: number) => judgeTyped(stepOf('layer-stability', { lapseRate: K_km / 1000, meanTemperature: celsius + 273.15, meanPressure: 95_000, ...relativeHumidity === undefined ? {} : { relativeHumidity } }), '').classes
  it('L20: five classes: Γ = 5 K/km at 950 hPa and 25 °C is conditionally unstable; superadiabatic is absolutely unstable', () => {
    expect(classOf(5)).toEqual(['conditionally-unstable'])
    expect(classOf(3)).toEqual(['absolutely-stable'])
    expect(classOf(-10)).toEqual(['absolutely-stable'])
    expect(classOf(3.84)).toContain('saturated-neutral')
    expect(classOf(9.78)).toEqual(['dry-neutral'])
    expect(classOf(12)).toEqual(['absolutely-unstable'])
    const step = stepOf('layer-stability', { lapseRate: 0.012, meanTemperature: 298.15, meanPressure: 95_000 })
    for (const typed of ['superadiabatic', 'absolutely unstable', 'unstable']) expect(judgeTyped(step, typed).isAccepted, typed).toBe(true)
    expect(judgeTyped(step, 'conditionally unstable').isAccepted).toBe(false)
  })
  it('L20: a saturated layer is judged against Γm alone', () => {
    expect(classOf(5, 25, 1)).toEqual(['absolutely-unstable'])
    expect(classOf(3, 25, 1)).toEqual(['absolutely-stable'])
    expect(classOf(5, 25, 0.99)).toEqual(['conditionally-unstable'])
  })
  it('L22: potential instability, ∂θe/∂z < 0, is a quantity of its own and no synonym of conditional instability', () => {
    const layer = { pressureBottom: 95_000, temperatureBottom: 298.15, dewpointBottom: 293.15, pressureTop: 85_000, temperatureTop: 295.15, dewpointTop: 278.15, depth: 970 }
    // Γ is 3.1 K/km, below Γm: absolutely stable, and potentially unstable
    expect(judgeTyped(stepOf('layer-stability', { lapseRate: 3 / 970, meanTemperature: 296.65, meanPressure: 90_000 }), '').classes).toEqual(['absolutely-stable'])
    expect(value('equivalent-potential-temperature-gradient', layer)).toBeLessThan(0)
    expect(judgeTyped(stepOf('potential-stability', layer), 'potentially unstable').isAccepted).toBe(true)
    expect(judgeTyped(stepOf('potential-stability', layer), 'conditionally unstable').isAccepted).toBe(false)
  })
})

describeWithShared('traps C on real soundings', () => {
  it('C2, C4: three definitions of the parcel of 4 May 1999: surface 2644, lowest 100 hPa 2340 J/kg, within 6 %', () => {
    const inputs = soundingInputs('wyo_OUN_1999050400.csv')
    const surface = value('surface-parcel-cape-virtual', inputs, 'to-data-top'), mixed = value('mixed-layer-parcel-cape-virtual', { ...inputs, mixedLayerDepth: 10_000 }, 'to-data-top')
    expect(Math.abs(surface / 2644 - 1)).toBeLessThan(0.06)
    expect(Math.abs(mixed / 2340 - 1)).toBeLessThan(0.06)
    expect(surface - mixed).toBeGreaterThan(200)
    expect(outcome('surface-parcel-cape-virtual', inputs)).toMatchObject({ is: 'not_reached' })
  })
  const indices: Record<string, { published_indices: Record<string, string> }> = hasShared ? JSON.parse(readFileSync(sharedFile('checks/soundings/provenance.json'), 'utf8')) : {}
  const printed = Object.entries(indices).flatMap(([name, { published_indices: found }]) => ([
    ['K index', 'k-index', 273.15, 0.15], ['Totals totals index', 'total-totals-index', 0, 0.15], ['Showalter index', 'showalter-index', 0, 0.35],
  ] as const).flatMap(([title, key, zero, within]) => (title in found ? [[name, title, key, Number(found[title]), zero, within] as const] : [])))
  it.each(printed)('%s: %s as printed by the archive (verified)', (name, _title, key, expected, zero, within) => {
    expect(Math.abs(value(key, temperatureRows(`${name}_alllevels.csv`)) - zero - expected)).toBeLessThanOrEqual(within)
  })
  const water = Object.entries(indices).flatMap(([name, { published_indices: found }]) => ('Precipitable water [mm] for entire sounding' in found ? [[name, Number(found['Precipitable water [mm] for entire sounding'])] as const] : []))
  it.each(water)('%s: precipitable water as printed, which integrates the mixing ratio, within 1.3 %%: %d mm', (name, expected) => {
    expect(Math.abs(value('precipitable-water-by-mixing-ratio', soundingInputs(`${name}.csv`)) * 1000 / expected - 1)).toBeLessThan(0.013)
  })
  it('both lifted indices of 4 May 1999 from the printed means: −8.04 and, with virtual temperature, −8.51', () => {
    const inputs = { ...soundingInputs('wyo_OUN_1999050400.csv'), parcelPotentialTemperature: 299.46, parcelMixingRatio: 0.01385 }
    expect(Math.abs(value('stated-parcel-lifted-index', inputs) + 8.04)).toBeLessThan(0.25)
    expect(Math.abs(value('stated-parcel-lifted-index-virtual', inputs) + 8.51)).toBeLessThan(0.25)
  })
})
