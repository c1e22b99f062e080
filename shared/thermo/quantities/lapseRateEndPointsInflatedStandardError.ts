import type { Inputs, Outcome, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { endPointRate, endsOf, layerInputs } from '../layer'
import { effectiveRows, lagOneCorrelationAbout } from '../residuals'
import { fineSlip, per100MetersSlip, perMeterSlip, slip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Standard error of the lapse rate by end points, where neighboring rows have something in common.
 *
 *   s′(Γ) = s_T √(1/n₁′ + 1/n₂′) / (z₂ − z₁),   n′ = n (1 − r₁)/(1 + r₁), one at least     n rows at an end's height, r₁ about the line between the ends
 *
 * Only the means at the ends lose by correlation: a single reading at an end stays one reading. Source: JCGM 100:2008, Eq. 10; effective number of
 * rows by Wilks (2011), section 5.2.4 (from memory). See `effectiveRows`.
 *
 * @example four rows at 10 m and four at 210 m, readings of 0.1 K, r₁ 0.208: 0.437 K km⁻¹ (0.354 for independent rows)
 */
export const lapseRateEndPointsInflatedStandardErrorDefinition: QuantityDefinition = {
  key: 'lapse-rate-end-points-inflated-standard-error',
  name: 'standard error of the lapse rate by end points, inflated for correlated residuals',
  symbol: 's′(Γ)',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'ratio',
  nearZero: 0.00001,
  inputs: [
    ...layerInputs(4),
    { name: 'readingDeviation', label: 'standard deviation of one temperature reading', symbol: 's_T', unit: 'K', shownUnit: 'K', kind: 'difference', shape: 'number', range: [0, 10] },
  ],
  variants: [{
    key: 'effective-rows', label: 'effective number of rows at each end',
    source: { text: 'JCGM 100:2008, Eq. 10; Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., section 5.2.4', status: 'from memory' },
    validity: 'residuals that follow a first-order autoregression; heights without error', knownError: 'r₁ of short series is biased low, and so is this',
    evaluate(inputs): Outcome {
      const correlation = correlationOf(inputs)
      if (correlation === null) return { is: 'value', value: errorOf(inputs, 0), notes: ['The rows lie on the line; nothing is inflated.'] }
      const { lowCount, highCount } = endsOf(inputs)
      const notes = lowCount === 1 && highCount === 1 ? ['Each end is a single reading: correlation takes nothing from it.'] : undefined
      return { is: 'value', value: errorOf(inputs, correlation), notes, more: { correlation } }
    },
  }],
  constants: [],
  ask: 'The standard error of the lapse rate between the lowest and the highest of your rows, where each temperature has the given standard deviation and heights have none; the n rows at an end’s height count as n (1 − r₁)/(1 + r₁), one at least, with the lag-1 correlation r₁ of the residuals about the line between the ends, less their mean, in the order of your rows; as n where r₁ is negative.',
  trace(inputs) {
    const { lowCount, highCount } = endsOf(inputs), s = numberOf(inputs, 'readingDeviation'), correlation = correlationOf(inputs) ?? 0, value = errorOf(inputs, correlation)
    const low = effectiveRows(lowCount, correlation), high = effectiveRows(highCount, correlation), depth = depthOf(inputs)
    return [
      { text: 'Lag-1 correlation of the residuals', formula: 'r_1 = \\frac{\\sum (e_i - \\bar e)(e_{i+1} - \\bar e)}{\\sum (e_i - \\bar e)^2}', filled: `r_1 = ${texNumber(correlation)}`, value: correlation, unit: '1' },
      { text: 'Effective rows at the ends', formula: "n' = n \\frac{1 - r_1}{1 + r_1}", filled: `n'_1 = ${texNumber(low)},\\quad n'_2 = ${texNumber(high)}` },
      { text: 'Error of the lapse rate', formula: "s'_\\Gamma = \\frac{s_T}{z_2 - z_1} \\sqrt{\\frac{1}{n'_1} + \\frac{1}{n'_2}}", filled: `s'_\\Gamma = \\frac{${texQuantity(s, 'K')}}{${texQuantity(depth / 1000, 'km', 6)}} \\sqrt{\\frac{1}{${texNumber(low)}} + \\frac{1}{${texNumber(high)}}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip('not-inflated', 'not inflated', 'This is the standard error for independent rows: neighbors here have something in common.', (inputs, _c, right) => {
      const plain = errorOf(inputs, 0)
      return plain === right ? null : plain
    }),
    fineSlip('factor-of-all-rows', 'factor of a fit put on the ends', 'This multiplies by √[(1 + r₁)/(1 − r₁)], as for a fit through all rows: only the means at the ends lose by correlation.', (inputs) => {
      const correlation = correlationOf(inputs) ?? 0
      return correlation <= 0 || correlation >= 1 ? null : errorOf(inputs, 0) * Math.sqrt((1 + correlation) / (1 - correlation))
    }),
    slip('errors-added', 'errors added in place of their squares', 'This adds the errors of both readings: independent errors add by their squares.', inputs => 2 * numberOf(inputs, 'readingDeviation') / depthOf(inputs)),
  ],
  example: {
    inputs: { height: [10, 10, 10, 10, 60, 110, 160, 210, 210, 210, 210], temperature: [290.0, 290.1, 290.2, 290.1, 289.9, 289.3, 288.6, 288.2, 288.1, 288.0, 288.1], readingDeviation: 0.1 },
    gives: 0.00043673, within: 1e-8,
  },
}

const correlationOf = (inputs: Inputs): number | null => lagOneCorrelationAbout(inputs, endPointRate(endsOf(inputs)))

function depthOf(inputs: Inputs): number {
  const { lowHeight, highHeight } = endsOf(inputs)
  return highHeight - lowHeight
}

function errorOf(inputs: Inputs, correlation: number): number {
  const { lowCount, highCount } = endsOf(inputs)
  return numberOf(inputs, 'readingDeviation') * Math.sqrt(1 / effectiveRows(lowCount, correlation) + 1 / effectiveRows(highCount, correlation)) / depthOf(inputs)
}
