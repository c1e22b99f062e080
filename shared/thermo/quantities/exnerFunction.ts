import { pow } from '../../numerics/elementary'
import { type Pascal, pascal } from '../../units/brands'
import { hectopascalSlip } from '../composedSlips'
import { constant, kappaOf } from '../constants'
import type { Constants, Inputs } from '../definition'
import { pressureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { slip } from '../slips'
import { texNumber, worked } from '../tex'

/**
 * Exner function of dry air, dimensionless.
 *
 *   Π = (p / p₀)^κ     p₀ = 1000 hPa, κ = R/cp, so that T = Π θ
 *
 * Source: AMS Glossary of Meteorology, "Exner function". Some texts call cp (p/p₀)^κ by the same name: that is another quantity, in J kg⁻¹ K⁻¹.
 * Valid: 10–1200 hPa.
 *
 * @example exnerFunction(pascal(85000), { R: 287, cp: 1004, p0: 100000 }) // 0.9546055
 */
export function exnerFunction(pressure: Pascal, constants: Constants): number {
  return pow(pressure / constant(constants, 'p0'), kappaOf(constants))
}

const p = (inputs: Inputs) => numberOf(inputs, 'pressure')
const value = (inputs: Inputs, constants: Constants) => exnerFunction(pascal(p(inputs)), constants)

export const exnerFunctionDefinition = oneFormula({
  key: 'exner-function',
  name: 'Exner function',
  symbol: 'Π',
  unit: '1',
  shownUnit: '1',
  kind: 'ratio',
  inputs: [pressureInput()],
  constants: ['R', 'cp', 'p0', 'kappa'],
  formula: {
    key: 'power', label: '(p/p₀)^κ, p₀ = 1000 hPa', source: { text: 'AMS Glossary of Meteorology, "Exner function"', status: 'common practice' },
    validity: '10–1200 hPa', knownError: 'κ 0.2854 to 0.286: 0.02 % at 700 hPa, 0.14 % at 100 hPa',
  },
  ask: 'The dimensionless Exner function Π = (p/p₀)^κ with p₀ = 1000 hPa and κ = R/cp, not multiplied by cp.',
  value,
  working: (inputs, constants, result) => [
    { text: 'Exponent', formula: '\\kappa = \\frac{R}{c_p}', filled: `\\kappa = ${texNumber(kappaOf(constants))}`, value: kappaOf(constants), unit: '1' },
    worked('Exner function', '\\Pi = \\left(\\frac{p}{p_0}\\right)^{\\kappa}', `\\Pi = \\left(\\frac{${texNumber(p(inputs) / 100, 6)}}{${texNumber(constant(constants, 'p0') / 100)}}\\right)^{${texNumber(kappaOf(constants))}}`, result, '1'),
  ],
  slips: [
    slip('inverted-ratio', 'ratio of pressures turned round', 'This comes from p₀/p in place of p/p₀.', (_i, _c, right) => 1 / right),
    slip('inverted-exponent', 'exponent turned round', 'This comes from the exponent cp/R in place of R/cp.', (inputs, constants) => pow(p(inputs) / constant(constants, 'p0'), 1 / kappaOf(constants))),
    slip('cv-for-cp', 'cv for cp', 'This comes from the exponent R/cv in place of R/cp.', (inputs, constants) => pow(p(inputs) / constant(constants, 'p0'), constant(constants, 'R') / constant(constants, 'cv'))),
    slip('standard-pressure', '1013.25 hPa for 1000 hPa', 'This refers to 1013.25 hPa: the Exner function refers to 1000 hPa.', (_i, constants, right) => right * pow(constant(constants, 'p0') / 101_325, kappaOf(constants))),
    slip('times-cp', 'multiplied by cp', 'This is cp (p/p₀)^κ, in J kg⁻¹ K⁻¹: here the dimensionless function is asked.', (_i, constants, right) => right * constant(constants, 'cp')),
    slip('exponent-left-out', 'exponent left out', 'This is the ratio of pressures alone.', (inputs, constants) => p(inputs) / constant(constants, 'p0')),
    hectopascalSlip(value, 'pressure'),
  ],
  example: { inputs: { pressure: 85_000 }, gives: 0.9546055, within: 0.0000001 },
})
