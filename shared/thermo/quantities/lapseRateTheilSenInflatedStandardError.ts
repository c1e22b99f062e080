import type { Inputs, Outcome, QuantityDefinition } from '../definition'
import { layerInputs } from '../layer'
import { inflation, lagOneCorrelationAbout } from '../residuals'
import { fineSlip, per100MetersSlip, perMeterSlip } from '../slips'
import { texNumber, texQuantity } from '../tex'
import { normalPoint, theilSenInterval, theilSenRate } from '../theilSen'

/**
 * Standard error of the Theil–Sen lapse rate, inflated for correlated residuals.
 *
 *   s′(Γ) = s(Γ) √[(1 + r₁)/(1 − r₁)]     s(Γ) from the ranks of the slopes, r₁ about the Theil–Sen line; the factor is 1 where r₁ is negative
 *
 * Source: Sen (1968), section 5, and Wilks (2011), section 5.2.4 (from memory). See `theilSenInterval` and `inflation`.
 *
 * @example z 0 … 70 m every 10 m, T 290.0, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3 K: r₁ 0.323, 10.5 K km⁻¹ (7.54 for independent rows)
 */
export const lapseRateTheilSenInflatedStandardErrorDefinition: QuantityDefinition = {
  key: 'lapse-rate-theil-sen-inflated-standard-error',
  name: 'standard error of the lapse rate by the Theil–Sen estimator, inflated for correlated residuals',
  symbol: 's′(Γ)',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'ratio',
  nearZero: 0.00001,
  inputs: layerInputs(4),
  variants: [{
    key: 'first-order', label: 'effective number of rows of a first-order autoregression',
    source: { text: 'Sen (1968), J. Amer. Statist. Assoc. 63, section 5; Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., section 5.2.4', status: 'from memory' },
    validity: 'six or more rows at even steps whose residuals follow a first-order autoregression', knownError: 'r₁ of short series is biased low, and so is this',
    evaluate(inputs): Outcome {
      const error = plainError(inputs)
      if (error === null) return { is: 'not_defined', why: 'The rows are too few for an interval by ranks at 95 %.' }
      const correlation = correlationOf(inputs)
      if (correlation === null) return { is: 'value', value: error, notes: ['The rows lie on their line; nothing is inflated.'] }
      const factor = inflation(correlation)
      if (factor === null) return { is: 'not_defined', why: 'The residuals correlate fully: no error follows.' }
      return { is: 'value', value: error * factor, more: { correlation, factor } }
    },
  }],
  constants: [],
  ask: 'The standard error of the Theil–Sen lapse rate of your rows (the width of its 95 % interval by ranks over 2 · 1.96), times √[(1 + r₁)/(1 − r₁)] with the lag-1 correlation r₁ of the residuals about the line with the Theil–Sen rate, less their mean, in the order of your rows; the factor is 1 where r₁ is negative.',
  trace(inputs) {
    const error = plainError(inputs)
    if (error === null) return [{ text: 'The ranks lie beyond the slopes', formula: '\\frac{N - C}{2} < 1', filled: '\\frac{N - C}{2} < 1' }]
    const correlation = correlationOf(inputs) ?? 0, factor = inflation(correlation) ?? 1, value = error * factor
    return [
      { text: 'Standard error for independent rows, from the ranks', formula: 's_\\Gamma = \\frac{\\Gamma_U - \\Gamma_L}{2 \\cdot 1.96}', filled: `s_\\Gamma = ${texQuantity(error * 1000, 'K/km')}`, value: error, unit: 'K/m' },
      { text: 'Lag-1 correlation of the residuals', formula: 'r_1 = \\frac{\\sum (e_i - \\bar e)(e_{i+1} - \\bar e)}{\\sum (e_i - \\bar e)^2}', filled: `r_1 = ${texNumber(correlation)}`, value: correlation, unit: '1' },
      { text: 'Inflated', formula: "s'_\\Gamma = s_\\Gamma \\sqrt{\\frac{1 + r_1}{1 - r_1}}", filled: `s'_\\Gamma = ${texNumber(error * 1000)} \\times ${texNumber(factor)}\\,\\mathrm{K\\,km^{-1}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip('not-inflated', 'not inflated', 'This is the standard error for independent rows: neighbors here have much in common.', inputs => plainError(inputs)),
    fineSlip('root-left-out', 'root left out', 'This multiplies by (1 + r₁)/(1 − r₁) without its root.', (inputs, _c, right) => right * (factorOf(inputs) ?? 1)),
    fineSlip('inverted-factor', 'factor turned over', 'This divides by the factor: correlated rows tell less, and the error grows.', (inputs) => {
      const error = plainError(inputs), factor = factorOf(inputs)
      return error === null || factor === null ? null : error / factor
    }),
  ],
  example: { inputs: { height: [0, 10, 20, 30, 40, 50, 60, 70], temperature: [290.0, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3] }, gives: 0.0105381, within: 1e-7 },
}

function plainError(inputs: Inputs): number | null {
  const interval = theilSenInterval(inputs)
  return interval && (interval.high - interval.low) / (2 * normalPoint)
}

const correlationOf = (inputs: Inputs): number | null => lagOneCorrelationAbout(inputs, theilSenRate(inputs).rate)

function factorOf(inputs: Inputs): number | null {
  const correlation = correlationOf(inputs)
  return correlation === null ? null : inflation(correlation)
}
