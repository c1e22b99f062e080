import { meter } from '../../units/brands'
import { feetSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { lengthInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { fineSlip, slip } from '../slips'
import { geopotentialOfGeometric, geometricOfGeopotential } from '../standardAtmosphere'
import { texFactor, texNumber, worked } from '../tex'

const H = (inputs: Inputs) => numberOf(inputs, 'geopotentialHeight')
const value = (inputs: Inputs, constants: Constants) => geometricOfGeopotential(meter(H(inputs)), constant(constants, 'earthRadius'))

/** Geometric height of a geopotential one, z = a H/(a − H). Formula and source: `standardAtmosphere.ts`. */
export const geometricHeightDefinition = oneFormula({
  key: 'geometric-height',
  name: 'geometric height of a geopotential height',
  symbol: 'z',
  unit: 'm',
  shownUnit: 'm',
  kind: 'difference',
  nearZero: 10,
  inputs: [lengthInput('geopotentialHeight', 'geopotential height above mean sea level', 'H', [-500, 95_000])],
  constants: ['earthRadius'],
  formula: {
    key: 'inverse-square', label: 'a H/(a − H)', source: { text: 'U.S. Standard Atmosphere 1976, Eq. 19', status: 'verified' },
    validity: 'gravity of 9.80665 m s⁻² at sea level, falling by the square of the distance from the center', knownError: 'radius 6356.766 or 6371 km: 0.04 m at 10 km',
  },
  ask: 'The geometric height z of the geopotential height H, both above mean sea level.',
  value,
  working: (inputs, constants, result) => [
    worked('Gravity falls by the square of the distance from the earth’s center', 'z = \\frac{a\\,H}{a - H}', `z = \\frac{${texNumber(constant(constants, 'earthRadius'), 7)} \\cdot ${texFactor(H(inputs), 7)}}{${texNumber(constant(constants, 'earthRadius'), 7)} - ${texFactor(H(inputs), 7)}}`, result, 'm', undefined, 7),
  ],
  slips: [
    fineSlip('other-way', 'geopotential for geometric', 'This goes the other way: a geometric height is larger than its geopotential one.', (inputs, constants) => geopotentialOfGeometric(meter(H(inputs)), constant(constants, 'earthRadius'))),
    fineSlip('unchanged', 'left as it was', 'This is the geopotential height itself.', inputs => H(inputs)),
    slip('kilometers', 'km given as m', 'Your number is in kilometers; the unit beside it says meters.', (_i, _c, right) => right / 1000),
    feetSlip(value, 'geopotentialHeight'),
  ],
  example: { inputs: { geopotentialHeight: 10_000 }, gives: 10_015.756, within: 0.001 },
})
