import type { Kelvin, Pascal } from '../../units/brands'
import { kelvin, pascal } from '../../units/brands'
import { celsiusSlip, hectopascalSlip, vaporConstantSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { pressureInput, temperatureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { slip, universalGasConstant } from '../slips'
import { texNumber, worked } from '../tex'

/**
 * Specific volume of dry air from the equation of state, m³ kg⁻¹.
 *
 *   α = R T / p     p in Pa, T in K
 *
 * Source: AMS Glossary of Meteorology, "equation of state"; common practice.
 * Valid: 100–400 K, 1–1200 hPa, where air is an ideal gas to 0.1 %. Limits: no water vapor.
 *
 * @example specificVolume(pascal(101325), kelvin(298.15), { R: 287 }) // 0.84450 m³ kg⁻¹
 */
export function specificVolume(pressure: Pascal, temperature: Kelvin, constants: Constants): number {
  return constant(constants, 'R') * temperature / pressure
}

const p = (inputs: Inputs) => numberOf(inputs, 'pressure')
const T = (inputs: Inputs) => numberOf(inputs, 'temperature')
const value = (inputs: Inputs, constants: Constants) => specificVolume(pascal(p(inputs)), kelvin(T(inputs)), constants)

export const specificVolumeDefinition = oneFormula({
  key: 'specific-volume',
  name: 'specific volume of dry air',
  symbol: 'α',
  unit: 'm3/kg',
  shownUnit: 'm3/kg',
  kind: 'ratio',
  inputs: [pressureInput('pressure', 'pressure', 'p', [100, 120_000]), temperatureInput('temperature', 'air temperature', 'T', [100, 400])],
  constants: ['R'],
  formula: {
    key: 'ideal-gas', label: 'equation of state of dry air', source: { text: 'AMS Glossary of Meteorology, "equation of state"', status: 'common practice' },
    validity: '100–400 K, 1–1200 hPa', knownError: 'below 0.1 % for dry air',
  },
  ask: 'The specific volume α of dry air by the equation of state, with the temperature in kelvin.',
  value,
  working: (inputs, constants, result) => [
    worked('Equation of state, with p in pascal and T in kelvin', '\\alpha = \\frac{R\\,T}{p}', `\\alpha = \\frac{${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(T(inputs), 6)}}{${texNumber(p(inputs), 7)}}`, result, 'm3/kg'),
  ],
  slips: [
    celsiusSlip(value, 'temperature'),
    hectopascalSlip(value, 'pressure'),
    vaporConstantSlip(value),
    slip('universal-gas-constant', 'universal gas constant', 'This comes from the universal gas constant, which belongs to moles and not to kilograms.', (_i, constants, right) => right * universalGasConstant / constant(constants, 'R')),
    slip('inverse', 'density for specific volume', 'This is the density 1/α.', (_i, _c, right) => 1 / right),
  ],
  example: { inputs: { pressure: 101_325, temperature: 298.15 }, gives: 0.844501, within: 0.000001 },
})
