/**
 * Work and heat of dry air along p αⁿ = constant, per kilogram.
 *
 *   w = R (T₁ − T₂)/(n − 1)     T₂ = T₁ (p₂/p₁)^((n−1)/n)     q = cv ΔT + w
 *
 * n = 1 is isothermal (w = R T ln(p₁/p₂)), n = cp/cv adiabatic. Source: AMS Glossary of Meteorology, "polytropic process"; the integral of
 * p dα by common practice. Valid for an ideal gas with constant specific heats.
 */
import { kelvin, pascal } from '../units/brands'
import { otherConstantSlip, swappedSlip } from './composedSlips'
import { constant } from './constants'
import type { Constants, Inputs, QuantityDefinition } from './definition'
import { changeOf, changeSteps, processInputs } from './firstLaw'
import { numberOf } from './inputs'
import { isothermalWork } from './isothermal'
import { oneFormula } from './oneFormula'
import { joulesSlip, kilojoulesSlip, signSlip, slip } from './slips'
import { texFactor, texNumber, worked } from './tex'

const exponent = (inputs: Inputs) => numberOf(inputs, 'polytropicExponent')

/**
 * Work done by the air along p αⁿ = constant, J kg⁻¹.
 * @example polytropicWork({ temperatureStart: 293.15, pressureStart: 100000, pressureEnd: 70000, polytropicExponent: 1.2 }, { R: 287 }) // 24280 J kg⁻¹
 */
export function polytropicWork(inputs: Inputs, constants: Constants): number {
  // the limit of the formula, which itself is 0/0 there
  if (exponent(inputs) === 1) return isothermalWork(kelvin(numberOf(inputs, 'temperatureStart')), pascal(numberOf(inputs, 'pressureStart')), pascal(numberOf(inputs, 'pressureEnd')), constants)
  return -constant(constants, 'R') * changeOf('polytropic', inputs, constants) / (exponent(inputs) - 1)
}

/** Heat taken up along p αⁿ = constant, J kg⁻¹: what the work takes that the internal energy does not pay for. */
export const polytropicHeat = (inputs: Inputs, constants: Constants): number => constant(constants, 'cv') * changeOf('polytropic', inputs, constants) + polytropicWork(inputs, constants)

/** The definition of the work, or of the heat. */
export function polytropicQuantity(of: { key: string, name: string, symbol: string, of: 'work' | 'heat', ask: string, signSentence: string, example: QuantityDefinition['example'] }): QuantityDefinition {
  const isHeat = of.of === 'heat'
  const value = isHeat ? polytropicHeat : polytropicWork
  const { of: _which, signSentence, ...rest } = of
  return oneFormula({
    ...rest, unit: 'J/kg', shownUnit: 'kJ/kg', kind: 'difference', nearZero: 1000,
    inputs: processInputs.polytropic,
    constants: isHeat ? ['R', 'cv'] : ['R'],
    formula: {
      key: 'polytrope', label: isHeat ? 'cv ΔT + R (T₁ − T₂)/(n − 1)' : 'R (T₁ − T₂)/(n − 1)', source: { text: 'AMS Glossary of Meteorology, "polytropic process"; the integral of p dα', status: 'common practice' },
      validity: 'an ideal gas with constant specific heats', knownError: 'R 287 to 287.05, cv 717 to 718.7: 0.2 %',
    },
    value,
    working(inputs, constants, result) {
      const change = changeOf('polytropic', inputs, constants), work = polytropicWork(inputs, constants)
      const steps = [
        ...changeSteps('polytropic', inputs, constants),
        exponent(inputs) === 1
          ? worked('Work done by the air: with n = 1 the process is isothermal', 'w = R\\,T\\,\\ln\\frac{p_1}{p_2}', 'w', work, 'J/kg', { value: work / 1000, unit: 'kJ/kg' }, 5)
          : worked('Work done by the air', 'w = \\frac{-R\\,\\Delta T}{n - 1}', `w = \\frac{-${texNumber(constant(constants, 'R'))} \\cdot ${texFactor(change)}}{${texNumber(exponent(inputs))} - 1}`, work, 'J/kg', { value: work / 1000, unit: 'kJ/kg' }, 5),
      ]
      if (isHeat) steps.push(worked('First law', 'q = c_v\\,\\Delta T + w', `q = ${texNumber(constant(constants, 'cv'), 6)} \\cdot ${texFactor(change)} + ${texFactor(work)}`, result, 'J/kg', { value: result / 1000, unit: 'kJ/kg' }, 5))
      return steps
    },
    slips: [
      signSlip(signSentence),
      swappedSlip(value, 'pressureStart', 'pressureEnd', 'inverted-ratio', 'ratio of pressures turned round', 'This comes from p₁/p₂ in place of p₂/p₁.'),
      slip('n-for-n-minus-1', 'n for n − 1', 'This divides by n in place of n − 1.', (inputs, constants) => {
        const work = polytropicWork(inputs, constants) * (exponent(inputs) - 1) / exponent(inputs)
        return isHeat ? work + constant(constants, 'cv') * changeOf('polytropic', inputs, constants) : work
      }),
      ...(isHeat
        ? [
            slip('enthalpy-for-heat', 'cp ΔT taken for heat', 'This is cp ΔT, the change of enthalpy: it is heat only at constant pressure.', (inputs: Inputs, constants: Constants) => constant(constants, 'cp') * changeOf('polytropic', inputs, constants)),
            slip('work-for-heat', 'work taken for heat', 'This is the work done by the air: the heat is the work and the change of internal energy together.', polytropicWork),
            slip('work-sign', 'sign of the work turned round', 'This takes the work done by the air as done on it.', (inputs: Inputs, constants: Constants) => constant(constants, 'cv') * changeOf('polytropic', inputs, constants) - polytropicWork(inputs, constants)),
          ]
        : [
            slip('adiabatic-work', 'adiabatic work', 'This is −cv ΔT, the work of an adiabatic process.', (inputs: Inputs, constants: Constants) => -constant(constants, 'cv') * changeOf('polytropic', inputs, constants)),
            otherConstantSlip(value, 'R', 'cp'),
          ]),
      joulesSlip, kilojoulesSlip,
    ],
    example: of.example,
  })
}
