import { type Kelvin, kelvin, type KilogramPerCubicMeter, kilogramPerCubicMeter, type Pascal, pascal } from '../../units/brands'
import { celsiusSlip, vaporConstantSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { temperatureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { slip, universalGasConstant } from '../slips'
import { texNumber, worked } from '../tex'

/**
 * Pressure of dry air from its density and temperature.
 *
 *   p = ρ R T     ρ in kg m⁻³, T in K
 *
 * Source: AMS Glossary of Meteorology, "equation of state"; common practice.
 * Valid: 100–400 K, where air is an ideal gas to 0.1 %. Limits: no water vapor.
 *
 * @example pressureByEquationOfState(kilogramPerCubicMeter(1.2), kelvin(288.15), { R: 287 }) // 99238.9 Pa
 */
export function pressureByEquationOfState(density: KilogramPerCubicMeter, temperature: Kelvin, constants: Constants): Pascal {
  return pascal(density * constant(constants, 'R') * temperature)
}

const rho = (inputs: Inputs) => numberOf(inputs, 'density')
const T = (inputs: Inputs) => numberOf(inputs, 'temperature')
const value = (inputs: Inputs, constants: Constants) => pressureByEquationOfState(kilogramPerCubicMeter(rho(inputs)), kelvin(T(inputs)), constants)

export const pressureByEquationOfStateDefinition = oneFormula({
  key: 'pressure-by-equation-of-state',
  name: 'pressure of dry air by the equation of state',
  symbol: 'p',
  unit: 'Pa',
  shownUnit: 'hPa',
  kind: 'ratio',
  inputs: [{ name: 'density', label: 'density of the air', symbol: 'ρ', unit: 'kg/m3', shownUnit: 'kg/m3', kind: 'ratio', shape: 'number', range: [0.001, 10] }, temperatureInput('temperature', 'air temperature', 'T', [100, 400])],
  constants: ['R'],
  formula: {
    key: 'ideal-gas', label: 'equation of state of dry air', source: { text: 'AMS Glossary of Meteorology, "equation of state"', status: 'common practice' },
    validity: '100–400 K', knownError: 'below 0.1 % for dry air',
  },
  ask: 'The pressure p of dry air by the equation of state, with the temperature in kelvin.',
  value,
  working: (inputs, constants, result) => [
    worked('Equation of state, with T in kelvin', 'p = \\rho\\,R\\,T', `p = ${texNumber(rho(inputs))} \\cdot ${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(T(inputs), 6)}`, result, 'Pa', { value: result / 100, unit: 'hPa' }),
  ],
  slips: [
    celsiusSlip(value, 'temperature'),
    slip('pascal-for-hectopascal', 'Pa given as hPa', 'Your number is in pascal; the unit beside it says hectopascal.', (_i, _c, right) => right * 100),
    vaporConstantSlip(value),
    slip('universal-gas-constant', 'universal gas constant', 'This comes from the universal gas constant, which belongs to moles and not to kilograms.', (_i, constants, right) => right * universalGasConstant / constant(constants, 'R')),
    slip('specific-volume-for-density', 'specific volume for density', 'This puts in the specific volume 1/ρ in place of the density.', (inputs, _c, right) => right / rho(inputs) / rho(inputs)),
  ],
  example: { inputs: { density: 1.2, temperature: 288.15 }, gives: 99_238.86, within: 0.01 },
})
