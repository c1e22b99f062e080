import { type KelvinPerMeter, kelvinPerMeter } from '../../units/brands'
import { constant, dryRateOf } from '../constants'
import type { Constants } from '../definition'
import { oneFormula } from '../oneFormula'
import { per100MetersSlip, perMeterSlip, signSlip, slip, vaporGasConstant } from '../slips'
import { texNumber, worked } from '../tex'

/**
 * Autoconvective lapse rate: that of a column of uniform density.
 *
 *   Γa = g / R
 *
 * Source: AMS Glossary of Meteorology, "autoconvective lapse rate" (about 34.1 °C km⁻¹). Valid for dry air.
 *
 * @example autoconvectiveLapseRate({ g: 9.81, R: 287 }) // 0.0341812 K m⁻¹
 */
export const autoconvectiveLapseRate = (constants: Constants): KelvinPerMeter => kelvinPerMeter(constant(constants, 'g') / constant(constants, 'R'))

export const autoconvectiveLapseRateDefinition = oneFormula({
  key: 'autoconvective-lapse-rate',
  name: 'autoconvective lapse rate',
  symbol: 'Γa',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: [],
  constants: ['g', 'R'],
  formula: {
    key: 'g-over-r', label: 'g/R', source: { text: 'AMS Glossary of Meteorology, "autoconvective lapse rate"', status: 'common practice' },
    validity: 'dry air', knownError: '34.16 to 34.18 K km⁻¹ by the constants taught',
  },
  ask: 'The autoconvective lapse rate Γa = −dT/dz, at which the density of the air is the same at all heights.',
  value: (_inputs, constants) => autoconvectiveLapseRate(constants),
  working: (_inputs, constants, result) => [
    worked('Uniform density: hydrostatic balance and the equation of state', '\\Gamma_a = \\frac{g}{R}', `\\Gamma_a = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber(constant(constants, 'R'))}}`, result, 'K/m', { value: result * 1000, unit: 'K/km' }),
  ],
  slips: [
    signSlip('A lapse rate is positive where temperature falls with height.'),
    perMeterSlip, per100MetersSlip,
    slip('dry-adiabatic', 'g/cp for g/R', 'This is g/cp, the dry adiabatic lapse rate.', (_i, constants) => dryRateOf(constants)),
    slip('vapor-gas-constant', 'gas constant of vapor', 'This comes from the gas constant of water vapor in place of that of dry air.', (_i, constants) => constant(constants, 'g') / vaporGasConstant),
  ],
  example: { inputs: {}, gives: 0.0341812, within: 1e-7 },
})
