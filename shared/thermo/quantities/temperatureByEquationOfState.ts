import { type Kelvin, kelvin, type KilogramPerCubicMeter, kilogramPerCubicMeter, type Pascal, pascal } from '../../units/brands'
import { endUnitSlip, vaporConstantSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { OutOfRangeError } from '../errors'
import { pressureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { slip, zeroCelsius } from '../slips'
import { texNumber, texQuantity, worked } from '../tex'

/**
 * Temperature of dry air from its pressure and density.
 *
 *   T = p / (ρ R)     p in Pa, ρ in kg m⁻³
 *
 * Source: AMS Glossary of Meteorology, "equation of state"; common practice.
 * Valid: 100–400 K, where air is an ideal gas to 0.1 %. Limits: no water vapor.
 *
 * @throws {OutOfRangeError} where pressure and density together give no temperature of air
 * @example temperatureByEquationOfState(pascal(95000), kilogramPerCubicMeter(1.15), { R: 287 }) // 287.835 K
 */
export function temperatureByEquationOfState(pressure: Pascal, density: KilogramPerCubicMeter, constants: Constants): Kelvin {
  const temperature = pressure / (density * constant(constants, 'R'))
  if (!(temperature >= 50 && temperature <= 1000)) throw new OutOfRangeError('density', density, `the densities that give 50 to 1000 K at ${pressure} Pa`)
  return kelvin(temperature)
}

const rho = (inputs: Inputs) => numberOf(inputs, 'density')
const p = (inputs: Inputs) => numberOf(inputs, 'pressure')
const value = (inputs: Inputs, constants: Constants) => temperatureByEquationOfState(pascal(p(inputs)), kilogramPerCubicMeter(rho(inputs)), constants)

export const temperatureByEquationOfStateDefinition = oneFormula({
  key: 'temperature-by-equation-of-state',
  name: 'temperature of dry air by the equation of state',
  symbol: 'T',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: [pressureInput('pressure', 'pressure', 'p', [100, 120_000]), { name: 'density', label: 'density of the air', symbol: 'ρ', unit: 'kg/m3', shownUnit: 'kg/m3', kind: 'ratio', shape: 'number', range: [0.001, 10] }],
  constants: ['R'],
  formula: {
    key: 'ideal-gas', label: 'equation of state of dry air', source: { text: 'AMS Glossary of Meteorology, "equation of state"', status: 'common practice' },
    validity: '100–400 K', knownError: 'R 287 to 287.05: 0.05 K',
  },
  ask: 'The temperature T of dry air by the equation of state.',
  value,
  working: (inputs, constants, result) => [
    worked('Equation of state, with p in pascal', 'T = \\frac{p}{\\rho\\,R}', `T = \\frac{${texNumber(p(inputs), 7)}}{${texNumber(rho(inputs))} \\cdot ${texNumber(constant(constants, 'R'))}} = ${texQuantity(result - zeroCelsius, 'Cel')}`, result, 'K'),
  ],
  slips: [
    endUnitSlip('Cel'),
    slip('hectopascal-for-pascal', 'hPa put in for Pa', 'This is what comes out with the pressure in hPa: with R in J kg⁻¹ K⁻¹ it goes in in pascal.', (_i, _c, right) => right / 100),
    vaporConstantSlip(value),
    slip('cp-for-r', 'cp for R', 'This comes from cp in place of R.', (_i, constants, right) => right * constant(constants, 'R') / constant(constants, 'cp')),
    slip('specific-volume-for-density', 'specific volume for density', 'This puts in the specific volume 1/ρ in place of the density.', (inputs, _c, right) => right * rho(inputs) * rho(inputs)),
  ],
  example: { inputs: { pressure: 95_000, density: 1.15 }, gives: 287.8352, within: 0.0001 },
})
