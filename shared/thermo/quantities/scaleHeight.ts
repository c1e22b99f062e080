import { type Kelvin, kelvin, type Meter, meter } from '../../units/brands'
import { celsiusSlip, otherConstantSlip, vaporConstantSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { temperatureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { slip } from '../slips'
import { texNumber, worked } from '../tex'

/**
 * Scale height of pressure: the height over which it falls to 1/e in an isothermal column.
 *
 *   H = R T / g
 *
 * Source: AMS Glossary of Meteorology, "scale height". Valid for dry air; moist air takes the virtual temperature.
 *
 * @example scaleHeight(kelvin(288.15), { R: 287, g: 9.81 }) // 8430.08 m
 */
export function scaleHeight(temperature: Kelvin, constants: Constants): Meter {
  return meter(constant(constants, 'R') * temperature / constant(constants, 'g'))
}

const T = (inputs: Inputs) => numberOf(inputs, 'temperature')
const value = (inputs: Inputs, constants: Constants) => scaleHeight(kelvin(T(inputs)), constants)

export const scaleHeightDefinition = oneFormula({
  key: 'scale-height',
  name: 'scale height of pressure',
  symbol: 'H',
  unit: 'm',
  shownUnit: 'km',
  kind: 'ratio',
  inputs: [temperatureInput('temperature', 'mean temperature of the column', 'T')],
  constants: ['R', 'g'],
  formula: {
    key: 'isothermal', label: 'R T/g', source: { text: 'AMS Glossary of Meteorology, "scale height"', status: 'common practice' },
    validity: 'an isothermal column of dry air', knownError: 'g 9.81 or 9.80665: 0.03 %',
  },
  ask: 'The scale height H = R T/g of pressure in an isothermal column, with the temperature in kelvin.',
  value,
  working: (inputs, constants, result) => [
    worked('Scale height, with T in kelvin', 'H = \\frac{R\\,T}{g}', `H = \\frac{${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(T(inputs), 6)}}{${texNumber(constant(constants, 'g'), 6)}}`, result, 'm', { value: result / 1000, unit: 'km' }),
  ],
  slips: [
    celsiusSlip(value, 'temperature'),
    vaporConstantSlip(value),
    otherConstantSlip(value, 'R', 'cp'),
    slip('meters-for-kilometers', 'm given as km', 'Your number is in meters; the unit beside it says kilometers.', (_i, _c, right) => right * 1000),
    slip('not-divided', 'not divided by g', 'This is R T: divide it by g.', (_i, constants, right) => right * constant(constants, 'g')),
  ],
  example: { inputs: { temperature: 288.15 }, gives: 8430.076, within: 0.001 },
})
