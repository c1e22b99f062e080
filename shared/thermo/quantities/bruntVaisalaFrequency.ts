import { kelvin, meter } from '../../units/brands'
import { constant } from '../constants'
import type { Constants, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { slip, zeroCelsius } from '../slips'
import { bruntVaisalaSquared, thetaLayerInputs } from '../stratification'
import { texNumber, texQuantity } from '../tex'

/**
 * Brunt–Väisälä frequency of a layer.
 *
 *   N = √N²     not defined where N² is negative: the layer does not oscillate
 *
 * Source: AMS Glossary of Meteorology, "Brunt–Väisälä frequency". See `bruntVaisalaSquared`.
 *
 * @example θ 300 and 303 K over 1000 m: 0.00988 s⁻¹
 */
export const bruntVaisalaFrequencyDefinition: QuantityDefinition = {
  key: 'brunt-vaisala-frequency',
  name: 'Brunt–Väisälä frequency',
  symbol: 'N',
  unit: 's-1',
  shownUnit: 's-1',
  kind: 'ratio',
  nearZero: 0.001,
  inputs: thetaLayerInputs,
  variants: [{
    key: 'mean-theta', label: 'with the mean of θ at bottom and top',
    source: { text: 'AMS Glossary of Meteorology, "Brunt–Väisälä frequency"', status: 'verified' },
    validity: 'a layer whose θ does not fall with height', knownError: '(Δθ/θ)²/24 against the logarithmic form',
    evaluate(inputs, constants) {
      const value = squared(inputs, constants)
      return value < 0 ? { is: 'not_defined', why: 'N² is negative: θ falls with height, and the layer does not oscillate.' } : { is: 'value', value: Math.sqrt(value) }
    },
  }],
  constants: ['g'],
  ask: 'The Brunt–Väisälä frequency N = √[(g/θ̄) Δθ/Δz] of the layer, with the mean θ̄ of bottom and top; "not defined" where N² is negative.',
  trace(inputs, constants) {
    const value = squared(inputs, constants)
    const first = { text: 'Frequency squared', formula: 'N^2 = \\frac{g}{\\bar\\theta} \\frac{\\theta_2 - \\theta_1}{\\Delta z}', filled: `N^2 = ${texQuantity(value, 's-2')}`, value, unit: 's-2' }
    if (value < 0) return [first]
    return [first, { text: 'Its root', formula: 'N = \\sqrt{N^2}', filled: `N = \\sqrt{${texNumber(value)}}\\,\\mathrm{s^{-1}} = ${texQuantity(Math.sqrt(value), 's-1')}`, value: Math.sqrt(value), unit: 's-1' }]
  },
  slips: [
    slip('root-left-out', 'N² in place of N', 'This is N squared: take its root.', (_i, _c, right) => right * right),
    slip('in-hertz', 'cycles for radians', 'This counts whole swings: N is an angular frequency, 2π times as large.', (_i, _c, right) => right / 6.283185307179586),
    slip('period', 'the period in place of N', 'This is the period 2π/N.', (_i, _c, right) => (right > 0 ? 6.283185307179586 / right : null)),
    slip('celsius-for-kelvin', '°C in place of K', 'The mean θ went in in degrees Celsius: it has to be in kelvin.', (inputs, _c, right) => {
      const mean = (numberOf(inputs, 'potentialTemperatureBottom') + numberOf(inputs, 'potentialTemperatureTop')) / 2
      return mean > zeroCelsius ? right * Math.sqrt(mean / (mean - zeroCelsius)) : null
    }),
    slip('gravity-left-out', 'g left out', 'The acceleration of gravity is left out.', (_i, constants, right) => right / Math.sqrt(constant(constants, 'g'))),
  ],
  example: { inputs: { potentialTemperatureBottom: 300, potentialTemperatureTop: 303, depth: 1000 }, gives: 0.0098799, within: 1e-7 },
}

function squared(inputs: Inputs, constants: Constants): number {
  return bruntVaisalaSquared(kelvin(numberOf(inputs, 'potentialTemperatureBottom')), kelvin(numberOf(inputs, 'potentialTemperatureTop')), meter(numberOf(inputs, 'depth')), constants)
}
