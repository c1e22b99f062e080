import { type JoulePerKilogram, joulePerKilogram, type Kelvin, kelvin, type Meter, meter } from '../../units/brands'
import { celsiusSlip, feetSlip, otherConstantSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { lengthInput, temperatureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { joulesSlip, slip } from '../slips'
import { texFactor, texNumber, worked } from '../tex'

/**
 * Dry static energy, J kg⁻¹.
 *
 *   s = cp T + g z     T in K, z above the stated datum
 *
 * Source: AMS Glossary of Meteorology, "dry static energy". Conserved where dry air moves adiabatically in hydrostatic balance.
 *
 * @example dryStaticEnergy(kelvin(288.15), meter(1000), { cp: 1004, g: 9.81 }) // 299112.6 J kg⁻¹
 */
export function dryStaticEnergy(temperature: Kelvin, height: Meter, constants: Constants): JoulePerKilogram {
  return joulePerKilogram(constant(constants, 'cp') * temperature + constant(constants, 'g') * height)
}

const T = (inputs: Inputs) => numberOf(inputs, 'temperature')
const z = (inputs: Inputs) => numberOf(inputs, 'heightAboveDatum')
const value = (inputs: Inputs, constants: Constants) => dryStaticEnergy(kelvin(T(inputs)), meter(z(inputs)), constants)

export const dryStaticEnergyDefinition = oneFormula({
  key: 'dry-static-energy',
  name: 'dry static energy',
  symbol: 's',
  unit: 'J/kg',
  shownUnit: 'kJ/kg',
  kind: 'ratio',
  inputs: [temperatureInput(), lengthInput('heightAboveDatum', 'height above the stated datum', 'z', [-500, 50_000])],
  constants: ['cp', 'g'],
  formula: {
    key: 'definition', label: 'cp T + g z', source: { text: 'AMS Glossary of Meteorology, "dry static energy"', status: 'common practice' },
    validity: 'dry air', knownError: 'cp 1004 to 1005.7: 0.5 kJ kg⁻¹',
  },
  ask: 'The dry static energy s = cp T + g z of the air, with the temperature in kelvin and the height above the stated datum.',
  value,
  working: (inputs, constants, result) => [
    worked('Enthalpy, with T in kelvin', 'c_p\\,T', `${texNumber(constant(constants, 'cp'), 6)} \\cdot ${texNumber(T(inputs), 6)}`, constant(constants, 'cp') * T(inputs), 'J/kg', { value: constant(constants, 'cp') * T(inputs) / 1000, unit: 'kJ/kg' }),
    worked('Geopotential', 'g\\,z', `${texNumber(constant(constants, 'g'), 6)} \\cdot ${texFactor(z(inputs), 6)}`, constant(constants, 'g') * z(inputs), 'J/kg', { value: constant(constants, 'g') * z(inputs) / 1000, unit: 'kJ/kg' }),
    worked('Dry static energy', 's = c_p\\,T + g\\,z', `s = ${texNumber(constant(constants, 'cp') * T(inputs) / 1000, 6)} + ${texFactor(constant(constants, 'g') * z(inputs) / 1000, 6)}`, result, 'J/kg', { value: result / 1000, unit: 'kJ/kg' }),
  ],
  slips: [
    celsiusSlip(value, 'temperature'),
    otherConstantSlip(value, 'cp', 'cv'),
    slip('height-left-out', 'g z left out', 'This is cp T alone: the geopotential g z belongs to it.', (inputs, constants) => (z(inputs) === 0 ? null : constant(constants, 'cp') * T(inputs))),
    slip('height-sign', 'g z taken off', 'This takes g z off in place of adding it.', (inputs, constants) => (z(inputs) === 0 ? null : constant(constants, 'cp') * T(inputs) - constant(constants, 'g') * z(inputs))),
    feetSlip(value, 'heightAboveDatum'),
    joulesSlip,
  ],
  example: { inputs: { temperature: 288.15, heightAboveDatum: 1000 }, gives: 299_112.6, within: 0.1 },
})
