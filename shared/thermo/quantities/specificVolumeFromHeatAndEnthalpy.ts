import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { OutOfRangeError } from '../errors'
import { specificEnergyInput, temperatureChangeInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { signSlip, slip } from '../slips'
import { texFactor, texNumber, worked } from '../tex'

const q = (inputs: Inputs) => numberOf(inputs, 'heat')
const change = (inputs: Inputs) => numberOf(inputs, 'temperatureChange')
const pressureChange = (inputs: Inputs) => numberOf(inputs, 'pressureChange')
/** @throws {OutOfRangeError} where the pressure does not change */
function value(inputs: Inputs, constants: Constants): number {
  if (pressureChange(inputs) === 0) throw new OutOfRangeError('pressureChange', 0, 'a change that is not 0')
  return (constant(constants, 'cp') * change(inputs) - q(inputs)) / pressureChange(inputs)
}

/**
 * Mean specific volume of a small change, from the first law in its enthalpy form.
 *
 *   α = (cp ΔT − q)/Δp
 *
 * Source: AMS Glossary of Meteorology, "first law of thermodynamics", solved for α. SI. Valid: 200–350 K, Δp small beside p and not 0.
 *
 * @example q 0, ΔT −2 K, Δp −23.6 hPa: 0.851 m³ kg⁻¹
 */
export const specificVolumeFromHeatAndEnthalpyDefinition = oneFormula({
  key: 'specific-volume-from-heat-and-enthalpy',
  name: 'mean specific volume, from the heat and the changes of temperature and pressure',
  symbol: 'α',
  unit: 'm3/kg',
  shownUnit: 'm3/kg',
  kind: 'ratio',
  inputs: [
    specificEnergyInput('heat', 'heat taken up by the air, per kilogram', 'q'),
    temperatureChangeInput(),
    { name: 'pressureChange', label: 'change of pressure, not 0', symbol: 'Δp', unit: 'Pa', shownUnit: 'hPa', kind: 'difference', shape: 'number', range: [-50_000, 50_000], trivialWithin: 1 },
  ],
  constants: ['cp'],
  formula: {
    key: 'first-law', label: 'first law, enthalpy', source: { text: 'AMS Glossary of Meteorology, "first law of thermodynamics"', status: 'common practice' },
    validity: '200–350 K, Δp small beside p', knownError: 'cp 1004 to 1005.7: 0.17 % of the term with ΔT',
  },
  ask: 'The mean specific volume α = (cp ΔT − q)/Δp of the air during a small change in which its pressure does not stay.',
  value,
  working(inputs, constants, result) {
    const c = constant(constants, 'cp')
    return [worked('First law, solved for the specific volume', '\\alpha = \\frac{c_p\\,\\Delta T - q}{\\Delta p}', `\\alpha = \\frac{${texNumber(c, 6)} \\cdot ${texFactor(change(inputs), 6)} - ${texFactor(q(inputs), 6)}}{${texNumber(pressureChange(inputs), 6)}}`, result, 'm3/kg')]
  },
  slips: [
    signSlip('A specific volume is positive: q = cp ΔT − α Δp.'),
    slip('heat-added', 'q with the wrong sign', 'The heat went in with its sign turned: α = (cp ΔT − q)/Δp.', (inputs, constants) => (q(inputs) === 0 ? null : (constant(constants, 'cp') * change(inputs) + q(inputs)) / pressureChange(inputs))),
    slip('cv-for-cp', 'cv for cp', 'This comes from cv in place of cp: the form with the pressure has the enthalpy.', (inputs, constants) => (constant(constants, 'cv') * change(inputs) - q(inputs)) / pressureChange(inputs)),
    slip('hectopascal-for-pascal', 'hPa put in for Pa', 'This is what comes out with the pressure in hPa: with constants in SI it goes in in pascal.', (_i, _c, right) => 100 * right),
    slip('inverse', 'density for specific volume', 'This is the density: the specific volume is one over it.', (_i, _c, right) => 1 / right),
  ],
  example: { inputs: { heat: 0, temperatureChange: -2, pressureChange: -2360 }, gives: 0.850847, within: 0.000001 },
})
