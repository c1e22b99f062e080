import { otherConstantSlip, celsiusSlip } from '../composedSlips'
import { constant, dryRateOf } from '../constants'
import type { Constants, Inputs } from '../definition'
import { temperatureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { fineSlip, per100MetersSlip, perMeterSlip, signSlip, zeroCelsius } from '../slips'
import { texNumber, worked } from '../tex'

/**
 * Rate at which a dry parcel cools with height where its surroundings have another temperature, K m⁻¹.
 *
 *   −dTp/dz = (g/cp)(Tp/Te)
 *
 * Source: AMS Glossary of Meteorology, "adiabatic lapse rate"; the surroundings' pressure falls by their own density, common practice.
 * Usually taken as g/cp, since Tp/Te is near 1: that is another quantity, the dry adiabatic lapse rate.
 *
 * @example parcelLapseRateInEnvironment(290, 280, { g: 9.81, cp: 1004 }) // 0.0101199 K m⁻¹
 */
export function parcelLapseRateInEnvironment(parcelTemperature: number, environmentTemperature: number, constants: Constants): number {
  return dryRateOf(constants) * parcelTemperature / environmentTemperature
}

const Tp = (inputs: Inputs) => numberOf(inputs, 'parcelTemperature')
const Te = (inputs: Inputs) => numberOf(inputs, 'environmentTemperature')
const value = (inputs: Inputs, constants: Constants) => parcelLapseRateInEnvironment(Tp(inputs), Te(inputs), constants)

export const parcelLapseRateInEnvironmentDefinition = oneFormula({
  key: 'parcel-lapse-rate-in-environment',
  name: 'lapse rate of a dry parcel in surroundings of another temperature',
  symbol: 'Γp',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: [temperatureInput('parcelTemperature', 'temperature of the parcel', 'Tp'), temperatureInput('environmentTemperature', 'temperature of its surroundings', 'Te')],
  constants: ['g', 'cp'],
  formula: {
    key: 'with-ratio', label: '(g/cp)(Tp/Te)', source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate"; with the density of the surroundings', status: 'common practice' },
    validity: 'dry air, surroundings in hydrostatic balance', knownError: '9.751 to 9.80 K km⁻¹ times Tp/Te by the constants taught',
  },
  ask: 'The lapse rate −dT/dz of the dry parcel itself where its surroundings have another temperature, so with the factor Tp/Te, positive since it cools as it rises.',
  value,
  working: (inputs, constants, result) => [
    worked('Dry adiabatic lapse rate', '\\Gamma_d = \\frac{g}{c_p}', `\\Gamma_d = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber(constant(constants, 'cp'), 6)}}`, dryRateOf(constants), 'K/m', { value: dryRateOf(constants) * 1000, unit: 'K/km' }),
    worked('The pressure falls by the density of the surroundings', '\\Gamma_p = \\Gamma_d\\,\\frac{T_p}{T_e}', `\\Gamma_p = ${texNumber(dryRateOf(constants) * 1000, 6)} \\cdot \\frac{${texNumber(Tp(inputs), 6)}}{${texNumber(Te(inputs), 6)}}`, result, 'K/m', { value: result * 1000, unit: 'K/km' }),
  ],
  slips: [
    signSlip('A lapse rate is positive where temperature falls with height.'),
    fineSlip('factor-left-out', 'Tp/Te left out', 'This is g/cp, the rate where the surroundings are as warm as the parcel.', (_i, constants) => dryRateOf(constants)),
    fineSlip('factor-inverted', 'Te/Tp for Tp/Te', 'This comes from Te/Tp in place of Tp/Te.', (inputs, constants) => dryRateOf(constants) * Te(inputs) / Tp(inputs)),
    celsiusSlip((inputs, constants) => parcelLapseRateInEnvironment(Tp(inputs), Te(inputs) - zeroCelsius, constants), 'parcelTemperature'),
    otherConstantSlip(value, 'cp', 'cv'),
    perMeterSlip, per100MetersSlip,
  ],
  example: { inputs: { parcelTemperature: 290, environmentTemperature: 280 }, gives: 0.0101199, within: 1e-7 },
})
