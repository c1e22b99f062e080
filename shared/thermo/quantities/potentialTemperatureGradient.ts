import { kelvin, kelvinPerMeter } from '../../units/brands'
import { dryRateOf } from '../constants'
import type { Constants, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { fineSlip, per100MetersSlip, perMeterSlip, signSlip, slip } from '../slips'
import { potentialTemperatureGradient } from '../stratification'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Gradient of potential temperature from a lapse rate: see `potentialTemperatureGradient`. */
export const potentialTemperatureGradientDefinition: QuantityDefinition = {
  key: 'potential-temperature-gradient',
  name: 'gradient of potential temperature from a lapse rate',
  symbol: 'dθ/dz',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: [
    { name: 'temperature', label: 'air temperature', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [150, 400] },
    { name: 'potentialTemperature', label: 'potential temperature', symbol: 'θ', unit: 'K', shownUnit: 'K', kind: 'temperature', shape: 'number', range: [150, 800] },
    { name: 'lapseRate', label: 'lapse rate', symbol: 'Γ', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [-1, 1] },
  ],
  variants: [{
    key: 'hydrostatic', label: '(θ/T)(Γd − Γ)',
    source: { text: 'closed form: Poisson’s relation differentiated with the hydrostatic equation', status: 'verified' },
    validity: 'dry hydrostatic air', knownError: 'none beyond cp taken as constant',
    evaluate: (inputs, constants) => ({ is: 'value', value: gradient(inputs, constants) }),
  }],
  constants: ['g', 'cp'],
  classLimits: () => [{ label: 'neutral', value: 0 }],
  ask: 'The gradient of potential temperature dθ/dz = (θ/T)(Γd − Γ), positive where θ rises with height.',
  trace(inputs, constants) {
    const value = gradient(inputs, constants), dry = dryRateOf(constants)
    return [
      { text: 'Dry adiabatic lapse rate', formula: '\\Gamma_d = \\frac{g}{c_p}', filled: `\\Gamma_d = ${texQuantity(dry * 1000, 'K/km')}`, value: dry, unit: 'K/m' },
      { text: 'Gradient', formula: '\\frac{d\\theta}{dz} = \\frac{\\theta}{T} (\\Gamma_d - \\Gamma)', filled: `\\frac{d\\theta}{dz} = \\frac{${texNumber(numberOf(inputs, 'potentialTemperature'), 6)}}{${texNumber(numberOf(inputs, 'temperature'), 6)}} \\times (${texNumber(dry * 1000)} - ${texFactor(numberOf(inputs, 'lapseRate') * 1000)})\\,\\mathrm{K\\,km^{-1}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    signSlip('θ rises with height where the layer is stable, Γ < Γd.'),
    perMeterSlip,
    per100MetersSlip,
    fineSlip('ratio-left-out', 'θ/T left out', 'The factor θ/T is left out.', (inputs, constants) => dryRateOf(constants) - numberOf(inputs, 'lapseRate')),
    fineSlip('ratio-inverted', 'T/θ for θ/T', 'The factor is θ/T, not T/θ.', (inputs, constants) => numberOf(inputs, 'temperature') / numberOf(inputs, 'potentialTemperature') * (dryRateOf(constants) - numberOf(inputs, 'lapseRate'))),
    slip('gradient-sign', 'Γd + Γ for Γd − Γ', 'The lapse rate went in with its sign turned: Γ is positive where temperature falls with height.', (inputs, constants) => numberOf(inputs, 'potentialTemperature') / numberOf(inputs, 'temperature') * (dryRateOf(constants) + numberOf(inputs, 'lapseRate'))),
    slip('dry-rate-left-out', 'Γd left out', 'The dry adiabatic lapse rate is left out: this is a gradient of temperature.', inputs => -numberOf(inputs, 'lapseRate') * numberOf(inputs, 'potentialTemperature') / numberOf(inputs, 'temperature')),
  ],
  example: { inputs: { temperature: 290, potentialTemperature: 293, lapseRate: 0.0065 }, gives: 0.003305, within: 0.000001 },
}

const gradient = (inputs: Inputs, constants: Constants): number => potentialTemperatureGradient(kelvin(numberOf(inputs, 'temperature')), kelvin(numberOf(inputs, 'potentialTemperature')), kelvinPerMeter(numberOf(inputs, 'lapseRate')), constants)
