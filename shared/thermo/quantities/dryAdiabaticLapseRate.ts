import { type KelvinPerMeter, kelvinPerMeter } from '../../units/brands'
import { constant, dryRateOf } from '../constants'
import type { Constants, QuantityDefinition } from '../definition'
import { per100MetersSlip, perMeterSlip, signSlip, slip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/** Γd as most books print it, K m⁻¹. */
export const printedDryRate = 0.0098

/**
 * Dry adiabatic lapse rate.
 *
 *   Γd = g / cp
 *
 * Source: AMS Glossary of Meteorology, "adiabatic lapse rate" (g/cpd, about 9.8 °C km⁻¹).
 * Valid: unsaturated air whose own temperature is near that of its surroundings. Limits: water vapor makes it up to 1 % smaller.
 *
 * @example dryAdiabaticLapseRate({ g: 9.81, cp: 1004 }) // 0.0097709 K m⁻¹
 */
export const dryAdiabaticLapseRate = (constants: Constants): KelvinPerMeter => kelvinPerMeter(dryRateOf(constants))

export const dryAdiabaticLapseRateDefinition: QuantityDefinition = {
  key: 'dry-adiabatic-lapse-rate',
  name: 'dry adiabatic lapse rate',
  symbol: 'Γd',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: [],
  variants: [
    {
      key: 'g-over-cp', label: 'g/cp',
      source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate"', status: 'verified' },
      validity: 'unsaturated air', knownError: '9.751 to 9.80 K km⁻¹ by the constants taught',
      evaluate: (_inputs, constants) => ({ is: 'value', value: dryAdiabaticLapseRate(constants) }),
    },
    {
      key: 'as-printed', label: '9.8 K km⁻¹ as usually printed',
      source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate" (approximately 9.8 °C/km)', status: 'common practice' },
      validity: 'unsaturated air', knownError: '0.3 to 0.5 % above g/cp',
      evaluate: () => ({ is: 'value', value: printedDryRate }),
    },
  ],
  constants: ['g', 'cp'],
  ask: 'The dry adiabatic lapse rate Γd = −dT/dz of a parcel, positive since it cools as it rises.',
  trace(_inputs, constants, variant) {
    if (variant === 'as-printed') return [{ text: 'As usually printed', formula: '\\Gamma_d', filled: `\\Gamma_d = ${texQuantity(printedDryRate * 1000, 'K/km')}`, value: printedDryRate, unit: 'K/m' }]
    const value = dryAdiabaticLapseRate(constants)
    return [{ text: 'Rising dry air pays for its height with enthalpy: cp dT = −g dz', formula: '\\Gamma_d = \\frac{g}{c_p}', filled: `\\Gamma_d = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber(constant(constants, 'cp'), 6)}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' }]
  },
  slips: [
    signSlip('A lapse rate is positive where temperature falls with height.'),
    perMeterSlip,
    per100MetersSlip,
    slip('cv-for-cp', 'cv for cp', 'This is g/cv in place of g/cp.', (_i, constants) => constant(constants, 'g') / constant(constants, 'cv')),
    slip('autoconvective', 'g/R for g/cp', 'This is g/R, the autoconvective lapse rate.', (_i, constants) => constant(constants, 'g') / constant(constants, 'R')),
    slip('standard-atmosphere', '6.5 K km⁻¹', 'This is the mean lapse rate of the standard atmosphere, not that of a dry parcel.', () => 0.0065),
  ],
  example: { inputs: {}, gives: 0.0097709, within: 1e-7 },
}
