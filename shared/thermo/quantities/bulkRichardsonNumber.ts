import { constant } from '../constants'
import type { InputDefinition, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { bulkRichardson, virtualThetaLayer } from '../richardson'
import { fineSlip, signSlip, slip, zeroCelsius } from '../slips'
import { texFactor, texNumber } from '../tex'

const difference = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 'm/s', shownUnit: 'm/s', kind: 'difference', shape: 'number', range: [-200, 200] })

/** Bulk Richardson number of a layer from differences of the wind's components: see `bulkRichardson`. "Not defined" without shear. */
export const bulkRichardsonNumberDefinition: QuantityDefinition = {
  key: 'bulk-richardson-number',
  name: 'bulk Richardson number',
  symbol: 'Ri_B',
  unit: '1',
  shownUnit: '1',
  kind: 'difference',
  nearZero: 0.01,
  inputs: [
    ...virtualThetaLayer,
    difference('eastwardDifference', 'difference of the eastward wind, top less bottom', 'Δu'),
    difference('northwardDifference', 'difference of the northward wind, top less bottom', 'Δv'),
  ],
  variants: [{
    key: 'mean-theta', label: 'with the mean of θv at bottom and top',
    source: { text: 'AMS Glossary of Meteorology, "bulk Richardson number"', status: 'verified' },
    validity: 'any layer with shear', knownError: 'none: the four readings alone decide',
    evaluate(inputs, constants) {
      const value = bulkRichardson(layer(inputs), constants)
      return value === null ? { is: 'not_defined', why: 'The wind is the same at bottom and top: there is no shear.' } : { is: 'value', value }
    },
  }],
  constants: ['g'],
  classLimits: () => [{ label: 'critical, 0.25', value: 0.25 }],
  ask: 'The bulk Richardson number Ri = (g/θ̄v) Δθv Δz / (Δu² + Δv²) of the layer, with the mean θ̄v of bottom and top and the vector difference of the wind; "not defined" without shear.',
  trace(inputs, constants) {
    const { bottom, top, depth, du, dv } = layer(inputs), value = bulkRichardson(layer(inputs), constants)
    const shear = { text: 'Vector difference of the wind, squared', formula: '|\\Delta V|^2 = \\Delta u^2 + \\Delta v^2', filled: `|\\Delta V|^2 = ${texFactor(du)}^2 + ${texFactor(dv)}^2 = ${texNumber(du * du + dv * dv)}\\,\\mathrm{m^2\\,s^{-2}}` }
    if (value === null) return [shear]
    return [shear, { text: 'Bulk Richardson number', formula: 'Ri_B = \\frac{g}{\\bar\\theta_v} \\frac{\\Delta\\theta_v\\,\\Delta z}{|\\Delta V|^2}', filled: `Ri_B = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber((bottom + top) / 2, 6)}} \\times \\frac{${texFactor(top - bottom)} \\times ${texNumber(depth, 6)}}{${texNumber(du * du + dv * dv)}} = ${texNumber(value)}`, value, unit: '1' }]
  },
  slips: [
    signSlip('The number is positive where θv rises with height.'),
    slip('speeds-not-squared', 'square of the wind difference left out', 'The wind difference has to be squared.', (inputs, _c, right) => {
      const { du, dv } = layer(inputs)
      return right * Math.sqrt(du * du + dv * dv)
    }),
    slip('components-added', 'components added before squaring', 'The components are added and then squared: square each, then add.', (inputs, _c, right) => {
      const { du, dv } = layer(inputs)
      return du + dv === 0 ? null : right * (du * du + dv * dv) / ((du + dv) * (du + dv))
    }),
    slip('depth-left-out', 'Δz left out', 'The depth of the layer is left out.', (inputs, _c, right) => right / layer(inputs).depth),
    slip('celsius-for-kelvin', '°C in place of K', 'The mean θv went in in degrees Celsius: it has to be in kelvin.', (inputs, _c, right) => {
      const mean = (layer(inputs).bottom + layer(inputs).top) / 2
      return mean === zeroCelsius ? null : right * mean / (mean - zeroCelsius)
    }),
    slip('inverted', 'shear over stratification', 'This is the reciprocal: stratification stands above shear.', (_i, _c, right) => (right === 0 ? null : 1 / right)),
    slip('gravity-left-out', 'g left out', 'The acceleration of gravity is left out.', (_i, constants, right) => right / constant(constants, 'g')),
    fineSlip('bottom-theta', 'θv at the bottom for the mean', 'This divides by θv at the bottom: the ask takes the mean of the layer.', (inputs, _c, right) => right * (layer(inputs).bottom + layer(inputs).top) / 2 / layer(inputs).bottom),
  ],
  example: { inputs: { virtualPotentialTemperatureBottom: 298, virtualPotentialTemperatureTop: 299.2, depth: 100, eastwardDifference: 4, northwardDifference: 1 }, gives: 0.23190, within: 0.00001 },
}

const layer = (inputs: Inputs) => ({
  bottom: numberOf(inputs, 'virtualPotentialTemperatureBottom'), top: numberOf(inputs, 'virtualPotentialTemperatureTop'), depth: numberOf(inputs, 'depth'),
  du: numberOf(inputs, 'eastwardDifference'), dv: numberOf(inputs, 'northwardDifference'),
})
