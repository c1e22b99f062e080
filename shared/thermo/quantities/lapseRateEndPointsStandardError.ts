import type { Inputs, QuantityDefinition } from '../definition'
import { endsOf, layerInputs } from '../layer'
import { numberOf } from '../inputs'
import { fineSlip, per100MetersSlip, perMeterSlip, slip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Standard error of the lapse rate by end points, from the scatter of one reading.
 *
 *   s(Γ) = s_T √(1/n₁ + 1/n₂) / (z₂ − z₁)     n₁, n₂ rows at the lowest and the highest height
 *
 * Source: propagation of independent errors, JCGM 100:2008, Eq. 10. Heights are taken as free of error; an error that both readings share cancels.
 *
 * @example readings of 0.1 K at 20 m and 220 m: 0.707 K km⁻¹
 */
export const lapseRateEndPointsStandardErrorDefinition: QuantityDefinition = {
  key: 'lapse-rate-end-points-standard-error',
  name: 'standard error of the lapse rate by end points',
  symbol: 's(Γ)',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'ratio',
  nearZero: 0.00001,
  inputs: [
    ...layerInputs(2),
    { name: 'readingDeviation', label: 'standard deviation of one temperature reading, independent from row to row', symbol: 's_T', unit: 'K', shownUnit: 'K', kind: 'difference', shape: 'number', range: [0, 10] },
  ],
  variants: [{
    key: 'independent', label: 'independent errors of the readings',
    source: { text: 'JCGM 100:2008, Eq. 10', status: 'verified' },
    validity: 'independent errors; heights without error', knownError: 'none: the formula is exact for independent errors',
    evaluate: inputs => ({ is: 'value', value: errorOf(inputs) }),
  }],
  constants: [],
  ask: 'The standard error of the lapse rate between the lowest and the highest of your rows, where each temperature has the given standard deviation, independent from row to row, and heights have none.',
  trace(inputs) {
    const ends = endsOf(inputs), s = numberOf(inputs, 'readingDeviation'), value = errorOf(inputs)
    const depth = ends.highHeight - ends.lowHeight
    const share = Math.sqrt(1 / ends.lowCount + 1 / ends.highCount)
    return [
      { text: 'Error of the difference of temperature', formula: 's_{\\Delta T} = s_T \\sqrt{\\frac{1}{n_1} + \\frac{1}{n_2}}', filled: `s_{\\Delta T} = ${texNumber(s)} \\sqrt{\\frac{1}{${ends.lowCount}} + \\frac{1}{${ends.highCount}}}\\,\\mathrm{K} = ${texQuantity(s * share, 'K')}`, value: s * share, unit: 'K' },
      { text: 'Error of the lapse rate', formula: 's_\\Gamma = \\frac{s_{\\Delta T}}{z_2 - z_1}', filled: `s_\\Gamma = \\frac{${texQuantity(s * share, 'K')}}{${texQuantity(depth / 1000, 'km', 6)}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    slip('one-reading', 'error of one reading alone', 'This divides the error of one reading by the depth: the difference has two readings, whose squares add up.', inputs => numberOf(inputs, 'readingDeviation') / depthOf(inputs)),
    slip('errors-added', 'errors added in place of their squares', 'This adds the errors of both readings: independent errors add by their squares.', inputs => 2 * numberOf(inputs, 'readingDeviation') / depthOf(inputs)),
    fineSlip('variance', 'root left out', 'This leaves out the square root.', (inputs) => {
      const s = numberOf(inputs, 'readingDeviation'), { lowCount, highCount } = endsOf(inputs)
      return s * s * (1 / lowCount + 1 / highCount) / depthOf(inputs)
    }),
  ],
  example: { inputs: { height: [20, 220], temperature: [291.15, 289.35], readingDeviation: 0.1 }, gives: 0.000707107, within: 1e-9 },
}

function depthOf(inputs: Inputs): number {
  const { lowHeight, highHeight } = endsOf(inputs)
  return highHeight - lowHeight
}

function errorOf(inputs: Inputs): number {
  const { lowCount, highCount } = endsOf(inputs)
  return numberOf(inputs, 'readingDeviation') * Math.sqrt(1 / lowCount + 1 / highCount) / depthOf(inputs)
}
