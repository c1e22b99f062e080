import { pow } from '../../numerics/elementary'
import { type Kelvin, kelvin, type Pascal, pascal } from '../../units/brands'
import { celsiusSlip, endUnitSlip, zero273Slip } from '../composedSlips'
import { constant, kappaOf } from '../constants'
import type { Constants, Inputs } from '../definition'
import { pressureInput, temperatureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { poissonTemperature } from '../poisson'
import { slip, zeroCelsius } from '../slips'
import { texNumber, texQuantity, worked } from '../tex'

/**
 * Temperature of dry air of a potential temperature at a pressure: the inverse of θ.
 *
 *   T = θ (p / p₀)^κ     p₀ = 1000 hPa, κ = R/cp
 *
 * Source: AMS Glossary of Meteorology, "potential temperature". Valid: 150–400 K, 10–1200 hPa. Limits: no water vapor, cp constant.
 *
 * @example temperatureFromPotentialTemperature(kelvin(300), pascal(85000), closed1004.constants) // 286.38 K
 */
export function temperatureFromPotentialTemperature(potentialTemperature: Kelvin, pressure: Pascal, constants: Constants): Kelvin {
  return poissonTemperature(potentialTemperature, pascal(constant(constants, 'p0')), pressure, constants)
}

const theta = (inputs: Inputs) => numberOf(inputs, 'potentialTemperature')
const p = (inputs: Inputs) => numberOf(inputs, 'pressure')
const value = (inputs: Inputs, constants: Constants) => theta(inputs) * pow(p(inputs) / constant(constants, 'p0'), kappaOf(constants))

export const temperatureFromPotentialTemperatureDefinition = oneFormula({
  key: 'temperature-from-potential-temperature',
  name: 'temperature from the potential temperature',
  symbol: 'T',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: [{ ...temperatureInput('potentialTemperature', 'potential temperature', 'θ', [150, 1000]), shownUnit: 'K' }, pressureInput()],
  constants: ['R', 'cp', 'p0', 'kappa'],
  formula: {
    key: 'poisson', label: 'Poisson’s relation, p₀ = 1000 hPa', source: { text: 'AMS Glossary of Meteorology, "potential temperature"', status: 'verified' },
    validity: '150–400 K, 10–1200 hPa', knownError: 'κ 0.2854 to 0.286: 0.06 K at 700 hPa, 0.3 K at 100 hPa',
  },
  ask: 'The temperature T of dry air of the potential temperature θ, which refers to 1000 hPa, at the pressure p.',
  value: (inputs, constants) => temperatureFromPotentialTemperature(kelvin(theta(inputs)), pascal(p(inputs)), constants),
  working: (inputs, constants, result) => [
    { text: 'Exponent', formula: '\\kappa = \\frac{R}{c_p}', filled: `\\kappa = ${texNumber(kappaOf(constants))}`, value: kappaOf(constants), unit: '1' },
    worked('Poisson’s relation, with θ in kelvin', 'T = \\theta \\left(\\frac{p}{p_0}\\right)^{\\kappa}', `T = ${texNumber(theta(inputs), 6)} \\left(\\frac{${texNumber(p(inputs) / 100, 6)}}{${texNumber(constant(constants, 'p0') / 100)}}\\right)^{${texNumber(kappaOf(constants))}} = ${texQuantity(result - zeroCelsius, 'Cel')}`, result, 'K'),
  ],
  slips: [
    slip('inverted-ratio', 'ratio of pressures turned round', 'This comes from p₀/p in place of p/p₀.', (inputs, constants) => theta(inputs) * pow(p(inputs) / constant(constants, 'p0'), -kappaOf(constants))),
    slip('inverted-exponent', 'exponent turned round', 'This comes from the exponent cp/R in place of R/cp.', (inputs, constants) => theta(inputs) * pow(p(inputs) / constant(constants, 'p0'), 1 / kappaOf(constants))),
    slip('cv-for-cp', 'cv for cp', 'This comes from the exponent R/cv in place of R/cp.', (inputs, constants) => theta(inputs) * pow(p(inputs) / constant(constants, 'p0'), constant(constants, 'R') / constant(constants, 'cv'))),
    slip('standard-pressure', '1013.25 hPa for 1000 hPa', 'This refers to 1013.25 hPa: θ refers to 1000 hPa.', (_i, constants, right) => right * pow(constant(constants, 'p0') / 101_325, kappaOf(constants))),
    celsiusSlip(value, 'potentialTemperature', 'Cel'),
    endUnitSlip('Cel'),
    zero273Slip(value, 'potentialTemperature'),
  ],
  example: { inputs: { potentialTemperature: 300, pressure: 85_000 }, gives: 286.3816, within: 0.0001 },
})
