import type { QuantityDefinition } from '../definition'
import { heightsOf, layerInputs, lineOf, temperaturesOf } from '../layer'
import { lagOneCorrelation } from '../residuals'
import { fineSlip, signSlip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/** Lag-1 correlation of the residuals of a least-squares lapse rate: see `lagOneCorrelation`. "Not defined" where the rows lie on their line. */
export const lapseRateLagOneCorrelationDefinition: QuantityDefinition = {
  key: 'lapse-rate-lag-one-correlation',
  name: 'lag-1 correlation of the residuals of a lapse rate',
  symbol: 'r₁',
  unit: '1',
  shownUnit: '1',
  kind: 'difference',
  nearZero: 0.1,
  inputs: layerInputs(4),
  variants: [{
    key: 'residuals', label: 'residuals of the least-squares line in the order of the rows',
    source: { text: 'Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., Eq. 3.32', status: 'from memory' },
    validity: 'rows at even steps of time or height', knownError: 'biased low by about 4/n for short series',
    evaluate(inputs) {
      const value = lagOneCorrelation(inputs)
      return value === null ? { is: 'not_defined', why: 'The rows lie on their line: there are no residuals to correlate.' } : { is: 'value', value }
    },
  }],
  constants: [],
  ask: 'The lag-1 correlation r₁ = Σ eᵢeᵢ₊₁ / Σ eᵢ² of the residuals e of temperature about its least-squares line on height, in the order of your rows. "Not defined" where the rows lie on the line.',
  trace(inputs) {
    const line = lineOf(inputs), value = lagOneCorrelation(inputs)
    const scatter = { text: 'Residuals about the line', formula: 'e_i = T_i - \\hat T_i', filled: `s = ${texQuantity(line.residualDeviation ?? 0, 'K')},\\quad n = ${line.count}` }
    return value === null
      ? [scatter]
      : [scatter, { text: 'Correlation of neighbors', formula: 'r_1 = \\frac{\\sum e_i e_{i+1}}{\\sum e_i^2}', filled: `r_1 = ${texNumber(value)}`, value, unit: '1' }]
  },
  slips: [
    signSlip('The sign is turned round: neighbors that lie on one side of the line correlate positively.'),
    fineSlip('of-temperature', 'correlation of T in place of the residuals', 'This is the lag-1 correlation of the temperatures: take the line off first.', (inputs) => {
      const T = temperaturesOf(inputs), { meanY, sumYY } = lineOf(inputs)
      let products = 0
      for (let at = 1; at < T.length; at++) products += ((T[at] ?? 0) - meanY) * ((T[at - 1] ?? 0) - meanY)
      return sumYY > 0 ? products / sumYY : null
    }),
    fineSlip('mean-of-products', 'sums divided by their counts', 'This divides the sum of n − 1 products by n − 1 and the sum of n squares by n: the ask divides the sums.', (inputs, _c, right) => right * heightsOf(inputs).length / (heightsOf(inputs).length - 1)),
  ],
  example: { inputs: { height: [0, 1, 2, 3], temperature: [280, 281, 280, 281] }, gives: -0.75, within: 1e-9 },
}
