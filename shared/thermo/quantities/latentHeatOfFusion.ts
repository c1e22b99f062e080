import type { Constants, Formulae, Inputs, QuantityDefinition } from '../definition'
import { constant } from '../constants'
import { numberOf } from '../inputs'
import { latentHeatFunction, latentHeatNotes, sublimationHeatFunction, sublimationKey, vaporizationKey } from '../saturationFunction'
import { joulesSlip, slip } from '../slips'
import { texQuantity } from '../tex'

/**
 * Latent heat of fusion: what melting ice takes up, and freezing water gives off.
 *
 *   L_f = L_s − L_v     both as the convention computes them
 *
 * Source: AMS Glossary of Meteorology, "latent heat": the three latent heats of one temperature add up. Valid where L_s and L_v are.
 * Limits: a small difference of large numbers, so the constants that are taught move it by some percent.
 *
 * @example 0 °C with L_s 2834 and L_v 2501 kJ kg⁻¹: 333 kJ kg⁻¹
 */
export const latentHeatOfFusionDefinition: QuantityDefinition = {
  key: 'latent-heat-of-fusion',
  name: 'latent heat of fusion',
  symbol: 'L_f',
  unit: 'J/kg',
  shownUnit: 'kJ/kg',
  kind: 'ratio',
  inputs: [{ name: 'temperature', label: 'temperature', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [200, 273.16] }],
  variants: [
    {
      key: 'difference', label: 'L_s − L_v at the temperature',
      source: { text: 'AMS Glossary of Meteorology, "latent heat"', status: 'common practice' },
      validity: '−40 to 0 °C', knownError: '3 kJ kg⁻¹ at −10 °C with a constant L_s', holds: { temperature: [233.15, 273.16] },
      evaluate: (inputs, constants, formulae) => ({ is: 'value', value: difference(inputs, constants, formulae) }),
    },
    {
      key: 'constant', label: 'a constant, as taught: the value at 0 °C',
      source: { text: 'common practice: the value at 0 °C, 0.3337 MJ kg⁻¹ (AMS Glossary of Meteorology, "latent heat")', status: 'common practice' },
      validity: 'near 0 °C', knownError: '7 % at −10 °C', evaluate: (_inputs, constants) => ({ is: 'value', value: atZero(constants) }),
    },
  ],
  constants: ['latentHeat', 'latentHeatIce', 'cw', 'cpv'],
  uses: [vaporizationKey, sublimationKey],
  notes: (inputs, _constants, formulae) => latentHeatNotes([T(inputs)], formulae),
  ask: 'The latent heat of fusion of ice at the temperature, per kilogram.',
  trace(inputs, constants, variant, formulae) {
    const isConstant = variant === 'constant'
    const value = isConstant ? atZero(constants) : difference(inputs, constants, formulae)
    const [ice, water] = isConstant ? [constant(constants, 'latentHeatIce'), constant(constants, 'latentHeat')] : [sublimationHeatFunction(constants, formulae)(T(inputs)), latentHeatFunction(constants, formulae)(T(inputs))]
    return [
      { text: isConstant ? 'From ice to vapor and from water to vapor, at 0 °C' : 'From ice to vapor and from water to vapor', formula: 'L_s,\\ L_v', filled: `L_s = ${texQuantity(ice / 1000, 'kJ/kg', 6)},\\quad L_v = ${texQuantity(water / 1000, 'kJ/kg', 6)}` },
      { text: 'From ice to water', formula: 'L_f = L_s - L_v', filled: `L_f = ${texQuantity(value / 1000, 'kJ/kg')}`, value, unit: 'J/kg' },
    ]
  },
  slips: [
    slip('sign', 'sign turned round', 'The sign is turned round: from ice to vapor takes more heat than from water to vapor.', (_i, _c, right) => -right),
    slip('vaporization', 'latent heat of vaporization', 'This is the latent heat of vaporization, from liquid water to vapor.', (inputs, constants, _right, formulae) => latentHeatFunction(constants, formulae)(T(inputs))),
    slip('sublimation', 'latent heat of sublimation', 'This is the latent heat of sublimation, from ice to vapor.', (inputs, constants, _right, formulae) => sublimationHeatFunction(constants, formulae)(T(inputs))),
    joulesSlip,
    slip('megajoules-for-kilojoules', 'MJ given as kJ', 'Your number is in megajoules; the unit beside it says kilojoules.', (_i, _c, right) => right / 1000),
  ],
  example: { inputs: { temperature: 273.15 }, gives: 333_000, within: 1 },
}

const T = (inputs: Inputs) => numberOf(inputs, 'temperature')
const difference = (inputs: Inputs, constants: Constants, formulae: Formulae): number => sublimationHeatFunction(constants, formulae)(T(inputs)) - latentHeatFunction(constants, formulae)(T(inputs))
const atZero = (constants: Constants): number => constant(constants, 'latentHeatIce') - constant(constants, 'latentHeat')
