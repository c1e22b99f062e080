import { pow } from '../../numerics/elementary'
import { kappaOf } from '../constants'
import type { QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { equivalentAtEnds, equivalentGradient } from '../layerStability'
import { ascentConstants, equivalentKey } from '../parcelContext'
import { potentialStabilityInputs } from '../potentialStabilityInputs'
import { per100MetersSlip, perMeterSlip, signSlip, slip } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Potential instability of a layer, ∂θe/∂z with its sign: see `equivalentGradient`. */
export const equivalentPotentialTemperatureGradientDefinition: QuantityDefinition = {
  key: 'equivalent-potential-temperature-gradient',
  name: 'potential instability: gradient of the equivalent potential temperature',
  symbol: '∂θe/∂z',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: potentialStabilityInputs,
  variants: [{
    key: 'ends', label: 'θe at the top less θe at the bottom, by the depth',
    source: { text: 'AMS Glossary of Meteorology, "potential instability"', status: 'common practice' },
    validity: 'thin layers', knownError: 'that of θe, 0.03 K usually',
    evaluate: (inputs, constants, formulae) => ({ is: 'value', value: equivalentGradient(equivalentAtEnds(inputs, constants, formulae)) }),
  }],
  constants: ascentConstants,
  uses: ['saturation-vapor-pressure', 'latent-heat-of-vaporization', equivalentKey],
  classLimits: () => [{ label: 'potentially neutral', value: 0 }],
  ask: 'The gradient of the equivalent potential temperature ∂θe/∂z = (θe₂ − θe₁)/Δz of the layer, with its sign: negative where the layer is potentially (convectively) unstable.',
  trace(inputs, constants, _variant, formulae) {
    const ends = equivalentAtEnds(inputs, constants, formulae), value = equivalentGradient(ends)
    return [
      { text: 'θe at both ends', formula: '\\theta_{e1},\\ \\theta_{e2}', filled: `\\theta_{e1} = ${texQuantity(ends.bottom, 'K', 6)},\\quad \\theta_{e2} = ${texQuantity(ends.top, 'K', 6)}` },
      { text: 'Gradient', formula: '\\frac{\\partial\\theta_e}{\\partial z} = \\frac{\\theta_{e2} - \\theta_{e1}}{\\Delta z}', filled: `\\frac{\\partial\\theta_e}{\\partial z} = \\frac{${texFactor(ends.top - ends.bottom)}\\,\\mathrm{K}}{${texNumber(ends.depth / 1000)}\\,\\mathrm{km}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    signSlip('The gradient is the top less the bottom: negative where θe falls with height.'),
    perMeterSlip,
    per100MetersSlip,
    slip('theta-for-theta-e', 'θ for θe', 'This is the gradient of θ: potential instability goes by θe.', (inputs, constants) => {
      const at = (end: string) => numberOf(inputs, `temperature${end}`) * pow(100_000 / numberOf(inputs, `pressure${end}`), kappaOf(constants))
      return (at('Top') - at('Bottom')) / numberOf(inputs, 'depth')
    }),
    slip('temperature', 'T for θe', 'This is the gradient of temperature.', inputs => (numberOf(inputs, 'temperatureTop') - numberOf(inputs, 'temperatureBottom')) / numberOf(inputs, 'depth')),
  ],
  example: { inputs: { pressureBottom: 95_000, temperatureBottom: 298.15, dewpointBottom: 293.15, pressureTop: 85_000, temperatureTop: 291.15, dewpointTop: 281.15, depth: 970 }, gives: -0.02062035, within: 2e-08 },
}
