import { type Kelvin, kelvin, type Pascal, pascal } from '../../units/brands'
import { swappedSlip } from '../composedSlips'
import type { Inputs } from '../definition'
import { pressureInput, temperatureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { slip, zeroCelsius } from '../slips'
import { texNumber, worked } from '../tex'

/**
 * Pressure after heating or cooling at constant volume.
 *
 *   p₂ = p₁ T₂ / T₁     T in K
 *
 * Source: AMS Glossary of Meteorology, "equation of state", at constant specific volume. Valid for an ideal gas.
 *
 * @example pressureAfterIsochoricHeating(pascal(90000), kelvin(273.15), kelvin(303.15)) // 99885 Pa
 */
export function pressureAfterIsochoricHeating(pressure: Pascal, from: Kelvin, to: Kelvin): Pascal {
  return pascal(pressure * to / from)
}

const start = (inputs: Inputs) => numberOf(inputs, 'pressureStart')
const T1 = (inputs: Inputs) => numberOf(inputs, 'temperatureStart')
const T2 = (inputs: Inputs) => numberOf(inputs, 'temperatureEnd')
const value = (inputs: Inputs) => pressureAfterIsochoricHeating(pascal(start(inputs)), kelvin(T1(inputs)), kelvin(T2(inputs)))

export const pressureAfterIsochoricHeatingDefinition = oneFormula({
  key: 'pressure-after-isochoric-heating',
  name: 'pressure after heating at constant volume',
  symbol: 'p₂',
  unit: 'Pa',
  shownUnit: 'hPa',
  kind: 'ratio',
  inputs: [pressureInput('pressureStart', 'pressure at the start', 'p₁', [1000, 1_000_000]), temperatureInput('temperatureStart', 'temperature at the start', 'T₁', [100, 1000]), temperatureInput('temperatureEnd', 'temperature at the end', 'T₂', [100, 1000])],
  constants: [],
  formula: {
    key: 'ideal-gas', label: 'p/T stays', source: { text: 'AMS Glossary of Meteorology, "equation of state", at constant specific volume', status: 'common practice' },
    validity: 'an ideal gas in a rigid vessel', knownError: '273 for 273.15: 0.02 hPa for 30 K',
  },
  ask: 'The pressure p₂ of the air after it is heated or cooled at constant volume, with the temperatures in kelvin.',
  value,
  working: (inputs, _constants, result) => [
    worked('At constant volume p/T stays, with T in kelvin', 'p_2 = p_1 \\frac{T_2}{T_1}', `p_2 = ${texNumber(start(inputs) / 100, 6)} \\cdot \\frac{${texNumber(T2(inputs), 6)}}{${texNumber(T1(inputs), 6)}}`, result, 'Pa', { value: result / 100, unit: 'hPa' }),
  ],
  slips: [
    swappedSlip(value, 'temperatureStart', 'temperatureEnd', 'inverted-ratio', 'ratio of temperatures turned round', 'This comes from T₁/T₂ in place of T₂/T₁.'),
    slip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperatures in °C: their ratio takes kelvin.', (inputs, _c) => {
      const before = T1(inputs) - zeroCelsius
      return before === 0 ? null : start(inputs) * (T2(inputs) - zeroCelsius) / before
    }),
    slip('change-only', 'change for pressure', 'This is the change of pressure: add it to the pressure at the start.', (inputs, _c, right) => right - start(inputs)),
    slip('pascal-for-hectopascal', 'Pa given as hPa', 'Your number is in pascal; the unit beside it says hectopascal.', (_i, _c, right) => right * 100),
  ],
  example: { inputs: { pressureStart: 90_000, temperatureStart: 273.15, temperatureEnd: 303.15 }, gives: 99_884.68, within: 0.01 },
})
