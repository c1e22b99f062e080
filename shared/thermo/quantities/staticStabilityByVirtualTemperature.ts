import { constant, dryRateOf } from '../constants'
import type { Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { dryClassLimits } from '../layer'
import { virtualRateInput } from '../stratification'
import { texNumber, texQuantity } from '../tex'
import { staticStability, staticStabilityDefinition } from './staticStability'

const rate = (inputs: Inputs) => numberOf(inputs, 'virtualLapseRate')

/**
 * Static stability of an unsaturated layer of moist air: the lapse rate of its virtual temperature against Γd. See `staticStability`.
 *
 * Source: AMS Glossary of Meteorology, "static stability": dθv/dz = (θv/Tv)(Γd − Γv). Another quantity than with the lapse rate of T: where vapor
 * falls off with height, Γv is the larger one. Limits: a saturated layer is judged against Γm.
 *
 * @example Γv 9.41 K km⁻¹: stable
 */
export const staticStabilityByVirtualTemperatureDefinition: QuantityDefinition = {
  key: 'static-stability-by-virtual-temperature',
  name: 'static stability of an unsaturated layer by virtual temperature',
  symbol: 'class',
  unit: '1',
  shownUnit: '1',
  kind: 'class',
  inputs: [virtualRateInput],
  variants: [{
    key: 'against-dry-rate', label: 'Γv against Γd',
    source: { text: 'AMS Glossary of Meteorology, "static stability"', status: 'common practice' },
    validity: 'an unsaturated layer', knownError: 'Γd is 9.75 to 9.80 K km⁻¹ by the constants taught; in Tv that of moist air is 0.04 K km⁻¹ smaller at 15 g kg⁻¹',
    evaluate: (inputs, constants) => ({ is: 'class', key: staticStability(rate(inputs), constants), more: { dryRate: dryRateOf(constants) } }),
  }],
  constants: staticStabilityDefinition.constants,
  classLimits: dryClassLimits,
  classes: staticStabilityDefinition.classes,
  ask: 'The static stability of the unsaturated layer by the lapse rate Γv of its virtual temperature against Γd: stable, dry-neutral (Γv within 0.1 K/km of Γd) or superadiabatic.',
  trace(inputs, constants) {
    const limit = dryRateOf(constants), key = staticStability(rate(inputs), constants)
    const sign = key === 'stable' ? '<' : key === 'superadiabatic' ? '>' : '\\approx'
    return [
      { text: 'Dry adiabatic lapse rate', formula: '\\Gamma_d = \\frac{g}{c_p}', filled: `\\Gamma_d = ${texQuantity(limit * 1000, 'K/km')}`, value: limit, unit: 'K/m' },
      { text: `The layer is ${key}, with a tolerance of ${Number((constant(constants, 'neutralTolerance') * 1000).toPrecision(3))} K/km`, formula: '\\Gamma_v \\lessgtr \\Gamma_d', filled: `${texNumber(rate(inputs) * 1000)} ${sign} ${texQuantity(limit * 1000, 'K/km')}`, value: rate(inputs), unit: 'K/m' },
    ]
  },
  slips: [],
  example: { inputs: { virtualLapseRate: 0.00941 }, gives: 'stable', within: 0 },
}
