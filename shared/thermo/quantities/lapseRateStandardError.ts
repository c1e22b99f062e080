import type { Inputs, Outcome, QuantityDefinition } from '../definition'
import { layerInputs, lineOf } from '../layer'
import { fineSlip, per100MetersSlip, perMeterSlip, slip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Standard error of the lapse rate by least squares.
 *
 *   s(Γ) = √[ Σ(T − T̂)² / (n − 2) ] / √Σ(z − z̄)²
 *
 * Source: common practice (ordinary least squares, n − 2 degrees of freedom); agrees with NIST StRD Norris.
 * Limits: residuals taken as independent; at 1 Hz they are not, and the error is larger.
 *
 * @example z 100 … 300 m, T 15.0, 14.6, 14.1, 13.7, 12.9 °C: 0.825 K km⁻¹
 */
export const lapseRateStandardErrorDefinition: QuantityDefinition = {
  key: 'lapse-rate-standard-error',
  name: 'standard error of the lapse rate by least squares',
  symbol: 's(Γ)',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'ratio',
  nearZero: 0.00001,
  inputs: layerInputs(3),
  variants: [{
    key: 'ordinary', label: 'ordinary least squares, n − 2 degrees of freedom',
    source: { text: 'ordinary least squares; NIST StRD linear regression for the arithmetic', status: 'common practice' },
    validity: 'independent residuals', knownError: 'too small where neighboring rows are correlated',
    evaluate: (inputs): Outcome => ({ is: 'value', value: standardError(inputs) }),
  }],
  constants: [],
  ask: 'The standard error of the lapse rate by ordinary least squares of temperature on height over all your rows, with n − 2 degrees of freedom.',
  trace(inputs) {
    const line = lineOf(inputs)
    const value = standardError(inputs)
    const deviation = line.residualDeviation ?? 0
    return [
      { text: 'Scatter of the rows about the line', formula: 's = \\sqrt{\\frac{\\sum (T - \\hat T)^2}{n - 2}}', filled: `s = \\sqrt{\\frac{${texNumber(deviation * deviation * (line.count - 2))}}{${line.count} - 2}} = ${texQuantity(deviation, 'K')}`, value: deviation, unit: 'K' },
      { text: 'Standard error of the slope', formula: 's_\\Gamma = \\frac{s}{\\sqrt{\\sum (z - \\bar z)^2}}', filled: `s_\\Gamma = \\frac{${texNumber(deviation)}}{\\sqrt{${texNumber(line.sumXX)}}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip('n-minus-1', 'n − 1 for n − 2', 'This comes from n − 1 degrees of freedom: the line takes two from n.', (inputs, _c, right) => right * Math.sqrt((lineOf(inputs).count - 2) / (lineOf(inputs).count - 1))),
    fineSlip('n', 'n for n − 2', 'This comes from dividing by n: the line takes two degrees of freedom from n.', (inputs, _c, right) => right * Math.sqrt((lineOf(inputs).count - 2) / lineOf(inputs).count)),
    slip('scatter', 'scatter for standard error', 'This is the scatter of the rows about the line, in kelvin: divide it by the root of Σ(z − z̄)².', inputs => (lineOf(inputs).residualDeviation ?? 0) / 1000),
    slip('double', 'twice the standard error', 'This is twice the standard error, the half-width of an interval.', (_i, _c, right) => 2 * right),
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }, gives: 0.000825, within: 0.000001 },
}

const standardError = (inputs: Inputs): number => lineOf(inputs).slopeError ?? 0
