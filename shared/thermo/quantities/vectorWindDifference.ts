import type { Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { directionInput, speedInput, windDifference } from '../richardson'
import { slip } from '../slips'
import { texFactor, texQuantity } from '../tex'

/**
 * Size of the difference of two wind vectors.
 *
 *   |ΔV| = √[(u₂ − u₁)² + (v₂ − v₁)²],   u = −s sin d, v = −s cos d
 *
 * Source: AMS Glossary of Meteorology, "wind shear", "wind direction". A turning wind differs even where its speed does not.
 *
 * @example 5 m/s from 200° and 5 m/s from 260°: 5.0 m/s
 */
export const vectorWindDifferenceDefinition: QuantityDefinition = {
  key: 'vector-wind-difference',
  name: 'vector difference of two winds',
  symbol: '|ΔV|',
  unit: 'm/s',
  shownUnit: 'm/s',
  kind: 'difference',
  nearZero: 0.1,
  inputs: [
    speedInput('windSpeedBottom', 'wind speed at the bottom', 's₁'), directionInput('windDirectionBottom', 'wind direction at the bottom', 'd₁'),
    speedInput('windSpeedTop', 'wind speed at the top', 's₂'), directionInput('windDirectionTop', 'wind direction at the top', 'd₂'),
  ],
  variants: [{
    key: 'vectors', label: 'difference of components',
    source: { text: 'AMS Glossary of Meteorology, "wind shear"', status: 'common practice' },
    validity: 'any two winds', knownError: 'none: the four readings alone decide',
    evaluate: inputs => ({ is: 'value', value: size(inputs) }),
  }],
  constants: [],
  ask: 'The size |ΔV| of the difference of the two wind vectors.',
  trace(inputs) {
    const { du, dv } = windDifference(inputs), value = size(inputs)
    return [
      { text: 'Differences of the components, u = −s sin d, v = −s cos d', formula: '\\Delta u,\\ \\Delta v', filled: `\\Delta u = ${texQuantity(du, 'm/s')},\\quad \\Delta v = ${texQuantity(dv, 'm/s')}` },
      { text: 'Size of the difference', formula: '|\\Delta V| = \\sqrt{\\Delta u^2 + \\Delta v^2}', filled: `|\\Delta V| = \\sqrt{${texFactor(du)}^2 + ${texFactor(dv)}^2}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value, 'm/s')}`, value, unit: 'm/s' },
    ]
  },
  slips: [
    slip('speeds-subtracted', 'difference of speeds for that of vectors', 'This is the difference of the speeds: a turning wind differs too.', inputs => Math.abs(numberOf(inputs, 'windSpeedTop') - numberOf(inputs, 'windSpeedBottom'))),
    slip('vectors-added', 'sum in place of the difference', 'This adds the vectors in place of subtracting them.', (inputs) => {
      const s1 = numberOf(inputs, 'windSpeedBottom'), s2 = numberOf(inputs, 'windSpeedTop')
      const difference = size(inputs)
      return Math.sqrt(Math.max(0, 2 * (s1 * s1 + s2 * s2) - difference * difference))
    }),
    slip('root-left-out', 'root left out', 'This is the square of the difference: take its root.', (_i, _c, right) => right * right),
    slip('components-added', 'sizes of components added', 'This adds the sizes of both components: add their squares and take the root.', (inputs) => {
      const { du, dv } = windDifference(inputs)
      return Math.abs(du) + Math.abs(dv)
    }),
  ],
  example: { inputs: { windSpeedBottom: 5, windDirectionBottom: 3.490658503988659, windSpeedTop: 5, windDirectionTop: 4.537856055185257 }, gives: 5, within: 1e-9 },
}

function size(inputs: Inputs): number {
  const { du, dv } = windDifference(inputs)
  return Math.sqrt(du * du + dv * dv)
}
