import { describe, expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { hydrostatics } from '#shared/thermo/groups/hydrostatics'
import { findQuantity } from '#shared/thermo/registry'
import { judgeTyped, stepOf } from '../../fixtures/marking/ask'

function value(quantity: string, inputs: Inputs): number {
  const definition = findQuantity(quantity)
  if (!definition) throw new Error(quantity)
  const outcome = evaluateQuantity(definition, inputs, defaultConvention.constants)
  return outcome.is === 'value' ? outcome.value : NaN
}
const slips = (quantity: string, inputs: Inputs) => Object.fromEntries(judgeTyped(stepOf(quantity, inputs), '').slipValues.map(slip => [slip.key, slip.value]))
const launch: Inputs = { stationPressure: 97_500, pressure: 94_000, meanVirtualTemperature: 283.15 }
const above = (more: Inputs = {}) => value('hypsometric-height-above-launch', { ...launch, ...more })

describe('traps H: heights and pressure', () => {
  it.each([[1000, 999.84], [5000, 4996.07], [10_000, 9984.29]])('H1: the geometric height %d m is %d m of geopotential height', (geometric, geopotential) => {
    expect(value('geopotential-height', { geometricHeight: geometric })).toBeCloseTo(geopotential, 2)
    expect(value('geometric-height', { geopotentialHeight: value('geopotential-height', { geometricHeight: geometric }) })).toBeCloseTo(geometric, 7)
  })
  it('H1: taking the one for the other is a slip where the digits show it', () => {
    expect(judgeTyped(stepOf('geopotential-height', { geometricHeight: 10_000 }, { digits: 5 }), '10000 m')).toMatchObject({ isAccepted: false, slip: { key: 'unchanged' } })
  })
  it('H2: the anchor of a flight is the station pressure at the barometer: 303.0 m; from 1013.25 hPa 621.9 m, a slip', () => {
    expect(Math.abs(above() - 303.0)).toBeLessThan(0.3)
    expect(Math.abs((slips('hypsometric-height-above-launch', launch)['standard-pressure'] ?? 0) - 621.9)).toBeLessThan(0.6)
  })
  it('H3: a barometer 28 m above the launch point shifts every height by 28 m; 28 m are 3.29 hPa', () => {
    expect(above({ barometerHeight: 28 }) - above()).toBeCloseTo(28, 9)
    expect(Math.abs((97_500 - value('pressure-at-height', { pressure: 97_500, heightDifference: 28, meanVirtualTemperature: 283.15 })) / 100 - 3.29)).toBeLessThan(0.01)
    const step = stepOf('hypsometric-height-above-launch', { ...launch, barometerHeight: 28 })
    expect(judgeTyped(step, '303 m')).toMatchObject({ isAccepted: false, slip: { key: 'barometer-height-left-out' } })
  })
  it('H4: with a pressure that falls by 1.2 hPa/h a fixed anchor is 20.4 m too high after 2 h', () => {
    const falling = { pressureTendency: -120 / 3600, timeSinceLaunch: 7200 }
    expect(Math.abs(above() - above(falling) - 20.4)).toBeLessThan(0.05)
    expect(judgeTyped(stepOf('hypsometric-height-above-launch', { ...launch, ...falling }), '303 m')).toMatchObject({ isAccepted: false, slip: { key: 'fixed-anchor' } })
  })
  it('H5: an offset of 1 hPa that is left in is 8.5 m', () => {
    // the sonde reads 1 hPa too little on the ground, and so it does aloft: the height comes out too large
    expect(Math.abs(above() - above({ pressureOffset: -100 }) - 8.5)).toBeLessThan(0.4)
    const low = slips('hypsometric-height-above-launch', { ...launch, pressureOffset: -100 })
    expect((low['offset-left-in'] ?? 0) - above()).toBeCloseTo(0, 9)
    const onGround = value('hypsometric-height-above-launch', { stationPressure: 97_500, pressure: 97_400, meanVirtualTemperature: 283.15, pressureOffset: -100 })
    expect(onGround).toBe(0)
    expect(Math.abs(value('hypsometric-height-above-launch', { stationPressure: 97_500, pressure: 97_400, meanVirtualTemperature: 283.15 }) - 8.5)).toBeLessThan(0.05)
  })
  it('H7: a pressure altitude of 1000 m is at about 947 m in air 15 K colder than the standard: two quantities', () => {
    const pressure = value('standard-atmosphere-pressure', { geopotentialHeight: 1000 })
    expect(value('pressure-altitude', { pressure })).toBeCloseTo(1000, 6)
    const mean = (288.15 + 281.65) / 2 - 15
    const sonde = { stationPressure: 101_325, pressure, meanVirtualTemperature: mean }
    expect(Math.abs(value('hypsometric-height-above-launch', sonde) - 947)).toBeLessThan(1)
    expect(judgeTyped(stepOf('hypsometric-height-above-launch', sonde), '1000 m')).toMatchObject({ isAccepted: false, slip: { key: 'pressure-altitude' } })
    expect(judgeTyped(stepOf('pressure-altitude', { pressure }), '947 m').isAccepted).toBe(false)
  })
  it('H8: 975 hPa at 320 m and 10 °C: 1013.2 hPa with a mean along 6.5 K/km, 1013.4 isothermal; each asks for its mean', () => {
    const station = { stationPressure: 97_500, stationHeight: 320, stationTemperature: 283.15 }
    expect(Math.abs(value('sea-level-pressure', station) / 100 - 1013.2)).toBeLessThan(0.08)
    expect(Math.abs(value('sea-level-pressure-isothermal', station) / 100 - 1013.4)).toBeLessThan(0.08)
    expect(value('sea-level-pressure-isothermal', station)).toBeGreaterThan(value('sea-level-pressure', station))
    expect(findQuantity('sea-level-pressure')?.ask).toContain('6.5 K km⁻¹')
    expect(findQuantity('sea-level-pressure-isothermal')?.ask).toContain('isothermal')
  })
  it('H9: the standard atmosphere cools by 6.5 K per geopotential kilometer, and not per geometric one', () => {
    expect(value('standard-atmosphere-temperature', { geopotentialHeight: 10_000 })).toBeCloseTo(223.15, 9)
    expect(value('standard-atmosphere-temperature-at-geometric-height', { geometricHeight: 10_000 })).toBeCloseTo(288.15 - 0.0065 * 9984.293, 4)
  })
  it('H10: a thickness needs no station pressure, the height of a level does', () => {
    const thickness = findQuantity('hypsometric-thickness'), height = findQuantity('hypsometric-height-above-launch')
    if (!thickness || !height) throw new Error('they are there')
    expect(thickness.inputs.map(input => input.name)).not.toContain('stationPressure')
    expect(() => evaluateQuantity(height, { pressure: 94_000, meanVirtualTemperature: 283.15 }, defaultConvention.constants)).toThrow('stationPressure is missing')
    expect(() => evaluateQuantity(thickness, { ...launch, pressureBottom: 97_500, pressureTop: 94_000 }, defaultConvention.constants)).toThrow('is not an input')
  })
  it('H11: every height that is asked or put in says what it is above', () => {
    for (const definition of hydrostatics.quantities) {
      for (const input of definition.inputs) if (/[Hh]eight$/.test(input.name)) expect(input.label, `${definition.key} ${input.name}`).toMatch(/above/)
      if (/height|altitude/.test(definition.key) && definition.unit === 'm' && definition.key !== 'scale-height') expect(definition.ask, definition.key).toMatch(/above|standard atmosphere/)
    }
  })
  it('H12: a roof’s barometer is no ground: below it a sonde has a height under the barometer’s', () => {
    const onGround = { stationPressure: 97_500, pressure: 97_829, meanVirtualTemperature: 283.15, barometerHeight: 28 }
    expect(Math.abs(value('hypsometric-height-above-launch', onGround))).toBeLessThan(0.2)
  })
})
