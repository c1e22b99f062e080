import { kelvin, kelvinPerMeter } from '../../units/brands'
import { dryRateOf } from '../constants'
import type { Constants, Inputs } from '../definition'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { fineSlip, per100MetersSlip, perMeterSlip, signSlip, slip } from '../slips'
import { potentialTemperatureGradient, virtualRateInput, virtualTemperatureInput } from '../stratification'
import { texFactor, texNumber, texQuantity } from '../tex'

const rate = (inputs: Inputs) => numberOf(inputs, 'virtualLapseRate')
const theta = (inputs: Inputs) => numberOf(inputs, 'virtualPotentialTemperature')
const Tv = (inputs: Inputs) => numberOf(inputs, 'virtualTemperature')
const value = (inputs: Inputs, constants: Constants): number => potentialTemperatureGradient(kelvin(Tv(inputs)), kelvin(theta(inputs)), kelvinPerMeter(rate(inputs)), constants)

/**
 * Gradient of virtual potential temperature from the lapse rate of virtual temperature.
 *
 *   dθv/dz = (θv/Tv)(Γd − Γv)
 *
 * Source: θv = Tv (p₀/p)^κ differentiated with the hydrostatic equation of moist air (closed form). SI. Unsaturated air.
 *
 * @example Tv 290 K, θv 293 K, Γv 9.41 K/km: 0.365 K km⁻¹
 */
export const virtualPotentialTemperatureGradientDefinition = oneFormula({
  key: 'virtual-potential-temperature-gradient',
  name: 'gradient of virtual potential temperature from a lapse rate of virtual temperature',
  symbol: 'dθv/dz',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: [
    virtualTemperatureInput('virtual temperature'),
    { name: 'virtualPotentialTemperature', label: 'virtual potential temperature', symbol: 'θv', unit: 'K', shownUnit: 'K', kind: 'temperature', shape: 'number', range: [150, 800] },
    virtualRateInput,
  ],
  constants: ['g', 'cp'],
  formula: {
    key: 'hydrostatic', label: '(θv/Tv)(Γd − Γv)', source: { text: 'closed form: Poisson’s relation of Tv differentiated with the hydrostatic equation', status: 'verified' },
    validity: 'unsaturated hydrostatic air', knownError: 'κ of dry air for that of moist air: 0.04 K km⁻¹ at 15 g kg⁻¹',
  },
  classLimits: () => [{ label: 'neutral', value: 0 }],
  ask: 'The gradient of virtual potential temperature dθv/dz = (θv/Tv)(Γd − Γv) from the lapse rate Γv of the virtual temperature, positive where θv rises with height.',
  value,
  working(inputs, constants, result) {
    const dry = dryRateOf(constants)
    return [
      { text: 'Dry adiabatic lapse rate', formula: '\\Gamma_d = \\frac{g}{c_p}', filled: `\\Gamma_d = ${texQuantity(dry * 1000, 'K/km')}`, value: dry, unit: 'K/m' },
      { text: 'Gradient', formula: '\\frac{d\\theta_v}{dz} = \\frac{\\theta_v}{T_v} (\\Gamma_d - \\Gamma_v)', filled: `\\frac{d\\theta_v}{dz} = \\frac{${texNumber(theta(inputs), 6)}}{${texNumber(Tv(inputs), 6)}} \\times (${texNumber(dry * 1000)} - ${texFactor(rate(inputs) * 1000)})\\,\\mathrm{K\\,km^{-1}} = ${texQuantity(result * 1000, 'K/km')}`, value: result, unit: 'K/m' },
    ]
  },
  slips: [
    signSlip('θv rises with height where the layer is stable, Γv < Γd.'),
    perMeterSlip,
    per100MetersSlip,
    fineSlip('ratio-left-out', 'θv/Tv left out', 'The factor θv/Tv is left out.', (inputs, constants) => dryRateOf(constants) - rate(inputs)),
    fineSlip('ratio-inverted', 'Tv/θv for θv/Tv', 'The factor is θv/Tv, not Tv/θv.', (inputs, constants) => Tv(inputs) / theta(inputs) * (dryRateOf(constants) - rate(inputs))),
    slip('gradient-sign', 'Γd + Γv for Γd − Γv', 'The lapse rate went in with its sign turned: Γv is positive where the virtual temperature falls with height.', (inputs, constants) => theta(inputs) / Tv(inputs) * (dryRateOf(constants) + rate(inputs))),
    slip('dry-rate-left-out', 'Γd left out', 'The dry adiabatic lapse rate is left out: this is a gradient of temperature.', inputs => -rate(inputs) * theta(inputs) / Tv(inputs)),
  ],
  example: { inputs: { virtualTemperature: 290, virtualPotentialTemperature: 293, virtualLapseRate: 0.00941 }, gives: 0.00036465, within: 1e-8 },
})
