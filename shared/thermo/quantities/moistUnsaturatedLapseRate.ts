import { constant, dryRateOf } from '../constants'
import type { Constants, Inputs } from '../definition'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { fineSlip, per100MetersSlip, perMeterSlip, signSlip, slip } from '../slips'
import { texNumber, worked } from '../tex'

/**
 * Adiabatic lapse rate of moist air that is not saturated, K m⁻¹.
 *
 *   Γ = g (1 + w) / (cp + w cpv)     w in kg/kg
 *
 * Source: AMS Glossary of Meteorology, "adiabatic lapse rate", without the terms of condensation. Valid for unsaturated air.
 * At most 1.5 % below g/cp; whether a course takes air as dry or as moist is asked, and never a matter of width.
 *
 * @example moistUnsaturatedLapseRate(0.015, { g: 9.81, cp: 1004, cpv: 1870 }) // 0.0096479 K m⁻¹
 */
export function moistUnsaturatedLapseRate(mixingRatio: number, constants: Constants): number {
  return constant(constants, 'g') * (1 + mixingRatio) / (constant(constants, 'cp') + mixingRatio * constant(constants, 'cpv'))
}

const w = (inputs: Inputs) => numberOf(inputs, 'mixingRatio')

export const moistUnsaturatedLapseRateDefinition = oneFormula({
  key: 'moist-unsaturated-lapse-rate',
  name: 'adiabatic lapse rate of moist, unsaturated air',
  symbol: 'Γ',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: [{ name: 'mixingRatio', label: 'mixing ratio', symbol: 'w', unit: '1', shownUnit: 'g/kg', kind: 'ratio', shape: 'number', range: [0, 0.1] }],
  constants: ['g', 'cp', 'cpv'],
  formula: {
    key: 'moist-heat-capacity', label: 'g (1 + w)/(cp + w cpv)', source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate", without the terms of condensation', status: 'common practice' },
    validity: 'unsaturated air', knownError: 'cp 1004 to 1005.7, g 9.80665 to 9.81: 0.2 %',
  },
  ask: 'The adiabatic lapse rate Γ = −dT/dz of the moist, unsaturated parcel with the heat capacity of its vapor, positive since it cools as it rises.',
  value: (inputs, constants) => moistUnsaturatedLapseRate(w(inputs), constants),
  working(inputs, constants, result) {
    const capacity = constant(constants, 'cp') + w(inputs) * constant(constants, 'cpv')
    return [
      worked('Heat capacity with the vapor, per kilogram of dry air', 'c = c_p + w\\,c_{pv}', `c = ${texNumber(constant(constants, 'cp'), 6)} + ${texNumber(w(inputs))} \\cdot ${texNumber(constant(constants, 'cpv'))}`, capacity, 'J/(kg.K)'),
      worked('Weight of 1 + w kilograms over their heat capacity', '\\Gamma = \\frac{g\\,(1 + w)}{c}', `\\Gamma = \\frac{${texNumber(constant(constants, 'g'), 6)} \\cdot (1 + ${texNumber(w(inputs))})}{${texNumber(capacity, 6)}}`, result, 'K/m', { value: result * 1000, unit: 'K/km' }),
    ]
  },
  slips: [
    signSlip('A lapse rate is positive where temperature falls with height.'),
    fineSlip('dry', 'the rate of dry air', 'This is g/cp, the rate of dry air.', (_i, constants) => dryRateOf(constants)),
    fineSlip('weight-left-out', '1 + w left out', 'This leaves out the weight of the vapor, the factor 1 + w.', (inputs, _c, right) => right / (1 + w(inputs))),
    fineSlip('liquid-water', 'heat capacity of liquid water', 'This takes the specific heat of liquid water for that of vapor.', (inputs, constants) => moistUnsaturatedLapseRate(w(inputs), { ...constants, cpv: constant(constants, 'cw') })),
    slip('grams-per-kilogram', 'g/kg put in for kg/kg', 'This comes from the mixing ratio in g kg⁻¹: it goes in in kg kg⁻¹.', (inputs, constants) => moistUnsaturatedLapseRate(w(inputs) * 1000, constants)),
    perMeterSlip, per100MetersSlip,
  ],
  example: { inputs: { mixingRatio: 0.015 }, gives: 0.0096479, within: 1e-7 },
})
