import { log10 } from '../../numerics/elementary'
import { constant } from '../constants'
import type { Constants, Inputs, QuantityDefinition } from '../definition'
import { OutOfRangeError } from '../errors'
import { numberOf } from '../inputs'
import { displacementInput, displacementOf, frictionVelocityInput, logWind, measurementHeightInput, roughnessInput } from '../logProfile'
import { slip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/** Wind speed by the neutral logarithmic profile: see `logWind`. */
export const logarithmicWindSpeedDefinition: QuantityDefinition = {
  key: 'logarithmic-wind-speed',
  name: 'wind speed by the neutral logarithmic profile',
  symbol: 'u',
  unit: 'm/s',
  shownUnit: 'm/s',
  kind: 'ratio',
  nearZero: 0.1,
  inputs: [frictionVelocityInput, measurementHeightInput, roughnessInput, displacementInput],
  variants: [{
    key: 'neutral', label: 'neutral profile',
    source: { text: 'AMS Glossary of Meteorology, "logarithmic velocity profile"', status: 'verified' },
    validity: 'neutral air over even ground, the lowest tenth of the boundary layer', knownError: 'the von Kármán constant is taught as 0.40 or 0.41',
    evaluate: (inputs, constants) => ({ is: 'value', value: speed(inputs, constants) }),
  }],
  constants: ['vonKarman'],
  ask: 'The wind speed u = (u_*/k) ln[(z − d)/z₀] of the neutral logarithmic profile; d is 0 where no displacement height is given.',
  trace(inputs, constants) {
    const height = heightOf(inputs), value = speed(inputs, constants), k = constant(constants, 'vonKarman')
    return [
      { text: 'Height above the displacement height', formula: 'z - d', filled: `z - d = ${texQuantity(height, 'm')}`, value: height, unit: 'm' },
      { text: 'Wind speed', formula: 'u = \\frac{u_*}{k} \\ln \\frac{z - d}{z_0}', filled: `u = \\frac{${texNumber(numberOf(inputs, 'frictionVelocity'))}}{${texNumber(k)}} \\ln \\frac{${texNumber(height)}}{${texNumber(numberOf(inputs, 'roughnessLength'))}}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value, 'm/s')}`, value, unit: 'm/s' },
    ]
  },
  slips: [
    slip('base-ten', 'log₁₀ for ln', 'This takes the logarithm to base 10: the natural one is needed.', (inputs, constants) => numberOf(inputs, 'frictionVelocity') / constant(constants, 'vonKarman') * log10(heightOf(inputs) / numberOf(inputs, 'roughnessLength'))),
    slip('constant-left-out', 'k left out', 'The von Kármán constant is left out.', (_i, constants, right) => right * constant(constants, 'vonKarman')),
    slip('constant-multiplied', 'multiplied by k', 'This multiplies by the von Kármán constant in place of dividing.', (_i, constants, right) => right * constant(constants, 'vonKarman') * constant(constants, 'vonKarman')),
    slip('ratio-inverted', 'z₀/z for z/z₀', 'The ratio is turned over: the sign of the result tells.', (_i, _c, right) => -right),
    slip('displacement-added', 'd added', 'The displacement height is added: it has to be taken off.', (inputs, constants) => (displacementOf(inputs) > 0 ? logWind(numberOf(inputs, 'frictionVelocity'), numberOf(inputs, 'measurementHeight') + displacementOf(inputs), numberOf(inputs, 'roughnessLength'), constants) : null)),
    slip('displacement-left-out', 'd left out', 'The displacement height is left out.', (inputs, constants) => (displacementOf(inputs) > 0 ? logWind(numberOf(inputs, 'frictionVelocity'), numberOf(inputs, 'measurementHeight'), numberOf(inputs, 'roughnessLength'), constants) : null)),
  ],
  example: { inputs: { frictionVelocity: 0.35, measurementHeight: 10, roughnessLength: 0.03 }, gives: 5.0830, within: 0.0001 },
}

/** @throws {OutOfRangeError} where the height is not above the roughness length and the displacement height */
function heightOf(inputs: Inputs): number {
  const height = numberOf(inputs, 'measurementHeight') - displacementOf(inputs)
  if (!(height > numberOf(inputs, 'roughnessLength'))) throw new OutOfRangeError('measurementHeight', numberOf(inputs, 'measurementHeight'), 'heights above the roughness length and the displacement height')
  return height
}

const speed = (inputs: Inputs, constants: Constants): number => logWind(numberOf(inputs, 'frictionVelocity'), heightOf(inputs), numberOf(inputs, 'roughnessLength'), constants)
