import { mean } from '../../numerics/regression'
import { endUnitSlip } from '../composedSlips'
import type { Inputs } from '../definition'
import { logPressureMean } from '../hypsometry'
import { levelInputs } from '../levels'
import { seriesOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { fineSlip, zeroCelsius } from '../slips'
import { texNumber, texQuantity, worked } from '../tex'
import { log } from '../../numerics/elementary'

const p = (inputs: Inputs) => seriesOf(inputs, 'pressure')
const T = (inputs: Inputs) => seriesOf(inputs, 'temperature')
const value = (inputs: Inputs) => logPressureMean(p(inputs), T(inputs))

/** Weighted by the differences of pressure, and not of its logarithm. */
function pressureMean(pressures: readonly number[], temperatures: readonly number[]): number {
  let sum = 0
  for (let at = 1; at < pressures.length; at++) sum += ((pressures[at - 1] ?? NaN) - (pressures[at] ?? NaN)) * ((temperatures[at - 1] ?? NaN) + (temperatures[at] ?? NaN)) / 2
  return sum / ((pressures[0] ?? NaN) - (pressures[pressures.length - 1] ?? NaN))
}

/** Mean temperature of a layer from its levels, weighted by the logarithm of pressure, K. Formula and source: `hypsometry.ts`. */
export const layerMeanTemperatureDefinition = oneFormula({
  key: 'layer-mean-temperature',
  name: 'mean temperature of a layer, weighted by the logarithm of pressure',
  symbol: 'T̄',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: levelInputs,
  constants: [],
  formula: {
    key: 'log-pressure', label: 'trapezoids in ln p', source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"; trapezoids in ln p', status: 'common practice' },
    validity: 'levels from the bottom upwards', knownError: 'what the temperature does between the levels',
  },
  ask: 'The mean temperature T̄ of the layer, weighted by the logarithm of pressure: between two levels the mean of both, over all levels that are given.',
  value,
  working(inputs, _constants, result) {
    const pressures = p(inputs), first = pressures[0] ?? NaN, last = pressures[pressures.length - 1] ?? NaN, depth = log(first / last)
    return [
      worked('Depth in the logarithm of pressure', '\\ln\\frac{p_1}{p_n}', `\\ln\\frac{${texNumber(first / 100, 6)}}{${texNumber(last / 100, 6)}}`, depth, '1'),
      worked('Mean of both ends of each layer, weighted by its depth', '\\overline{T} = \\frac{\\sum \\tfrac12 (T_i + T_{i+1}) \\ln(p_i/p_{i+1})}{\\ln(p_1/p_n)}', `\\overline{T} = \\frac{${texNumber(result * depth, 6)}}{${texNumber(depth, 6)}} = ${texQuantity(result - zeroCelsius, 'Cel')}`, result, 'K'),
    ]
  },
  slips: [
    fineSlip('plain-mean', 'plain mean of the levels', 'This is the plain mean of the levels: thick layers count for more.', inputs => mean(T(inputs))),
    fineSlip('ends-only', 'mean of both ends', 'This is the mean of the lowest and the highest level alone.', inputs => ((T(inputs)[0] ?? NaN) + (T(inputs)[T(inputs).length - 1] ?? NaN)) / 2),
    fineSlip('pressure-weighted', 'weighted by pressure', 'This is weighted by pressure: thickness goes by its logarithm.', inputs => pressureMean(p(inputs), T(inputs))),
    endUnitSlip('Cel'),
  ],
  example: { inputs: { pressure: [100_000, 85_000, 70_000], temperature: [293.15, 285.15, 277.15] }, gives: 284.795, within: 0.001 },
})
