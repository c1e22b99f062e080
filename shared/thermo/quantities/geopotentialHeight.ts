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

const z = (inputs: Inputs) => numberOf(inputs, 'geometricHeight')
const value = (inputs: Inputs, constants: Constants) => geopotentialOfGeometric(meter(z(inputs)), constant(constants, 'earthRadius'))

/** Geopotential height of a geometric one, H = a z/(a + z). Formula and source: `standardAtmosphere.ts`. */
export const geopotentialHeightDefinition = oneFormula({
  key: 'geopotential-height',
  name: 'geopotential height of a geometric height',
  symbol: 'H',
  unit: 'm',
  shownUnit: 'm',
  kind: 'difference',
  nearZero: 10,
  inputs: [lengthInput('geometricHeight', 'geometric height above mean sea level', 'z', [-500, 100_000])],
  constants: ['earthRadius'],
  formula: {
    key: 'inverse-square', label: 'a z/(a + z)', source: { text: 'U.S. Standard Atmosphere 1976, Eq. 18', status: 'verified' },
    validity: 'gravity of 9.80665 m s⁻² at sea level, falling by the square of the distance from the center', knownError: 'radius 6356.766 or 6371 km: 0.04 m at 10 km',
  },
  ask: 'The geopotential height H of the geometric height z, both above mean sea level.',
  value,
  working: (inputs, constants, result) => [
    worked('Gravity falls by the square of the distance from the earth’s center', 'H = \\frac{a\\,z}{a + z}', `H = \\frac{${texNumber(constant(constants, 'earthRadius'), 7)} \\cdot ${texFactor(z(inputs), 7)}}{${texNumber(constant(constants, 'earthRadius'), 7)} + ${texFactor(z(inputs), 7)}}`, result, 'm', undefined, 7),
  ],
  slips: [
    fineSlip('other-way', 'geometric for geopotential', 'This goes the other way: a geopotential height is smaller than its geometric one.', (inputs, constants) => geometricOfGeopotential(meter(z(inputs)), constant(constants, 'earthRadius'))),
    fineSlip('unchanged', 'left as it was', 'This is the geometric height itself.', inputs => z(inputs)),
    slip('geopotential', 'multiplied by g', 'This is the geopotential in J kg⁻¹: divide it by 9.80665.', (_i, _c, right) => right * 9.80665),
    slip('kilometers', 'km given as m', 'Your number is in kilometers; the unit beside it says meters.', (_i, _c, right) => right / 1000),
    feetSlip(value, 'geometricHeight'),
  ],
  example: { inputs: { geometricHeight: 10_000 }, gives: 9984.293, within: 0.001 },
})
