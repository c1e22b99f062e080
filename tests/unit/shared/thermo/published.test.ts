import { expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity } from '#shared/thermo/registry'
import type { Constants, Inputs } from '#shared/thermo/definition'
import { straightLine } from '#shared/numerics/regression'
import { fromDouble, toDouble } from '#shared/numerics/rational'
import { fromSi, getUnit } from '#shared/units/ucum'
import { describeWithShared, hasShared, sharedTable } from '../../../fixtures/sharedFolder'

type Row = Record<string, string>
type Given = Record<string, number | string | number[]>
const constants = defaultConvention.constants

const num = (given: Given, name: string): number => {
  const value = given[name]
  if (typeof value !== 'number') throw new Error(`${name} is not in the row`)
  return value
}
const celsius = (given: Given, name: string) => num(given, name) + 273.15
const hecto = (given: Given, name: string) => num(given, name) * 100
const temperature = (given: Given) => ('temperature_K' in given ? num(given, 'temperature_K') : celsius(given, 'temperature_degC'))

/** The value of a quantity in a unit. */
function value(key: string, inputs: Inputs, unit: string, with_: Constants): number {
  const definition = findQuantity(key)
  if (!definition) throw new Error(`no ${key}`)
  const outcome = evaluateQuantity(definition, inputs, with_)
  if (outcome.is !== 'value') throw new Error(`${key} gave ${outcome.is}`)
  return toDouble(fromSi(fromDouble(outcome.value), getUnit(unit), definition.kind !== 'temperature'))
}

const isobaric = (given: Given): Inputs => ({ mass: num(given, 'mass_kg'), temperatureStart: celsius(given, 't1_degC'), temperatureEnd: celsius(given, 't2_degC') })
const adiabatic = (given: Given): Inputs => ({ mass: num(given, 'mass_kg'), temperatureStart: celsius(given, 't1_degC'), pressureStart: hecto(given, 'p1_hPa'), pressureEnd: hecto(given, 'p2_hPa') })

function layerOf(given: Given): Inputs {
  const levels = sharedTable(`checks/soundings/${String(given.sounding)}`).filter(level => Number(level.pressure_hPa) >= 500 && Number(level.pressure_hPa) <= 850)
  return { height: levels.map(level => Number(level.height_m)), temperature: levels.map(level => Number(level.temperature_degC) + 273.15) }
}

/** How a row of the table is asked of the reference; rows of quantities that are not here yet have none. */
const asked: Record<string, (given: Given, with_: Constants) => number> = {
  'potential temperature': (given, with_) => value('potential-temperature', { pressure: hecto(given, 'pressure_hPa'), temperature: temperature(given) }, 'K', with_),
  'density of dry air': (given, with_) => value('density', { pressure: hecto(given, 'pressure_hPa'), temperature: temperature(given) }, 'kg/m3', with_),
  'dry-adiabatic lapse rate': (_given, with_) => value('dry-adiabatic-lapse-rate', {}, 'K/km', with_),
  'hypsometric thickness': (given, with_) => value('hypsometric-thickness', { pressureBottom: hecto(given, 'p1_hPa'), pressureTop: hecto(given, 'p2_hPa'), meanVirtualTemperature: celsius(given, 'mean_virtual_temperature_degC') }, 'm', with_),
  'heat added, isobaric heating of dry air': (given, with_) => value('isobaric-heat-of-mass', isobaric(given), 'kJ', with_),
  'work done by the gas, isobaric heating of dry air': (given, with_) => value('isobaric-work-of-mass', isobaric(given), 'kJ', with_),
  'internal-energy change, isobaric heating of dry air': (given, with_) => value('isobaric-internal-energy-change-of-mass', isobaric(given), 'kJ', with_),
  'enthalpy change, isobaric heating of dry air': (given, with_) => value('isobaric-enthalpy-change-of-mass', isobaric(given), 'kJ', with_),
  'work done by the gas, adiabatic expansion': (given, with_) => value('adiabatic-work-of-mass', adiabatic(given), 'kJ', with_),
  'enthalpy change, adiabatic expansion': (given, with_) => value('adiabatic-enthalpy-change-of-mass', adiabatic(given), 'kJ', with_),
  'heat added, adiabatic expansion': (given, with_) => value('adiabatic-heat-of-mass', adiabatic(given), 'kJ', with_),
  // θ is what a descent conserves: the published end temperature has the θ of the start
  'potential temperature conserved in adiabatic descent': (given, with_) => {
    const start = value('potential-temperature', { pressure: hecto(given, 'p1_hPa'), temperature: celsius(given, 't1_degC') }, 'K', with_)
    const end = value('potential-temperature', { pressure: hecto(given, 'p2_hPa'), temperature: 300 }, 'K', with_)
    return start / end * 300 - 273.15
  },
  'environmental lapse rate 850-500 hPa by least squares': (given, with_) => value('lapse-rate-least-squares', layerOf(given), 'K/km', with_),
  'standard error of that lapse rate': (_given, with_) => value('lapse-rate-standard-error', layerOf({ sounding: 'metpy_20110522_OUN_12Z.csv' }), 'K/km', with_),
  'exponent kappa = Rd/cp': (_given, with_) => (with_.R ?? 0) / (with_.cp ?? 1),
  'specific heat of dry air at constant pressure': (_given, with_) => with_.cp ?? 0,
  'specific heat of dry air at constant volume': (_given, with_) => with_.cv ?? 0,
  'acceleration of gravity': (_given, with_) => with_.g ?? 0,
}
const line = (given: Given) => {
  const x = given.x, y = given.y
  const fitted = Array.isArray(x) && Array.isArray(y) ? straightLine(x, y) : null
  if (!fitted) throw new Error('no line')
  return fitted
}
Object.assign(asked, {
  'least-squares slope': (given: Given) => line(given).slope,
  'least-squares intercept': (given: Given) => line(given).intercept,
  'standard error of the slope': (given: Given) => line(given).slopeError,
  'standard error of the intercept': (given: Given) => line(given).interceptError,
  'coefficient of determination R2': (given: Given) => line(given).rSquared,
})

const rows: Row[] = hasShared ? sharedTable('checks/values.csv').filter(row => row.quantity !== undefined && row.quantity in asked) : []

function off(row: Row, with_: Constants): { got: number, by: number, allowed: number } {
  const given: Given = JSON.parse(row.inputs_json ?? '{}')
  const got = asked[row.quantity ?? '']?.(given, with_) ?? NaN
  return { got, by: Math.abs(got - Number(row.expected)), allowed: Number(row.tolerance) }
}

describeWithShared('published values', () => {
  it('finds the rows of the first quantities in the table', () => expect(rows.length).toBeGreaterThanOrEqual(30))
  it.each(rows.map(row => [row.id, row.quantity, row.expected, row.unit, row.tolerance, row.source, row.status, row] as const))(
    '%s %s: %s %s ± %s (%s; %s)', (_id, _quantity, _expected, _unit, _tolerance, _source, _status, row) => {
      const { got, by, allowed } = off(row, constants)
      expect(by, `computed ${got}`).toBeLessThanOrEqual(allowed)
    })
  it.each(['cp', 'cv', 'R', 'g', 'p0'])('a %s that is 2 %% off turns a published check red', (name) => {
    const corrupted = { ...constants, [name]: (constants[name] ?? 0) * 1.02 }
    expect(rows.filter((row) => {
      const { by, allowed } = off(row, corrupted)
      return !(by <= allowed)
    }).length).toBeGreaterThan(0)
  })
})
