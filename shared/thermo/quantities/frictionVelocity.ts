import { log10 } from '../../numerics/elementary'
import { constant } from '../constants'
import type { QuantityDefinition } from '../definition'
import { frictionVelocity, twoHeightInputs, twoHeightsOf } from '../logProfile'
import { signSlip, slip } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Friction velocity from the wind at two heights: see `frictionVelocity`. */
export const frictionVelocityDefinition: QuantityDefinition = {
  key: 'friction-velocity',
  name: 'friction velocity from the wind at two heights',
  symbol: 'u_*',
  unit: 'm/s',
  shownUnit: 'm/s',
  kind: 'difference',
  nearZero: 0.01,
  inputs: twoHeightInputs,
  variants: [{
    key: 'neutral', label: 'neutral logarithmic profile',
    source: { text: 'AMS Glossary of Meteorology, "logarithmic velocity profile", at two heights', status: 'verified' },
    validity: 'neutral air over even ground', knownError: 'the von Kármán constant is taught as 0.40 or 0.41',
    evaluate: (inputs, constants) => ({ is: 'value', value: frictionVelocity(twoHeightsOf(inputs), constants) }),
  }],
  constants: ['vonKarman'],
  ask: 'The friction velocity u_* = k (u₂ − u₁) / ln[(z₂ − d)/(z₁ − d)] from the wind at two heights; d is 0 where no displacement height is given.',
  trace(inputs, constants) {
    const { low, high, lowSpeed, highSpeed } = twoHeightsOf(inputs), value = frictionVelocity(twoHeightsOf(inputs), constants)
    return [{ text: 'Friction velocity', formula: 'u_* = \\frac{k (u_2 - u_1)}{\\ln (z_2 / z_1)}', filled: `u_* = \\frac{${texNumber(constant(constants, 'vonKarman'))} \\times ${texFactor(highSpeed - lowSpeed)}}{\\ln (${texNumber(high)} / ${texNumber(low)})}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value, 'm/s')}`, value, unit: 'm/s' }]
  },
  slips: [
    signSlip('The sign is turned round: one of the differences is taken upside down.'),
    slip('base-ten', 'log₁₀ for ln', 'This takes the logarithm to base 10: the natural one is needed.', (inputs, constants) => {
      const { low, high, lowSpeed, highSpeed } = twoHeightsOf(inputs)
      return constant(constants, 'vonKarman') * (highSpeed - lowSpeed) / log10(high / low)
    }),
    slip('constant-left-out', 'k left out', 'The von Kármán constant is left out.', (_i, constants, right) => right / constant(constants, 'vonKarman')),
    slip('constant-divided', 'divided by k', 'This divides by the von Kármán constant in place of multiplying.', (_i, constants, right) => right / constant(constants, 'vonKarman') / constant(constants, 'vonKarman')),
    slip('logarithm-left-out', 'difference of heights for the logarithm', 'This divides by the difference of the heights: the logarithm of their ratio is needed.', (inputs, constants) => {
      const { low, high, lowSpeed, highSpeed } = twoHeightsOf(inputs)
      return constant(constants, 'vonKarman') * (highSpeed - lowSpeed) / (high - low)
    }),
  ],
  example: { inputs: { lowHeight: 2, lowSpeed: 3.2, highHeight: 10, highSpeed: 4.6 }, gives: 0.34795, within: 0.00001 },
}
