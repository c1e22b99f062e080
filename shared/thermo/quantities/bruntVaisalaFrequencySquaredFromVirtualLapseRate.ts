import { kelvin, kelvinPerMeter } from '../../units/brands'
import { constant, dryRateOf } from '../constants'
import type { Constants, Inputs } from '../definition'
import { numberOf } from '../inputs'
import { dryClassLimits } from '../layer'
import { oneFormula } from '../oneFormula'
import { signSlip, slip, zeroCelsius } from '../slips'
import { bruntVaisalaSquaredFromLapseRate, virtualRateInput, virtualTemperatureInput } from '../stratification'
import { texFactor, texNumber, texQuantity } from '../tex'

const rate = (inputs: Inputs) => numberOf(inputs, 'virtualLapseRate')
const Tv = (inputs: Inputs) => numberOf(inputs, 'virtualTemperature')
const value = (inputs: Inputs, constants: Constants): number => bruntVaisalaSquaredFromLapseRate(kelvin(Tv(inputs)), kelvinPerMeter(rate(inputs)), constants)

/**
 * Brunt–Väisälä frequency squared of unsaturated moist air from the lapse rate of its virtual temperature.
 *
 *   N² = (g/Tv)(Γd − Γv)
 *
 * Source: AMS Glossary of Meteorology, "Brunt–Väisälä frequency", with θv for θ. SI. Another quantity than with T and Γ, which leave the vapor's gradient out.
 *
 * @example Tv 288 K, Γv 9.41 K/km: 1.229e-5 s⁻²
 */
export const bruntVaisalaFrequencySquaredFromVirtualLapseRateDefinition = oneFormula({
  key: 'brunt-vaisala-frequency-squared-from-virtual-lapse-rate',
  name: 'Brunt–Väisälä frequency squared from a lapse rate of virtual temperature',
  symbol: 'N²',
  unit: 's-2',
  shownUnit: 's-2',
  kind: 'difference',
  nearZero: 0.00001,
  inputs: [virtualTemperatureInput('mean virtual temperature of the layer'), virtualRateInput],
  constants: ['g', 'cp'],
  formula: {
    key: 'unsaturated', label: '(g/Tv)(Γd − Γv)', source: { text: 'AMS Glossary of Meteorology, "Brunt–Väisälä frequency"', status: 'common practice' },
    validity: 'unsaturated air', knownError: 'κ of dry air for that of moist air: 1.2·10⁻⁶ s⁻² at 15 g kg⁻¹',
  },
  classLimits: (inputs, constants) => dryClassLimits(inputs, constants).map(({ label, value: limit }) => ({ label, value: constant(constants, 'g') / Tv(inputs) * (dryRateOf(constants) - limit) })),
  ask: 'The Brunt–Väisälä frequency squared N² = (g/Tv)(Γd − Γv) of the unsaturated layer from the lapse rate Γv of its virtual temperature, with Γd = g/cp, negative where the layer is superadiabatic.',
  value,
  working(inputs, constants, result) {
    const dry = dryRateOf(constants)
    return [
      { text: 'Dry adiabatic lapse rate', formula: '\\Gamma_d = \\frac{g}{c_p}', filled: `\\Gamma_d = ${texQuantity(dry * 1000, 'K/km')}`, value: dry, unit: 'K/m' },
      { text: 'Frequency squared', formula: 'N^2 = \\frac{g}{T_v} (\\Gamma_d - \\Gamma_v)', filled: `N^2 = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber(Tv(inputs), 6)}} \\times (${texNumber(dry)} - ${texFactor(rate(inputs))})\\,\\mathrm{s^{-2}} = ${texQuantity(result, 's-2')}`, value: result, unit: 's-2' },
    ]
  },
  slips: [
    signSlip('N² is positive where the layer is stable, Γv < Γd.'),
    slip('gradient-sign', 'Γd + Γv for Γd − Γv', 'The lapse rate went in with its sign turned: Γv is positive where the virtual temperature falls with height.', (inputs, constants) => constant(constants, 'g') / Tv(inputs) * (dryRateOf(constants) + rate(inputs))),
    slip('celsius-for-kelvin', '°C in place of K', 'The virtual temperature went in in degrees Celsius: it has to be in kelvin.', (inputs, _c, right) => (Tv(inputs) === zeroCelsius ? null : right * Tv(inputs) / (Tv(inputs) - zeroCelsius))),
    slip('per-kilometer', 'K km⁻¹ in place of K m⁻¹', 'The lapse rates went in in K per kilometer: per meter is needed.', (_i, _c, right) => right * 1000),
    slip('dry-rate-left-out', 'Γd left out', 'The dry adiabatic lapse rate is left out: a layer is neutral at Γd, not at 0.', (inputs, constants) => -constant(constants, 'g') / Tv(inputs) * rate(inputs)),
    slip('gravity-left-out', 'g left out', 'The acceleration of gravity is left out.', (_i, constants, right) => right / constant(constants, 'g')),
  ],
  example: { inputs: { virtualTemperature: 288, virtualLapseRate: 0.00941 }, gives: 1.229371e-5, within: 1e-11 },
})
