import { kelvin, meter } from '../../units/brands'
import { constant } from '../constants'
import type { Constants, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { fineSlip, signSlip, slip, zeroCelsius } from '../slips'
import { bruntVaisalaSquared, thetaLayerInputs } from '../stratification'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Brunt–Väisälä frequency squared of a layer, with its sign: see `bruntVaisalaSquared`. */
export const bruntVaisalaFrequencySquaredDefinition: QuantityDefinition = {
  key: 'brunt-vaisala-frequency-squared',
  name: 'Brunt–Väisälä frequency squared',
  symbol: 'N²',
  unit: 's-2',
  shownUnit: 's-2',
  kind: 'difference',
  nearZero: 0.00001,
  inputs: thetaLayerInputs,
  variants: [{
    key: 'mean-theta', label: 'with the mean of θ at bottom and top',
    source: { text: 'AMS Glossary of Meteorology, "Brunt–Väisälä frequency"', status: 'verified' },
    validity: 'any layer', knownError: '(Δθ/θ)²/12 against the logarithmic form: 0.001 % for 3 K',
    evaluate: (inputs, constants) => ({ is: 'value', value: squared(inputs, constants) }),
  }],
  constants: ['g'],
  classLimits: () => [{ label: 'neutral', value: 0 }],
  ask: 'The Brunt–Väisälä frequency squared N² = (g/θ̄) Δθ/Δz of the layer, with the mean θ̄ of bottom and top, negative where θ falls with height.',
  trace(inputs, constants) {
    const { bottom, top, depth } = layer(inputs), value = squared(inputs, constants)
    return [
      { text: 'Mean potential temperature', formula: '\\bar\\theta = \\frac{\\theta_1 + \\theta_2}{2}', filled: `\\bar\\theta = ${texQuantity((bottom + top) / 2, 'K', 6)}`, value: (bottom + top) / 2, unit: 'K' },
      { text: 'Frequency squared', formula: 'N^2 = \\frac{g}{\\bar\\theta} \\frac{\\theta_2 - \\theta_1}{\\Delta z}', filled: `N^2 = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber((bottom + top) / 2, 6)}} \\times \\frac{${texFactor(top - bottom)}}{${texNumber(depth, 6)}}\\,\\mathrm{s^{-2}} = ${texQuantity(value, 's-2')}`, value, unit: 's-2' },
    ]
  },
  slips: [
    signSlip('N² is positive where θ rises with height; the layer may have been taken upside down.'),
    slip('celsius-for-kelvin', '°C in place of K', 'The mean θ went in in degrees Celsius: it has to be in kelvin.', (inputs, _c, right) => {
      const { bottom, top } = layer(inputs), mean = (bottom + top) / 2
      return mean === zeroCelsius ? null : right * mean / (mean - zeroCelsius)
    }),
    slip('gravity-left-out', 'g left out', 'The acceleration of gravity is left out.', (_i, constants, right) => right / constant(constants, 'g')),
    slip('theta-left-out', 'θ̄ left out', 'The division by the mean θ is left out.', (inputs, _c, right) => right * (layer(inputs).bottom + layer(inputs).top) / 2),
    slip('root-taken', 'N in place of N²', 'This is N itself: the ask is N squared.', (_i, _c, right) => (right > 0 ? Math.sqrt(right) : null)),
    slip('root-of-size', 'root of the size of a negative N²', 'N² is negative here, and N is not defined: the root of its size is no frequency.', (_i, _c, right) => (right < 0 ? Math.sqrt(-right) : null)),
    fineSlip('bottom-theta', 'θ at the bottom for the mean', 'This divides by θ at the bottom: the ask takes the mean of the layer.', (inputs, _c, right) => right * (layer(inputs).bottom + layer(inputs).top) / 2 / layer(inputs).bottom),
  ],
  example: { inputs: { potentialTemperatureBottom: 300, potentialTemperatureTop: 303, depth: 1000 }, gives: 9.7612e-5, within: 1e-9 },
}

const layer = (inputs: Inputs) => ({ bottom: kelvin(numberOf(inputs, 'potentialTemperatureBottom')), top: kelvin(numberOf(inputs, 'potentialTemperatureTop')), depth: meter(numberOf(inputs, 'depth')) })

function squared(inputs: Inputs, constants: Constants): number {
  const { bottom, top, depth } = layer(inputs)
  return bruntVaisalaSquared(bottom, top, depth, constants)
}
