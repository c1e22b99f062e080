import { constant } from '../constants'
import type { Constants, InputDefinition, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { gradientRichardson } from '../richardson'
import { signSlip, slip, zeroCelsius } from '../slips'
import { texFactor, texNumber } from '../tex'

const shear = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 's-1', shownUnit: 's-1', kind: 'difference', shape: 'number', range: [-10, 10] })

/** Gradient Richardson number: see `gradientRichardson`. "Not defined" without shear. */
export const gradientRichardsonNumberDefinition: QuantityDefinition = {
  key: 'gradient-richardson-number',
  name: 'gradient Richardson number',
  symbol: 'Ri',
  unit: '1',
  shownUnit: '1',
  kind: 'difference',
  nearZero: 0.01,
  inputs: [
    { name: 'virtualPotentialTemperature', label: 'virtual potential temperature', symbol: 'θv', unit: 'K', shownUnit: 'K', kind: 'temperature', shape: 'number', range: [150, 800] },
    { name: 'virtualPotentialTemperatureGradient', label: 'vertical gradient of the virtual potential temperature', symbol: 'dθv/dz', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [-1, 1] },
    shear('eastwardShear', 'vertical gradient of the eastward wind', 'du/dz'),
    shear('northwardShear', 'vertical gradient of the northward wind', 'dv/dz'),
  ],
  variants: [{
    key: 'gradients', label: 'local gradients',
    source: { text: 'AMS Glossary of Meteorology, "gradient Richardson number"', status: 'verified' },
    validity: 'any height with shear', knownError: 'none beyond that of the gradients',
    evaluate(inputs, constants) {
      const value = number(inputs, constants)
      return value === null ? { is: 'not_defined', why: 'The wind does not change with height: there is no shear.' } : { is: 'value', value }
    },
  }],
  constants: ['g'],
  classLimits: () => [{ label: 'critical, 0.25', value: 0.25 }],
  ask: 'The gradient Richardson number Ri = (g/θv)(dθv/dz) / [(du/dz)² + (dv/dz)²]; "not defined" without shear.',
  trace(inputs, constants) {
    const { theta, gradient, du, dv } = given(inputs), value = number(inputs, constants)
    const first = { text: 'Shear squared', formula: 'S^2 = \\left(\\frac{du}{dz}\\right)^2 + \\left(\\frac{dv}{dz}\\right)^2', filled: `S^2 = ${texFactor(du)}^2 + ${texFactor(dv)}^2 = ${texNumber(du * du + dv * dv)}\\,\\mathrm{s^{-2}}` }
    if (value === null) return [first]
    return [first, { text: 'Richardson number', formula: 'Ri = \\frac{g}{\\theta_v} \\frac{d\\theta_v/dz}{S^2}', filled: `Ri = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber(theta, 6)}} \\times \\frac{${texFactor(gradient)}}{${texNumber(du * du + dv * dv)}} = ${texNumber(value)}`, value, unit: '1' }]
  },
  slips: [
    signSlip('The number is positive where θv rises with height.'),
    slip('shear-not-squared', 'square of the shear left out', 'The shear has to be squared.', (inputs, _c, right) => {
      const { du, dv } = given(inputs)
      return right * Math.sqrt(du * du + dv * dv)
    }),
    slip('per-kilometer', 'K km⁻¹ in place of K m⁻¹', 'The gradient went in in K per kilometer: per meter is needed.', (_i, _c, right) => right * 1000),
    slip('celsius-for-kelvin', '°C in place of K', 'θv went in in degrees Celsius: it has to be in kelvin.', (inputs, _c, right) => {
      const { theta } = given(inputs)
      return theta === zeroCelsius ? null : right * theta / (theta - zeroCelsius)
    }),
    slip('inverted', 'shear over stratification', 'This is the reciprocal: stratification stands above shear.', (_i, _c, right) => (right === 0 ? null : 1 / right)),
    slip('gravity-left-out', 'g left out', 'The acceleration of gravity is left out.', (_i, constants, right) => right / constant(constants, 'g')),
  ],
  example: { inputs: { virtualPotentialTemperature: 300, virtualPotentialTemperatureGradient: 0.005, eastwardShear: 0.02, northwardShear: 0.01 }, gives: 0.327, within: 1e-6 },
}

const given = (inputs: Inputs) => ({ theta: numberOf(inputs, 'virtualPotentialTemperature'), gradient: numberOf(inputs, 'virtualPotentialTemperatureGradient'), du: numberOf(inputs, 'eastwardShear'), dv: numberOf(inputs, 'northwardShear') })

const number = (inputs: Inputs, constants: Constants): number | null => gradientRichardson(given(inputs), constants)
