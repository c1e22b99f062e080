import { kilogramPerCubicMeter, type Kelvin, kelvin, type KilogramPerCubicMeter, type Pascal, pascal } from '../../units/brands'
import { constant } from '../constants'
import type { Constants, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { slip, universalGasConstant, vaporGasConstant, zeroCelsius } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Density of dry air from the equation of state.
 *
 *   ρ = p / (R T)     p in Pa, T in K, ρ in kg m⁻³
 *
 * Source: AMS Glossary of Meteorology, "equation of state"; common practice.
 * Valid: 100–400 K, 1–1200 hPa, where air is an ideal gas to 0.1 %. Limits: no water vapor; moist air takes the virtual temperature.
 *
 * @example density(pascal(101325), kelvin(298.15), { R: 287 }) // 1.18413 kg m⁻³
 */
export function density(pressure: Pascal, temperature: Kelvin, constants: Constants): KilogramPerCubicMeter {
  return kilogramPerCubicMeter(pressure / (constant(constants, 'R') * temperature))
}

export const densityDefinition: QuantityDefinition = {
  key: 'density',
  name: 'density of dry air',
  symbol: 'ρ',
  unit: 'kg/m3',
  shownUnit: 'kg/m3',
  kind: 'ratio',
  inputs: [
    { name: 'pressure', label: 'pressure', symbol: 'p', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [100, 120_000] },
    { name: 'temperature', label: 'air temperature', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [100, 400] },
  ],
  variants: [{
    key: 'ideal-gas',
    label: 'equation of state of dry air',
    source: { text: 'AMS Glossary of Meteorology, "equation of state"', status: 'common practice' },
    validity: '100–400 K, 1–1200 hPa',
    knownError: 'below 0.1 % for dry air',
    evaluate: (inputs, constants) => ({ is: 'value', value: density(pascal(numberOf(inputs, 'pressure')), kelvin(numberOf(inputs, 'temperature')), constants) }),
  }],
  constants: ['R'],
  ask: 'The density ρ of dry air by the equation of state, with the temperature in kelvin.',
  trace(inputs, constants) {
    const p = numberOf(inputs, 'pressure'), T = numberOf(inputs, 'temperature'), R = constant(constants, 'R')
    const value = density(pascal(p), kelvin(T), constants)
    return [
      { text: 'Equation of state, with p in pascal and T in kelvin', formula: '\\rho = \\frac{p}{R\\,T}', filled: `\\rho = \\frac{${texNumber(p, 7)}}{${texNumber(R)} \\cdot ${texNumber(T)}} = ${texQuantity(value, 'kg/m3')}`, value, unit: 'kg/m3' },
    ]
  },
  slips: [
    slip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C: the equation of state takes kelvin.', (inputs, _c, right) => {
      const t = numberOf(inputs, 'temperature') - zeroCelsius
      return t === 0 ? null : right * numberOf(inputs, 'temperature') / t
    }),
    slip('hectopascal-for-pascal', 'hPa put in for Pa', 'This is what comes out with the pressure in hPa: with R in J kg⁻¹ K⁻¹ it goes in in pascal.', (_i, _c, right) => right / 100),
    slip('vapor-gas-constant', 'gas constant of vapor', 'This is what comes out with the gas constant of water vapor in place of that of dry air.', (_i, constants, right) => right * constant(constants, 'R') / vaporGasConstant),
    slip('universal-gas-constant', 'universal gas constant', 'This is what comes out with the universal gas constant, which belongs to moles and not to kilograms.', (_i, constants, right) => right * constant(constants, 'R') / universalGasConstant),
    slip('inverse', 'specific volume for density', 'This is the specific volume 1/ρ.', (_i, _c, right) => 1 / right),
  ],
  example: { inputs: { pressure: 101_325, temperature: 298.15 }, gives: 1.18413, within: 0.00001 },
}
