import { log, log10 } from '../../numerics/elementary'
import { type Kelvin, kelvin, type Meter, meter, type Pascal, pascal } from '../../units/brands'
import { constant } from '../constants'
import type { Constants, Inputs, QuantityDefinition } from '../definition'
import { OutOfRangeError } from '../errors'
import { numberOf } from '../inputs'
import { signSlip, slip, vaporGasConstant, zeroCelsius } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Thickness of a layer between two pressures.
 *
 *   Δz = (R T̄v / g) ln(p₁ / p₂)     p₁ at the bottom, T̄v in K
 *
 * Source: AMS Glossary of Meteorology, "hypsometric equation".
 * Valid in hydrostatic balance; T̄v is the mean virtual temperature, weighted by the logarithm of pressure.
 *
 * @throws {OutOfRangeError} where the top's pressure is not below the bottom's
 * @example hypsometricThickness(pascal(100000), pascal(50000), kelvin(273.15), closed1004.constants) // 5539.1 m
 */
export function hypsometricThickness(bottom: Pascal, top: Pascal, meanVirtualTemperature: Kelvin, constants: Constants): Meter {
  if (!(top < bottom)) throw new OutOfRangeError('pressureTop', top, `the pressures below that of the bottom, ${bottom} Pa`)
  return meter(constant(constants, 'R') * meanVirtualTemperature / constant(constants, 'g') * log(bottom / top))
}

const bottom = (inputs: Inputs) => numberOf(inputs, 'pressureBottom')
const top = (inputs: Inputs) => numberOf(inputs, 'pressureTop')
const Tv = (inputs: Inputs) => numberOf(inputs, 'meanVirtualTemperature')

export const hypsometricThicknessDefinition: QuantityDefinition = {
  key: 'hypsometric-thickness',
  name: 'hypsometric thickness of a layer',
  symbol: 'Δz',
  unit: 'm',
  shownUnit: 'm',
  kind: 'ratio',
  inputs: [
    { name: 'pressureBottom', label: 'pressure at the bottom', symbol: 'p₁', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [100, 120_000] },
    { name: 'pressureTop', label: 'pressure at the top', symbol: 'p₂', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [100, 120_000] },
    { name: 'meanVirtualTemperature', label: 'mean virtual temperature of the layer', symbol: 'T̄v', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [150, 350] },
  ],
  variants: [{
    key: 'hypsometric', label: 'hypsometric equation',
    source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"', status: 'common practice' },
    validity: 'hydrostatic balance, 1–1200 hPa', knownError: 'g 9.81 or 9.80665: 2 m in 1000–500 hPa',
    evaluate: (inputs, constants) => ({ is: 'value', value: hypsometricThickness(pascal(bottom(inputs)), pascal(top(inputs)), kelvin(Tv(inputs)), constants) }),
  }],
  constants: ['R', 'g'],
  ask: 'The thickness Δz of the layer between the two pressures by the hypsometric equation, with the mean virtual temperature in kelvin.',
  trace(inputs, constants) {
    const scale = constant(constants, 'R') * Tv(inputs) / constant(constants, 'g')
    const value = hypsometricThickness(pascal(bottom(inputs)), pascal(top(inputs)), kelvin(Tv(inputs)), constants)
    const ratio = log(bottom(inputs) / top(inputs))
    return [
      { text: 'Scale height, with T̄v in kelvin', formula: 'H = \\frac{R\\,\\overline{T_v}}{g}', filled: `H = \\frac{${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(Tv(inputs))}}{${texNumber(constant(constants, 'g'), 6)}} = ${texQuantity(scale, 'm', 6)}`, value: scale, unit: 'm' },
      { text: 'Natural logarithm of the ratio of pressures', formula: '\\ln\\frac{p_1}{p_2}', filled: `\\ln\\frac{${texNumber(bottom(inputs) / 100, 6)}}{${texNumber(top(inputs) / 100, 6)}} = ${texNumber(ratio, 6)}`, value: ratio, unit: '1' },
      { text: 'Thickness', formula: '\\Delta z = H \\ln\\frac{p_1}{p_2}', filled: `\\Delta z = ${texNumber(scale, 6)} \\cdot ${texNumber(ratio, 6)} = ${texQuantity(value, 'm', 6)}`, value, unit: 'm' },
    ]
  },
  slips: [
    signSlip('This has the ratio of pressures turned round: the bottom’s pressure is the larger one.'),
    slip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C: the hypsometric equation takes kelvin.', (inputs, _c, right) => right * (Tv(inputs) - zeroCelsius) / Tv(inputs)),
    slip('base-10', 'base-10 for natural logarithm', 'This comes from the logarithm to base 10: the hypsometric equation takes the natural one.', (inputs, constants) => constant(constants, 'R') * Tv(inputs) / constant(constants, 'g') * log10(bottom(inputs) / top(inputs))),
    slip('standard-pressure', '1013.25 hPa for the bottom', 'This starts from 1013.25 hPa in place of the pressure at the bottom.', (inputs, constants) =>
      bottom(inputs) === 101_325 ? null : constant(constants, 'R') * Tv(inputs) / constant(constants, 'g') * log(101_325 / top(inputs))),
    slip('vapor-gas-constant', 'gas constant of vapor', 'This comes from the gas constant of water vapor in place of that of dry air.', (_i, constants, right) => right * vaporGasConstant / constant(constants, 'R')),
    slip('cp-for-r', 'cp for R', 'This comes from cp in place of R.', (_i, constants, right) => right * constant(constants, 'cp') / constant(constants, 'R')),
    slip('geopotential', 'not divided by g', 'This is the difference of geopotential: divide it by g.', (_i, constants, right) => right * constant(constants, 'g')),
    slip('kilometers', 'km given as m', 'Your number is in kilometers; the unit beside it says meters.', (_i, _c, right) => right / 1000),
  ],
  example: { inputs: { pressureBottom: 100_000, pressureTop: 50_000, meanVirtualTemperature: 273.15 }, gives: 5539.1, within: 0.1 },
}
