import { log, log10 } from '../../numerics/elementary'
import { mean } from '../../numerics/regression'
import { pascal } from '../../units/brands'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { logPressureMean } from '../hypsometry'
import { seriesOf } from '../inputs'
import { levelInputs } from '../levels'
import { oneFormula } from '../oneFormula'
import { fineSlip, signSlip, slip, vaporGasConstant, zeroCelsius } from '../slips'
import { texNumber, worked } from '../tex'
import { hypsometricThickness } from './hypsometricThickness'

const p = (inputs: Inputs) => seriesOf(inputs, 'pressure')
const T = (inputs: Inputs) => seriesOf(inputs, 'temperature')
const bottom = (inputs: Inputs) => pascal(p(inputs)[0] ?? NaN)
const top = (inputs: Inputs) => pascal(p(inputs)[p(inputs).length - 1] ?? NaN)
const value = (inputs: Inputs, constants: Constants) => hypsometricThickness(bottom(inputs), top(inputs), logPressureMean(p(inputs), T(inputs)), constants)

/** Thickness of a layer from the pressures and temperatures of its levels: each layer between two levels by their mean. Formula and source: `hypsometry.ts`. */
export const hypsometricThicknessOfLevelsDefinition = oneFormula({
  key: 'hypsometric-thickness-of-levels',
  name: 'hypsometric thickness of a layer from its levels',
  symbol: 'Δz',
  unit: 'm',
  shownUnit: 'm',
  kind: 'ratio',
  inputs: levelInputs.map(input => (input.name === 'temperature' ? { ...input, label: 'virtual temperatures of the levels', symbol: 'Tv' } : input)),
  constants: ['R', 'g'],
  formula: {
    key: 'hypsometric', label: 'hypsometric equation, layer by layer', source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"; trapezoids in ln p', status: 'common practice' },
    validity: 'hydrostatic balance, levels from the bottom upwards', knownError: 'g 9.81 or 9.80665: 2 m in 1000–500 hPa',
  },
  ask: 'The thickness Δz between the lowest and the highest level by the hypsometric equation, each layer between two levels with the mean of their virtual temperatures in kelvin.',
  value,
  working(inputs, constants, result) {
    const average = logPressureMean(p(inputs), T(inputs)), ratio = log(bottom(inputs) / top(inputs))
    return [
      worked('Mean virtual temperature, weighted by the logarithm of pressure', '\\overline{T_v} = \\frac{\\sum \\tfrac12 (T_i + T_{i+1}) \\ln(p_i/p_{i+1})}{\\ln(p_1/p_n)}', '\\overline{T_v}', average, 'K'),
      worked('Natural logarithm of the ratio of pressures', '\\ln\\frac{p_1}{p_n}', `\\ln\\frac{${texNumber(bottom(inputs) / 100, 6)}}{${texNumber(top(inputs) / 100, 6)}}`, ratio, '1'),
      worked('Thickness', '\\Delta z = \\frac{R\\,\\overline{T_v}}{g} \\ln\\frac{p_1}{p_n}', `\\Delta z = \\frac{${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(average, 6)}}{${texNumber(constant(constants, 'g'), 6)}} \\cdot ${texNumber(ratio, 6)}`, result, 'm'),
    ]
  },
  slips: [
    signSlip('This has the ratio of pressures turned round: the bottom’s pressure is the larger one.'),
    slip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperatures in °C: the hypsometric equation takes kelvin.', (inputs, _c, right) => {
      const average = logPressureMean(p(inputs), T(inputs))
      return right * (average - zeroCelsius) / average
    }),
    slip('log10-for-ln', 'logarithm to base 10', 'This comes from the logarithm to base 10: the formula has the natural one.', (inputs, _c, right) => right * log10(bottom(inputs) / top(inputs)) / log(bottom(inputs) / top(inputs))),
    fineSlip('plain-mean', 'plain mean of the levels', 'This takes the plain mean of the levels: thick layers count for more.', (inputs, _c, right) => right * mean(T(inputs)) / logPressureMean(p(inputs), T(inputs))),
    fineSlip('bottom-temperature', 'temperature of the bottom', 'This takes the temperature of the lowest level for the whole layer.', (inputs, _c, right) => right * (T(inputs)[0] ?? NaN) / logPressureMean(p(inputs), T(inputs))),
    slip('vapor-gas-constant', 'gas constant of vapor', 'This comes from the gas constant of water vapor in place of that of dry air.', (_i, constants, right) => right * vaporGasConstant / constant(constants, 'R')),
    slip('geopotential', 'not divided by g', 'This is the difference of geopotential: divide it by g.', (_i, constants, right) => right * constant(constants, 'g')),
  ],
  example: { inputs: { pressure: [100_000, 85_000, 70_000], temperature: [293.15, 285.15, 277.15] }, gives: 2971.8, within: 0.1 },
})
