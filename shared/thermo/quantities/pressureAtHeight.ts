import { kelvin, meter, pascal } from '../../units/brands'
import { log } from '../../numerics/elementary'
import { celsiusSlip, feetSlip, vaporConstantSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { pressureAtHeight } from '../hypsometry'
import { lengthInput, pressureInput, temperatureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { slip } from '../slips'
import { texFactor, texNumber, worked } from '../tex'

const p = (inputs: Inputs) => numberOf(inputs, 'pressure')
const Tv = (inputs: Inputs) => numberOf(inputs, 'meanVirtualTemperature')
const dz = (inputs: Inputs) => numberOf(inputs, 'heightDifference')
const value = (inputs: Inputs, constants: Constants) => pressureAtHeight(pascal(p(inputs)), meter(dz(inputs)), kelvin(Tv(inputs)), constants)

/** Pressure at a height above a level of known pressure: the hypsometric equation solved for p₂. Formula and source: `hypsometry.ts`. */
export const pressureAtHeightDefinition = oneFormula({
  key: 'pressure-at-height',
  name: 'pressure at a height above a level',
  symbol: 'p₂',
  unit: 'Pa',
  shownUnit: 'hPa',
  kind: 'ratio',
  inputs: [
    pressureInput('pressure', 'pressure at the lower level', 'p₁', [100, 120_000]),
    lengthInput('heightDifference', 'height above that level, negative below it', 'Δz', [-10_000, 40_000]),
    temperatureInput('meanVirtualTemperature', 'mean virtual temperature between the levels', 'T̄v', [150, 350]),
  ],
  constants: ['R', 'g'],
  formula: {
    key: 'hypsometric', label: 'hypsometric equation', source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"', status: 'common practice' },
    validity: 'hydrostatic balance, 1–1200 hPa', knownError: 'g 9.81 or 9.80665: 0.03 % of Δz',
  },
  ask: 'The pressure p₂ at the height Δz above the level, by the hypsometric equation with the mean virtual temperature in kelvin.',
  value,
  working(inputs, constants, result) {
    const scale = constant(constants, 'R') * Tv(inputs) / constant(constants, 'g')
    return [
      worked('Scale height, with T̄v in kelvin', 'H = \\frac{R\\,\\overline{T_v}}{g}', `H = \\frac{${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(Tv(inputs), 6)}}{${texNumber(constant(constants, 'g'), 6)}}`, scale, 'm'),
      worked('Pressure', 'p_2 = p_1 \\exp\\frac{-\\Delta z}{H}', `p_2 = ${texNumber(p(inputs) / 100, 6)} \\exp\\frac{-${texFactor(dz(inputs), 6)}}{${texNumber(scale, 6)}}`, result, 'Pa', { value: result / 100, unit: 'hPa' }),
    ]
  },
  slips: [
    slip('sign', 'higher where it is lower', 'Pressure falls with height: your value goes the other way.', (inputs, _c, right) => p(inputs) * p(inputs) / right),
    celsiusSlip(value, 'meanVirtualTemperature'),
    feetSlip(value, 'heightDifference'),
    slip('linear', 'first term of the exponential', 'This takes 1 − x for the exponential of −x: the density falls along the way.', (inputs, _c, right) => p(inputs) * (1 + log(right / p(inputs)))),
    slip('base-10', '10 to the power for e', 'This raises 10 where the formula raises e.', (inputs, constants) => {
      const wrong = value({ ...inputs, heightDifference: dz(inputs) * 2.302585092994046 }, constants)
      return Number.isFinite(wrong) ? wrong : null
    }),
    vaporConstantSlip(value),
    slip('eight-meters', '1 hPa for each 8 m', 'This takes 1 hPa for each 8 m of height, a rule for the lowest few hundred meters.', inputs => p(inputs) - dz(inputs) / 8 * 100),
  ],
  example: { inputs: { pressure: 100_000, heightDifference: 1500, meanVirtualTemperature: 283.15 }, gives: 83_437.1, within: 0.1 },
})
