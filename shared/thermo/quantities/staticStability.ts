import { constant, dryRateOf } from '../constants'
import type { Constants, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { dryClassLimits } from '../layer'
import { texNumber, texQuantity } from '../tex'

export type DryStability = 'stable' | 'dry-neutral' | 'superadiabatic'

/**
 * Static stability of an unsaturated layer against Γd alone.
 *
 *   stable Γ < Γd − δ · dry-neutral |Γ − Γd| ≤ δ · superadiabatic Γ > Γd + δ     δ printed in the ask
 *
 * Source: AMS Glossary of Meteorology, "static stability", "superadiabatic lapse rate".
 * Limits: a saturated layer is judged against Γm, which this does not do; "stable" is not yet divided at Γm.
 *
 * @example staticStability(0.0065, closed1004.constants) // 'stable'
 */
export function staticStability(lapseRate: number, constants: Constants): DryStability {
  const excess = lapseRate - dryRateOf(constants)
  const tolerance = constant(constants, 'neutralTolerance')
  if (excess > tolerance) return 'superadiabatic'
  return excess < -tolerance ? 'stable' : 'dry-neutral'
}

const rate = (inputs: Inputs) => numberOf(inputs, 'lapseRate')

export const staticStabilityDefinition: QuantityDefinition = {
  key: 'static-stability',
  name: 'static stability of an unsaturated layer',
  symbol: 'class',
  unit: '1',
  shownUnit: '1',
  kind: 'class',
  inputs: [
    { name: 'lapseRate', label: 'lapse rate of the layer', symbol: 'Γ', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [-1, 1] },
  ],
  variants: [{
    key: 'against-dry-rate', label: 'against Γd alone',
    source: { text: 'AMS Glossary of Meteorology, "static stability"', status: 'common practice' },
    validity: 'an unsaturated layer', knownError: 'Γd is 9.75 to 9.80 K km⁻¹ by the constants taught',
    evaluate: (inputs, constants) => ({ is: 'class', key: staticStability(rate(inputs), constants), more: { dryRate: dryRateOf(constants) } }),
  }],
  constants: ['g', 'cp', 'neutralTolerance'],
  classLimits: dryClassLimits,
  classes: [
    { key: 'stable', label: 'stable', alsoTyped: ['statically stable', 'subadiabatic'] },
    { key: 'dry-neutral', label: 'dry-neutral', alsoTyped: ['neutral', 'dry neutral', 'dry adiabatic', 'dry-adiabatic'] },
    { key: 'superadiabatic', label: 'superadiabatic', alsoTyped: ['unstable', 'absolutely unstable', 'super-adiabatic', 'statically unstable'] },
  ],
  ask: 'The static stability of the unsaturated layer against Γd alone: stable, dry-neutral (Γ within 0.1 K/km of Γd) or superadiabatic.',
  trace(inputs, constants) {
    const limit = dryRateOf(constants)
    const key = staticStability(rate(inputs), constants)
    const sign = key === 'stable' ? '<' : key === 'superadiabatic' ? '>' : '\\approx'
    return [
      { text: 'Dry adiabatic lapse rate', formula: '\\Gamma_d = \\frac{g}{c_p}', filled: `\\Gamma_d = ${texQuantity(limit * 1000, 'K/km')}`, value: limit, unit: 'K/m' },
      { text: `The layer is ${key}, with a tolerance of ${Number((constant(constants, 'neutralTolerance') * 1000).toPrecision(3))} K/km`, formula: '\\Gamma \\lessgtr \\Gamma_d', filled: `${texNumber(rate(inputs) * 1000)} ${sign} ${texQuantity(limit * 1000, 'K/km')}`, value: rate(inputs), unit: 'K/m' },
    ]
  },
  slips: [],
  example: { inputs: { lapseRate: 0.0065 }, gives: 'stable', within: 0 },
}
