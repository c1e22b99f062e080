import { log, log10 } from '../../numerics/elementary'
import { endUnitSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { OutOfRangeError } from '../errors'
import { lengthInput, pressureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { slip, vaporGasConstant, zeroCelsius } from '../slips'
import { texNumber, texQuantity, worked } from '../tex'

/**
 * Mean virtual temperature of a layer from its thickness: the hypsometric equation solved for T̄v, K.
 *
 *   T̄v = g Δz / (R ln(p₁/p₂))
 *
 * Source: AMS Glossary of Meteorology, "hypsometric equation". Valid in hydrostatic balance; the mean is weighted by the logarithm of pressure.
 *
 * @throws {OutOfRangeError} where the top's pressure is not below the bottom's, or the result is no temperature of air
 * @example layerMeanVirtualTemperature(100000, 50000, 5539, closed1004.constants) // 273.14 K
 */
export function layerMeanVirtualTemperature(bottom: number, top: number, thickness: number, constants: Constants): number {
  if (!(top < bottom)) throw new OutOfRangeError('pressureTop', top, `the pressures below that of the bottom, ${bottom} Pa`)
  const mean = constant(constants, 'g') * thickness / (constant(constants, 'R') * log(bottom / top))
  if (!(mean >= 50 && mean <= 1000)) throw new OutOfRangeError('thickness', thickness, `the thicknesses that give a mean of 50 to 1000 K between ${bottom} and ${top} Pa`)
  return mean
}

const p1 = (inputs: Inputs) => numberOf(inputs, 'pressureBottom')
const p2 = (inputs: Inputs) => numberOf(inputs, 'pressureTop')
const dz = (inputs: Inputs) => numberOf(inputs, 'thickness')
const value = (inputs: Inputs, constants: Constants) => layerMeanVirtualTemperature(p1(inputs), p2(inputs), dz(inputs), constants)

export const layerMeanVirtualTemperatureDefinition = oneFormula({
  key: 'layer-mean-virtual-temperature',
  name: 'mean virtual temperature of a layer from its thickness',
  symbol: 'T̄v',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: [pressureInput('pressureBottom', 'pressure at the bottom', 'p₁', [100, 120_000]), pressureInput('pressureTop', 'pressure at the top', 'p₂', [100, 120_000]), lengthInput('thickness', 'thickness of the layer', 'Δz', [1, 60_000])],
  constants: ['R', 'g'],
  formula: {
    key: 'hypsometric', label: 'hypsometric equation', source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"', status: 'common practice' },
    validity: 'hydrostatic balance, 1–1200 hPa', knownError: 'g 9.81 or 9.80665, R 287 to 287.05: 0.15 K',
  },
  ask: 'The mean virtual temperature T̄v of the layer from its thickness, by the hypsometric equation.',
  value,
  working(inputs, constants, result) {
    const ratio = log(p1(inputs) / p2(inputs))
    return [
      worked('Natural logarithm of the ratio of pressures', '\\ln\\frac{p_1}{p_2}', `\\ln\\frac{${texNumber(p1(inputs) / 100, 6)}}{${texNumber(p2(inputs) / 100, 6)}}`, ratio, '1'),
      worked('Hypsometric equation, solved for the temperature', '\\overline{T_v} = \\frac{g\\,\\Delta z}{R \\ln(p_1/p_2)}', `\\overline{T_v} = \\frac{${texNumber(constant(constants, 'g'), 6)} \\cdot ${texNumber(dz(inputs), 6)}}{${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(ratio, 6)}} = ${texQuantity(result - zeroCelsius, 'Cel')}`, result, 'K'),
    ]
  },
  slips: [
    endUnitSlip('Cel'),
    slip('log10-for-ln', 'logarithm to base 10', 'This comes from the logarithm to base 10: the formula has the natural one.', (inputs, _c, right) => right * log(p1(inputs) / p2(inputs)) / log10(p1(inputs) / p2(inputs))),
    slip('vapor-gas-constant', 'gas constant of vapor', 'This comes from the gas constant of water vapor in place of that of dry air.', (_i, constants, right) => right * constant(constants, 'R') / vaporGasConstant),
    slip('cp-for-r', 'cp for R', 'This comes from cp in place of R.', (_i, constants, right) => right * constant(constants, 'R') / constant(constants, 'cp')),
    slip('feet-for-meters', 'feet taken for meters', 'This comes from the thickness in feet where meters go in.', (_i, _c, right) => right / 0.3048),
    slip('ratio-for-logarithm', 'ratio for its logarithm', 'This takes (p₁ − p₂)/p₁ for the logarithm of p₁/p₂.', (inputs, _c, right) => right * log(p1(inputs) / p2(inputs)) / (1 - p2(inputs) / p1(inputs))),
  ],
  example: { inputs: { pressureBottom: 100_000, pressureTop: 50_000, thickness: 5539 }, gives: 273.1442, within: 0.001 },
})
