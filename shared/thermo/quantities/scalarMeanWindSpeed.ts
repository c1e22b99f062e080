import { mean } from '../../numerics/regression'
import type { QuantityDefinition } from '../definition'
import { seriesOf } from '../inputs'
import { fineSlip } from '../slips'
import { texNumber, texQuantity } from '../tex'
import { vectorMean, windDirectionSeries, windSpeedSeries } from '../wind'

/**
 * Scalar mean of wind speeds.
 *
 *   s̄ = Σ s / n     calm rows count with 0
 *
 * Source: WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 5. Never less than the vector mean.
 *
 * @example 5 m/s from 0° and 5 m/s from 90°: 5.00 m/s (the vector mean is 3.54)
 */
export const scalarMeanWindSpeedDefinition: QuantityDefinition = {
  key: 'scalar-mean-wind-speed',
  name: 'scalar mean wind speed',
  symbol: 's̄',
  unit: 'm/s',
  shownUnit: 'm/s',
  kind: 'ratio',
  nearZero: 0.1,
  inputs: [windSpeedSeries, { ...windDirectionSeries, isOptional: true, isForSlips: true }],
  variants: [{
    key: 'scalar', label: 'mean of the speeds',
    source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 5', status: 'common practice' },
    validity: 'any rows', knownError: 'none: the rows alone decide',
    evaluate: inputs => ({ is: 'value', value: mean(seriesOf(inputs, 'windSpeed')) }),
  }],
  constants: [],
  ask: 'The scalar mean of the wind speeds of your rows, whatever their directions; calm rows count with 0.',
  trace(inputs) {
    const speeds = seriesOf(inputs, 'windSpeed'), value = mean(speeds)
    return [{ text: 'Mean of the speeds', formula: '\\bar s = \\frac{\\sum s}{n}', filled: `\\bar s = \\frac{${texNumber(value * speeds.length)}}{${speeds.length}}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value, 'm/s')}`, value, unit: 'm/s' }]
  },
  slips: [
    fineSlip('vector-mean', 'vector mean in place of the scalar one', 'This is the size of the mean vector: the ask takes the mean of the speeds.', inputs => ('windDirection' in inputs ? vectorMean(inputs).speed : null)),
    fineSlip('root-mean-square', 'root of the mean square', 'This is the root of the mean square.', (inputs) => {
      const speeds = seriesOf(inputs, 'windSpeed')
      return Math.sqrt(mean(speeds.map(speed => speed * speed)))
    }),
    fineSlip('calms-left-out', 'calm rows left out', 'Calm rows are left out: they count with 0.', (inputs) => {
      const blowing = seriesOf(inputs, 'windSpeed').filter(speed => speed > 0)
      return blowing.length > 0 ? mean(blowing) : null
    }),
  ],
  example: { inputs: { windSpeed: [5, 5], windDirection: [6.283185307179586, 1.5707963267948966] }, gives: 5, within: 1e-12 },
}
