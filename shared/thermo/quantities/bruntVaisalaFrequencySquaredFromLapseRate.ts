import { kelvin, kelvinPerMeter } from '../../units/brands'
import { constant, dryRateOf } from '../constants'
import type { Constants, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { dryClassLimits } from '../layer'
import { signSlip, slip, zeroCelsius } from '../slips'
import { bruntVaisalaSquaredFromLapseRate } from '../stratification'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Brunt–Väisälä frequency squared from the lapse rate of a dry layer: see `bruntVaisalaSquaredFromLapseRate`. */
export const bruntVaisalaFrequencySquaredFromLapseRateDefinition: QuantityDefinition = {
  key: 'brunt-vaisala-frequency-squared-from-lapse-rate',
  name: 'Brunt–Väisälä frequency squared from a lapse rate',
  symbol: 'N²',
  unit: 's-2',
  shownUnit: 's-2',
  kind: 'difference',
  nearZero: 0.00001,
  inputs: [
    { name: 'temperature', label: 'mean air temperature of the layer', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [150, 400] },
    { name: 'lapseRate', label: 'lapse rate of the layer', symbol: 'Γ', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [-1, 1] },
  ],
  variants: [{
    key: 'dry', label: '(g/T)(Γd − Γ), dry air',
    source: { text: 'AMS Glossary of Meteorology, "Brunt–Väisälä frequency"', status: 'verified' },
    validity: 'unsaturated air', knownError: 'moisture gradients are left out',
    evaluate: (inputs, constants) => ({ is: 'value', value: squared(inputs, constants) }),
  }],
  constants: ['g', 'cp'],
  classLimits: (inputs, constants) => dryClassLimits(inputs, constants).map(({ label, value }) => ({ label, value: constant(constants, 'g') / numberOf(inputs, 'temperature') * (dryRateOf(constants) - value) })),
  ask: 'The Brunt–Väisälä frequency squared N² = (g/T)(Γd − Γ) of the dry layer with Γd = g/cp, negative where the layer is superadiabatic.',
  trace(inputs, constants) {
    const value = squared(inputs, constants), dry = dryRateOf(constants), rate = numberOf(inputs, 'lapseRate')
    return [
      { text: 'Dry adiabatic lapse rate', formula: '\\Gamma_d = \\frac{g}{c_p}', filled: `\\Gamma_d = ${texQuantity(dry * 1000, 'K/km')}`, value: dry, unit: 'K/m' },
      { text: 'Frequency squared', formula: 'N^2 = \\frac{g}{T} (\\Gamma_d - \\Gamma)', filled: `N^2 = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber(numberOf(inputs, 'temperature'), 6)}} \\times (${texNumber(dry)} - ${texFactor(rate)})\\,\\mathrm{s^{-2}} = ${texQuantity(value, 's-2')}`, value, unit: 's-2' },
    ]
  },
  slips: [
    signSlip('N² is positive where the layer is stable, Γ < Γd.'),
    slip('gradient-sign', 'Γd + Γ for Γd − Γ', 'The lapse rate went in with its sign turned: Γ is positive where temperature falls with height.', (inputs, constants) => constant(constants, 'g') / numberOf(inputs, 'temperature') * (dryRateOf(constants) + numberOf(inputs, 'lapseRate'))),
    slip('celsius-for-kelvin', '°C in place of K', 'The temperature went in in degrees Celsius: it has to be in kelvin.', (inputs, _c, right) => {
      const T = numberOf(inputs, 'temperature')
      return T === zeroCelsius ? null : right * T / (T - zeroCelsius)
    }),
    slip('per-kilometer', 'K km⁻¹ in place of K m⁻¹', 'The lapse rates went in in K per kilometer: per meter is needed.', (_i, _c, right) => right * 1000),
    slip('dry-rate-left-out', 'Γd left out', 'The dry adiabatic lapse rate is left out: a layer is neutral at Γd, not at 0.', (inputs, constants) => -constant(constants, 'g') / numberOf(inputs, 'temperature') * numberOf(inputs, 'lapseRate')),
    slip('gravity-left-out', 'g left out', 'The acceleration of gravity is left out.', (_i, constants, right) => right / constant(constants, 'g')),
  ],
  example: { inputs: { temperature: 288.15, lapseRate: 0.0065 }, gives: 1.1136e-4, within: 1e-8 },
}

const squared = (inputs: Inputs, constants: Constants): number => bruntVaisalaSquaredFromLapseRate(kelvin(numberOf(inputs, 'temperature')), kelvinPerMeter(numberOf(inputs, 'lapseRate')), constants)
