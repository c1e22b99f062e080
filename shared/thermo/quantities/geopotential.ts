import { meter } from '../../units/brands'
import { feetSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { lengthInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { fineSlip, joulesSlip, kilojoulesSlip, slip } from '../slips'
import { geopotentialOfGeometric } from '../standardAtmosphere'
import { texFactor, texNumber, worked } from '../tex'

const z = (inputs: Inputs) => numberOf(inputs, 'geometricHeight')
const heightOf = (inputs: Inputs, constants: Constants) => geopotentialOfGeometric(meter(z(inputs)), constant(constants, 'earthRadius'))
const value = (inputs: Inputs, constants: Constants) => constant(constants, 'g') * heightOf(inputs, constants)

/**
 * Geopotential of a geometric height: the work that lifts a kilogram there from sea level.
 *
 *   Φ = g a z/(a + z)     g at sea level by the convention, a the earth's radius
 *
 * Source: U.S. Standard Atmosphere 1976, Eqs. 14 to 18. SI. Valid: gravity falling by the square of the distance from the center; rotation is in g alone.
 *
 * @example 10 000 m with g 9.81: 97.946 kJ kg⁻¹
 */
export const geopotentialDefinition = oneFormula({
  key: 'geopotential',
  name: 'geopotential of a geometric height',
  symbol: 'Φ',
  unit: 'J/kg',
  shownUnit: 'kJ/kg',
  kind: 'difference',
  nearZero: 100,
  inputs: [lengthInput('geometricHeight', 'geometric height above mean sea level', 'z', [-500, 100_000])],
  constants: ['earthRadius', 'g'],
  formula: {
    key: 'inverse-square', label: 'g a z/(a + z)', source: { text: 'U.S. Standard Atmosphere 1976, Eqs. 14 to 18', status: 'from memory' },
    validity: 'gravity that falls by the square of the distance from the earth’s center', knownError: 'g 9.80665 or 9.81: 0.03 %; radius 6356.766 or 6371 km: 0.04 m at 10 km',
  },
  ask: 'The geopotential Φ of the geometric height z above mean sea level, with gravity that falls by the square of the distance from the earth’s center.',
  value,
  working: (inputs, constants, result) => [
    worked('Geopotential height: gravity falls by the square of the distance from the earth’s center', 'H = \\frac{a\\,z}{a + z}', `H = \\frac{${texNumber(constant(constants, 'earthRadius'), 7)} \\cdot ${texFactor(z(inputs), 7)}}{${texNumber(constant(constants, 'earthRadius'), 7)} + ${texFactor(z(inputs), 7)}}`, heightOf(inputs, constants), 'm', undefined, 7),
    worked('Geopotential', '\\Phi = g\\,H', `\\Phi = ${texNumber(constant(constants, 'g'), 6)} \\cdot ${texFactor(heightOf(inputs, constants), 7)}`, result, 'J/kg', { value: result / 1000, unit: 'kJ/kg' }, 6),
  ],
  slips: [
    fineSlip('constant-gravity', 'gravity taken for constant', 'This is g z, with gravity taken for constant: it falls with height.', (inputs, constants) => constant(constants, 'g') * z(inputs)),
    slip('height', 'the geopotential height itself', 'This is the geopotential height: multiply it by g.', (_i, constants, right) => right / constant(constants, 'g')),
    joulesSlip,
    kilojoulesSlip,
    feetSlip(value, 'geometricHeight'),
  ],
  example: { inputs: { geometricHeight: 10_000 }, gives: 97_945.91, within: 0.01 },
})
