/**
 * Work and heat of dry air in an isothermal change of pressure, per kilogram: all heat goes into work.
 *
 *   q = w = R T ln(p₁/p₂)     Δu = Δh = 0
 *
 * Source: AMS Glossary of Meteorology, "isothermal process"; the integral of p dα by common practice. Valid for an ideal gas.
 */
import { log, log10 } from '../numerics/elementary'
import { type Kelvin, kelvin, type Pascal, pascal } from '../units/brands'
import { celsiusSlip } from './composedSlips'
import { constant } from './constants'
import type { Constants, Inputs, QuantityDefinition } from './definition'
import { processInputs } from './firstLaw'
import { numberOf } from './inputs'
import { oneFormula } from './oneFormula'
import { joulesSlip, kilojoulesSlip, signSlip, slip, universalGasConstant, vaporGasConstant } from './slips'
import { texNumber, worked } from './tex'

/**
 * R T ln(p₁/p₂), J kg⁻¹.
 * @example isothermalWork(kelvin(293.15), pascal(100000), pascal(70000), { R: 287 }) // 30008.5 J kg⁻¹
 */
export function isothermalWork(temperature: Kelvin, from: Pascal, to: Pascal, constants: Constants): number {
  return constant(constants, 'R') * temperature * log(from / to)
}

/** The definition of the work done, or of the heat that pays for it. */
export function isothermalQuantity(of: { key: string, name: string, symbol: string, ask: string, signSentence: string, example: QuantityDefinition['example'] }): QuantityDefinition {
  const value = (inputs: Inputs, constants: Constants) => isothermalWork(kelvin(numberOf(inputs, 'temperature')), pascal(numberOf(inputs, 'pressureStart')), pascal(numberOf(inputs, 'pressureEnd')), constants)
  const ratio = (inputs: Inputs) => numberOf(inputs, 'pressureStart') / numberOf(inputs, 'pressureEnd')
  return oneFormula({
    ...of, unit: 'J/kg', shownUnit: 'kJ/kg', kind: 'difference', nearZero: 1000,
    inputs: processInputs.isothermal,
    constants: ['R'],
    formula: {
      key: 'logarithm', label: 'R T ln(p₁/p₂)', source: { text: 'AMS Glossary of Meteorology, "isothermal process"; the integral of p dα', status: 'common practice' },
      validity: 'an ideal gas at constant temperature', knownError: 'R 287 to 287.05: 0.02 %',
    },
    value,
    working(inputs, constants, result) {
      const logarithm = log(ratio(inputs))
      return [
        worked('Natural logarithm of the ratio of pressures, start to end', '\\ln\\frac{p_1}{p_2}', `\\ln\\frac{${texNumber(numberOf(inputs, 'pressureStart') / 100, 6)}}{${texNumber(numberOf(inputs, 'pressureEnd') / 100, 6)}}`, logarithm, '1'),
        worked('At constant temperature the internal energy stays, and the heat is the work', `${of.symbol} = R\\,T\\,\\ln\\frac{p_1}{p_2}`, `${of.symbol} = ${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(numberOf(inputs, 'temperature'), 6)} \\cdot ${texNumber(logarithm, 6)}`, result, 'J/kg', { value: result / 1000, unit: 'kJ/kg' }, 5),
      ]
    },
    slips: [
      signSlip(of.signSentence),
      celsiusSlip(value, 'temperature'),
      slip('log10-for-ln', 'logarithm to base 10', 'This comes from the logarithm to base 10: the formula has the natural one.', (inputs, _c, right) => right * log10(ratio(inputs)) / log(ratio(inputs))),
      slip('logarithm-left-out', 'difference for the logarithm', 'This takes (p₁ − p₂)/p₁ for ln(p₁/p₂): the pressure falls along the way.', (inputs, _c, right) => right * (1 - 1 / ratio(inputs)) / log(ratio(inputs))),
      slip('vapor-gas-constant', 'gas constant of vapor', 'This comes from the gas constant of water vapor in place of that of dry air.', (_i, constants, right) => right * vaporGasConstant / constant(constants, 'R')),
      slip('universal-gas-constant', 'universal gas constant', 'This comes from the universal gas constant, which belongs to moles and not to kilograms.', (_i, constants, right) => right * universalGasConstant / constant(constants, 'R')),
      slip('cp-for-r', 'cp for R', 'This comes from cp in place of R.', (_i, constants, right) => right * constant(constants, 'cp') / constant(constants, 'R')),
      joulesSlip, kilojoulesSlip,
    ],
  })
}
