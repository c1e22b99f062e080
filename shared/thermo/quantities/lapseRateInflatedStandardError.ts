import type { Inputs, QuantityDefinition } from '../definition'
import { layerInputs, lineOf } from '../layer'
import { inflation, lagOneCorrelation } from '../residuals'
import { fineSlip, per100MetersSlip, perMeterSlip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Standard error of a least-squares lapse rate, inflated for correlated residuals.
 *
 *   s′(Γ) = s(Γ) √[(1 + r₁)/(1 − r₁)]     r₁ the lag-1 correlation of the residuals; the factor is 1 where r₁ is negative
 *
 * Source: Wilks (2011), section 5.2.4 (from memory): the effective number of rows is n(1 − r₁)/(1 + r₁). See `inflation`.
 *
 * @example z 0 … 70 m every 10 m, T 290.0, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3 K: r₁ 0.245, 4.87 K km⁻¹
 */
export const lapseRateInflatedStandardErrorDefinition: QuantityDefinition = {
  key: 'lapse-rate-inflated-standard-error',
  name: 'standard error of the lapse rate by least squares, inflated for correlated residuals',
  symbol: 's′(Γ)',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'ratio',
  nearZero: 0.00001,
  inputs: layerInputs(4),
  variants: [{
    key: 'first-order', label: 'effective number of rows of a first-order autoregression',
    source: { text: 'Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., section 5.2.4', status: 'from memory' },
    validity: 'rows at even steps whose residuals follow a first-order autoregression', knownError: 'r₁ of short series is biased low, and so is this',
    evaluate(inputs) {
      const line = lineOf(inputs), correlation = lagOneCorrelation(inputs)
      if (correlation === null) return { is: 'value', value: line.slopeError ?? 0, notes: ['The rows lie on their line; nothing is inflated.'] }
      const factor = inflation(correlation)
      if (factor === null) return { is: 'not_defined', why: 'The residuals correlate fully: no error follows.' }
      return { is: 'value', value: (line.slopeError ?? 0) * factor, more: { correlation, factor } }
    },
  }],
  constants: [],
  ask: 'The standard error of the least-squares lapse rate of your rows (n − 2 degrees of freedom), times √[(1 + r₁)/(1 − r₁)] with the lag-1 correlation r₁ of the residuals in the order of your rows; the factor is 1 where r₁ is negative.',
  trace(inputs) {
    const error = lineOf(inputs).slopeError ?? 0, correlation = lagOneCorrelation(inputs) ?? 0, factor = inflation(correlation) ?? 1
    const value = error * factor
    return [
      { text: 'Standard error for independent rows', formula: 's_\\Gamma', filled: `s_\\Gamma = ${texQuantity(error * 1000, 'K/km')}`, value: error, unit: 'K/m' },
      { text: 'Lag-1 correlation of the residuals', formula: 'r_1 = \\frac{\\sum e_i e_{i+1}}{\\sum e_i^2}', filled: `r_1 = ${texNumber(correlation)}`, value: correlation, unit: '1' },
      { text: 'Inflated', formula: "s'_\\Gamma = s_\\Gamma \\sqrt{\\frac{1 + r_1}{1 - r_1}}", filled: `s'_\\Gamma = ${texNumber(error * 1000)} \\times ${texNumber(factor)}\\,\\mathrm{K\\,km^{-1}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip('not-inflated', 'not inflated', 'This is the standard error for independent rows: neighbors here have much in common.', inputs => lineOf(inputs).slopeError),
    fineSlip('root-left-out', 'root left out', 'This multiplies by (1 + r₁)/(1 − r₁) without its root.', (inputs, _c, right) => right * (factorOf(inputs) ?? 1)),
    fineSlip('inverted-factor', 'factor turned over', 'This divides by the factor: correlated rows tell less, and the error grows.', (inputs) => {
      const factor = factorOf(inputs)
      return factor === null ? null : (lineOf(inputs).slopeError ?? 0) / factor
    }),
  ],
  example: { inputs: { height: [0, 10, 20, 30, 40, 50, 60, 70], temperature: [290.0, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3] }, gives: 0.0048656, within: 1e-7 },
}

function factorOf(inputs: Inputs): number | null {
  const correlation = lagOneCorrelation(inputs)
  return correlation === null ? null : inflation(correlation)
}
