import { constant, dryRateOf } from '../constants'
import type { Constants, Formulae, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { layerSaturatedRate, layerStability } from '../layerStability'
import { texNumber, texQuantity } from '../tex'

const rate = (inputs: Inputs) => numberOf(inputs, 'lapseRate')
const isSaturated = (inputs: Inputs) => 'relativeHumidity' in inputs && numberOf(inputs, 'relativeHumidity') >= 1
const classOf = (inputs: Inputs, constants: Constants, formulae: Formulae) => layerStability({ lapseRate: rate(inputs), saturated: layerSaturatedRate(inputs, constants, formulae), isSaturated: isSaturated(inputs) }, constants)

/** Stability of a layer in five classes: see `layerStability`. */
export const layerStabilityDefinition: QuantityDefinition = {
  key: 'layer-stability',
  name: 'stability of a layer against both adiabats',
  symbol: 'class',
  unit: '1',
  shownUnit: '1',
  kind: 'class',
  inputs: [
    { name: 'lapseRate', label: 'lapse rate of the layer', symbol: 'Γ', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [-1, 1] },
    { name: 'meanTemperature', label: 'mean temperature of the layer', symbol: 'T̄', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [200, 330] },
    { name: 'meanPressure', label: 'mean pressure of the layer', symbol: 'p̄', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [10_000, 110_000] },
    { name: 'relativeHumidity', label: 'mean relative humidity; from 100 % on the layer is saturated, and without it unsaturated', symbol: 'RH', unit: '1', shownUnit: '%', kind: 'fraction', shape: 'number', range: [0, 1.2], isOptional: true },
  ],
  variants: [{
    key: 'both-adiabats', label: 'against Γm at the layer’s mean p and T, and Γd',
    source: { text: 'AMS Glossary of Meteorology, "absolute instability", "conditional instability"', status: 'common practice' },
    validity: 'thin layers', knownError: 'Γd is 9.75 to 9.80 K km⁻¹ by the constants taught; Γm by the formulae of eₛ and L, 0.06 K km⁻¹',
    evaluate: (inputs, constants, formulae) => ({ is: 'class', key: classOf(inputs, constants, formulae), more: { saturatedRate: layerSaturatedRate(inputs, constants, formulae), dryRate: dryRateOf(constants) } }),
  }],
  constants: ['g', 'cp', 'R', 'Rv', 'latentHeat', 'cpv', 'cw', 'enhancementFactor', 'neutralTolerance'],
  uses: ['saturation-vapor-pressure', 'latent-heat-of-vaporization'],
  classLimits(inputs, constants, formulae) {
    const saturated = layerSaturatedRate(inputs, constants, formulae), dry = dryRateOf(constants), tolerance = constant(constants, 'neutralTolerance')
    const about = (label: string, value: number) => [{ label: `${label} less the tolerance of a neutral layer`, value: value - tolerance }, { label: `${label} with the tolerance of a neutral layer`, value: value + tolerance }]
    return [...about('Γm', saturated), ...isSaturated(inputs) ? [] : about('Γd', dry)]
  },
  classes: [
    { key: 'absolutely-stable', label: 'absolutely stable', alsoTyped: ['stable', 'statically stable', 'absolute stability'] },
    { key: 'saturated-neutral', label: 'saturated-neutral', alsoTyped: ['saturated neutral', 'moist neutral', 'moist-neutral', 'neutral for saturated air'] },
    { key: 'conditionally-unstable', label: 'conditionally unstable', alsoTyped: ['conditional', 'conditional instability', 'conditionally-unstable'] },
    { key: 'dry-neutral', label: 'dry-neutral', alsoTyped: ['neutral', 'dry neutral', 'dry adiabatic', 'dry-adiabatic'] },
    { key: 'absolutely-unstable', label: 'absolutely unstable', alsoTyped: ['unstable', 'superadiabatic', 'super-adiabatic', 'statically unstable', 'absolute instability'] },
  ],
  ask: 'The stability of the layer: absolutely stable (Γ < Γm), saturated-neutral (Γ within 0.1 K/km of Γm), conditionally unstable (Γm < Γ < Γd), dry-neutral (Γ within 0.1 K/km of Γd) or absolutely unstable, which is superadiabatic (Γ > Γd), with Γm at the layer’s mean pressure and temperature; a saturated layer is judged against Γm alone.',
  trace(inputs, constants, _variant, formulae) {
    const saturated = layerSaturatedRate(inputs, constants, formulae), dry = dryRateOf(constants)
    return [
      { text: 'Saturated adiabatic lapse rate at the layer’s mean pressure and temperature', formula: '\\Gamma_m(\\bar T, \\bar p)', filled: `\\Gamma_m = ${texQuantity(saturated * 1000, 'K/km')}`, value: saturated, unit: 'K/m' },
      { text: 'Dry adiabatic lapse rate', formula: '\\Gamma_d = \\frac{g}{c_p}', filled: `\\Gamma_d = ${texQuantity(dry * 1000, 'K/km')}`, value: dry, unit: 'K/m' },
      { text: `The ${isSaturated(inputs) ? 'saturated' : 'unsaturated'} layer is ${classOf(inputs, constants, formulae).replace('-', ' ')}, with a tolerance of ${Number((constant(constants, 'neutralTolerance') * 1000).toPrecision(3))} K/km`, formula: '\\Gamma \\lessgtr \\Gamma_m,\\,\\Gamma_d', filled: `\\Gamma = ${texNumber(rate(inputs) * 1000)}\\,\\mathrm{K\\,km^{-1}}`, value: rate(inputs), unit: 'K/m' },
    ]
  },
  slips: [],
  example: { inputs: { lapseRate: 0.005, meanTemperature: 298.15, meanPressure: 95_000 }, gives: 'conditionally-unstable', within: 0 },
}
