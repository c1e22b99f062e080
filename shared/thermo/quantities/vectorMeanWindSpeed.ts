import { mean } from '../../numerics/regression'
import type { QuantityDefinition } from '../definition'
import { seriesOf } from '../inputs'
import { fineSlip } from '../slips'
import { texFactor, texQuantity } from '../tex'
import { vectorMean, windDirectionSeries, windSpeedSeries } from '../wind'

/** Speed of the mean wind vector: see `vectorMean`. */
export const vectorMeanWindSpeedDefinition: QuantityDefinition = {
  key: 'vector-mean-wind-speed',
  name: 'speed of the vector mean wind',
  symbol: 'V̄',
  unit: 'm/s',
  shownUnit: 'm/s',
  kind: 'ratio',
  nearZero: 0.1,
  inputs: [windSpeedSeries, windDirectionSeries],
  variants: [{
    key: 'vectors', label: 'mean of the components',
    source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 5', status: 'common practice' },
    validity: 'any rows', knownError: 'none: the rows alone decide',
    evaluate: inputs => ({ is: 'value', value: vectorMean(inputs).speed }),
  }],
  constants: [],
  ask: 'The speed of the mean wind vector of your rows: the means of the components u = −s sin d and v = −s cos d, and the size of the vector that they make.',
  trace(inputs) {
    const { u, v, speed } = vectorMean(inputs)
    return [
      { text: 'Mean components', formula: '\\bar u = -\\overline{s \\sin d},\\quad \\bar v = -\\overline{s \\cos d}', filled: `\\bar u = ${texQuantity(u, 'm/s')},\\quad \\bar v = ${texQuantity(v, 'm/s')}` },
      { text: 'Size of the mean vector', formula: '\\bar V = \\sqrt{\\bar u^2 + \\bar v^2}', filled: `\\bar V = \\sqrt{${texFactor(u)}^2 + ${texFactor(v)}^2}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(speed, 'm/s')}`, value: speed, unit: 'm/s' },
    ]
  },
  slips: [
    fineSlip('scalar-mean', 'scalar mean in place of the vector one', 'This is the mean of the speeds: winds from different directions partly cancel.', inputs => mean(seriesOf(inputs, 'windSpeed'))),
    fineSlip('components-added', 'sizes of components added', 'This adds the sizes of both mean components: add their squares and take the root.', (inputs) => {
      const { u, v } = vectorMean(inputs)
      return Math.abs(u) + Math.abs(v)
    }),
    fineSlip('sum-for-mean', 'sum in place of the mean', 'This is the size of the sum of the vectors: divide by their number.', (inputs, _c, right) => right * seriesOf(inputs, 'windSpeed').length),
  ],
  example: { inputs: { windSpeed: [5, 5], windDirection: [6.283185307179586, 1.5707963267948966] }, gives: 3.5355339, within: 1e-7 },
}
