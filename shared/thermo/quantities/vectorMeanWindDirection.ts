import { mean } from '../../numerics/regression'
import type { Inputs, QuantityDefinition } from '../definition'
import { seriesOf } from '../inputs'
import { fineSlip } from '../slips'
import { texFactor, texNumber } from '../tex'
import { directionOf, fullTurn, meanDirection, perDegree, vectorMean, windDirectionSeries, windSpeedSeries } from '../wind'

/** Direction of the mean wind vector: see `vectorMean`, `directionOf`. "Not defined" where the winds cancel. */
export const vectorMeanWindDirectionDefinition: QuantityDefinition = {
  key: 'vector-mean-wind-direction',
  name: 'direction of the vector mean wind',
  symbol: 'd_V',
  unit: 'rad',
  shownUnit: 'deg',
  kind: 'difference',
  isDirection: true,
  nearZero: 1.75,
  inputs: [windSpeedSeries, windDirectionSeries],
  variants: [{
    key: 'vectors', label: 'mean of the components',
    source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 5', status: 'common practice' },
    validity: 'winds that do not cancel', knownError: 'none: the rows alone decide',
    evaluate(inputs) {
      const value = direction(inputs)
      return value === null ? { is: 'not_defined', why: 'The winds cancel: the mean vector has no direction.' } : { is: 'value', value }
    },
  }],
  constants: [],
  ask: 'The direction from which the mean wind vector of your rows comes, clockwise from north, which is 360°; "not defined" where the winds cancel.',
  trace(inputs) {
    const { u, v } = vectorMean(inputs), value = direction(inputs)
    const first = { text: 'Mean components', formula: '\\bar u = -\\overline{s \\sin d},\\quad \\bar v = -\\overline{s \\cos d}', filled: `\\bar u = ${texNumber(u)},\\quad \\bar v = ${texNumber(v)}\\,\\mathrm{m\\,s^{-1}}` }
    if (value === null) return [first]
    return [first, { text: 'Where it comes from', formula: 'd = \\mathrm{atan2}(-\\bar u, -\\bar v)', filled: `d = \\mathrm{atan2}(${texFactor(-u)}, ${texFactor(-v)}) = ${texNumber(value / perDegree)}^{\\circ}`, value, unit: 'rad' }]
  },
  slips: [
    fineSlip('plain-mean', 'plain mean of the angles', 'This is the plain mean of the angles: directions are averaged by their vectors.', inputs => mean(seriesOf(inputs, 'windDirection'))),
    fineSlip('unit-vectors', 'speeds left out', 'This gives every row the same weight: the vector mean weighs by speed.', inputs => meanDirection(inputs).direction),
    fineSlip('opposite', 'direction that it blows to', 'This is where the wind blows to: a direction is where it comes from.', (_i, _c, right) => (right > fullTurn / 2 ? right - fullTurn / 2 : right + fullTurn / 2)),
    fineSlip('swapped-arguments', 'arguments of the arctangent swapped', 'The arguments of the arctangent are swapped.', (inputs) => {
      const { u, v, speed } = vectorMean(inputs)
      return directionOf(v, u, speed)
    }),
  ],
  example: { inputs: { windSpeed: [5, 5], windDirection: [6.283185307179586, 1.5707963267948966] }, gives: 0.7853981634, within: 1e-9 },
}

function direction(inputs: Inputs): number | null {
  const { u, v } = vectorMean(inputs)
  return directionOf(u, v, mean(seriesOf(inputs, 'windSpeed')))
}
