import { constant } from '../constants'
import type { Constants, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { bulkRichardson, directionInput, speedInput, virtualThetaLayer, windDifference } from '../richardson'
import { signSlip, slip, zeroCelsius } from '../slips'
import { texFactor, texNumber } from '../tex'

/** Bulk Richardson number of a layer from speed and direction at bottom and top: the wind's difference is that of vectors. See `bulkRichardson`. */
export const bulkRichardsonNumberFromWindsDefinition: QuantityDefinition = {
  key: 'bulk-richardson-number-from-winds',
  name: 'bulk Richardson number from speed and direction',
  symbol: 'Ri_B',
  unit: '1',
  shownUnit: '1',
  kind: 'difference',
  nearZero: 0.01,
  inputs: [
    ...virtualThetaLayer,
    speedInput('windSpeedBottom', 'wind speed at the bottom', 's₁'), directionInput('windDirectionBottom', 'wind direction at the bottom', 'd₁'),
    speedInput('windSpeedTop', 'wind speed at the top', 's₂'), directionInput('windDirectionTop', 'wind direction at the top', 'd₂'),
  ],
  variants: [{
    key: 'mean-theta', label: 'with the mean of θv at bottom and top',
    source: { text: 'AMS Glossary of Meteorology, "bulk Richardson number"', status: 'verified' },
    validity: 'any layer with shear', knownError: 'none: the readings alone decide',
    evaluate(inputs, constants) {
      const value = number(inputs, constants)
      return value === null ? { is: 'not_defined', why: 'The wind vector is the same at bottom and top: there is no shear.' } : { is: 'value', value }
    },
  }],
  constants: ['g'],
  classLimits: () => [{ label: 'critical, 0.25', value: 0.25 }],
  ask: 'The bulk Richardson number Ri = (g/θ̄v) Δθv Δz / |ΔV|² of the layer, with the mean θ̄v of bottom and top and the difference of the wind vectors; "not defined" where they are alike.',
  trace(inputs, constants) {
    const { du, dv } = windDifference(inputs), value = number(inputs, constants)
    const { bottom, top, depth } = layer(inputs)
    const shear = { text: 'Difference of the wind vectors, u = −s sin d, v = −s cos d', formula: '|\\Delta V|^2 = (u_2 - u_1)^2 + (v_2 - v_1)^2', filled: `|\\Delta V|^2 = ${texFactor(du)}^2 + ${texFactor(dv)}^2 = ${texNumber(du * du + dv * dv)}\\,\\mathrm{m^2\\,s^{-2}}` }
    if (value === null) return [shear]
    return [shear, { text: 'Bulk Richardson number', formula: 'Ri_B = \\frac{g}{\\bar\\theta_v} \\frac{\\Delta\\theta_v\\,\\Delta z}{|\\Delta V|^2}', filled: `Ri_B = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber((bottom + top) / 2, 6)}} \\times \\frac{${texFactor(top - bottom)} \\times ${texNumber(depth, 6)}}{${texNumber(du * du + dv * dv)}} = ${texNumber(value)}`, value, unit: '1' }]
  },
  slips: [
    signSlip('The number is positive where θv rises with height.'),
    slip('speeds-subtracted', 'difference of speeds for that of vectors', 'This takes the difference of the speeds: a turning wind shears too.', (inputs, constants) => bulkRichardson({ ...layer(inputs), du: numberOf(inputs, 'windSpeedTop') - numberOf(inputs, 'windSpeedBottom'), dv: 0 }, constants)),
    slip('speed-not-squared', 'square of the wind difference left out', 'The wind difference has to be squared.', (inputs, _c, right) => {
      const { du, dv } = windDifference(inputs)
      return right * Math.sqrt(du * du + dv * dv)
    }),
    slip('depth-left-out', 'Δz left out', 'The depth of the layer is left out.', (inputs, _c, right) => right / layer(inputs).depth),
    slip('celsius-for-kelvin', '°C in place of K', 'The mean θv went in in degrees Celsius: it has to be in kelvin.', (inputs, _c, right) => {
      const mean = (layer(inputs).bottom + layer(inputs).top) / 2
      return mean === zeroCelsius ? null : right * mean / (mean - zeroCelsius)
    }),
    slip('inverted', 'shear over stratification', 'This is the reciprocal: stratification stands above shear.', (_i, _c, right) => (right === 0 ? null : 1 / right)),
    slip('gravity-left-out', 'g left out', 'The acceleration of gravity is left out.', (_i, constants, right) => right / constant(constants, 'g')),
  ],
  example: { inputs: { virtualPotentialTemperatureBottom: 298, virtualPotentialTemperatureTop: 299.2, depth: 100, windSpeedBottom: 5, windDirectionBottom: 3.490658503988659, windSpeedTop: 5, windDirectionTop: 4.537856055185257 }, gives: 0.15769, within: 0.00001 },
}

const layer = (inputs: Inputs) => ({ bottom: numberOf(inputs, 'virtualPotentialTemperatureBottom'), top: numberOf(inputs, 'virtualPotentialTemperatureTop'), depth: numberOf(inputs, 'depth') })

const number = (inputs: Inputs, constants: Constants): number | null => bulkRichardson({ ...layer(inputs), ...windDifference(inputs) }, constants)
