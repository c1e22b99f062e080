import type { Constants, Formulae, Inputs, QuantityDefinition } from '../definition'
import { equivalentAtEnds, equivalentGradient } from '../layerStability'
import { ascentConstants, equivalentKey } from '../parcelContext'
import { potentialStabilityInputs } from '../potentialStabilityInputs'
import { constant } from '../constants'
import { texQuantity } from '../tex'

function classOf(inputs: Inputs, constants: Constants, formulae: Formulae): 'potentially-unstable' | 'potentially-neutral' | 'potentially-stable' {
  const gradient = equivalentGradient(equivalentAtEnds(inputs, constants, formulae)), tolerance = constant(constants, 'neutralTolerance')
  return gradient < -tolerance ? 'potentially-unstable' : gradient > tolerance ? 'potentially-stable' : 'potentially-neutral'
}

/** Potential stability of a layer by the sign of ∂θe/∂z: see `equivalentGradient`. Another notion than conditional instability. */
export const potentialStabilityDefinition: QuantityDefinition = {
  key: 'potential-stability',
  name: 'potential stability of a layer',
  symbol: 'class',
  unit: '1',
  shownUnit: '1',
  kind: 'class',
  inputs: potentialStabilityInputs,
  variants: [{
    key: 'theta-e', label: 'by the sign of ∂θe/∂z',
    source: { text: 'AMS Glossary of Meteorology, "potential instability"', status: 'common practice' },
    validity: 'thin layers', knownError: 'that of θe, 0.03 K usually',
    evaluate: (inputs, constants, formulae) => ({ is: 'class', key: classOf(inputs, constants, formulae) }),
  }],
  constants: [...ascentConstants, 'neutralTolerance'],
  uses: ['saturation-vapor-pressure', 'latent-heat-of-vaporization', equivalentKey],
  classes: [
    { key: 'potentially-unstable', label: 'potentially unstable', alsoTyped: ['convectively unstable', 'potential instability', 'unstable'] },
    { key: 'potentially-neutral', label: 'potentially neutral', alsoTyped: ['convectively neutral', 'neutral'] },
    { key: 'potentially-stable', label: 'potentially stable', alsoTyped: ['convectively stable', 'stable'] },
  ],
  ask: 'The potential (convective) stability of the layer by the sign of ∂θe/∂z: potentially unstable below 0, potentially neutral within 0.1 K/km of 0, potentially stable above.',
  trace(inputs, constants, _variant, formulae) {
    const ends = equivalentAtEnds(inputs, constants, formulae), value = equivalentGradient(ends)
    return [
      { text: 'θe at both ends', formula: '\\theta_{e1},\\ \\theta_{e2}', filled: `\\theta_{e1} = ${texQuantity(ends.bottom, 'K', 6)},\\quad \\theta_{e2} = ${texQuantity(ends.top, 'K', 6)}` },
      { text: `The layer is ${classOf(inputs, constants, formulae).replace('-', ' ')}`, formula: '\\frac{\\partial\\theta_e}{\\partial z} \\lessgtr 0', filled: `\\frac{\\partial\\theta_e}{\\partial z} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [],
  example: { inputs: { pressureBottom: 95_000, temperatureBottom: 298.15, dewpointBottom: 293.15, pressureTop: 85_000, temperatureTop: 291.15, dewpointTop: 281.15, depth: 970 }, gives: 'potentially-unstable', within: 0 },
}
