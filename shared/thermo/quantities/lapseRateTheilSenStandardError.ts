import type { QuantityDefinition } from '../definition'
import { layerInputs, lineOf } from '../layer'
import { fineSlip, per100MetersSlip, perMeterSlip } from '../slips'
import { texNumber, texQuantity } from '../tex'
import { normalPoint, theilSenInterval } from '../theilSen'

/**
 * Standard error of the lapse rate by the Theil–Sen estimator, from the ranks of its slopes.
 *
 *   s(Γ) = (Γ_U − Γ_L) / (2 · 1.96)     Γ_L, Γ_U the bounds at 95 %: see `theilSenInterval`
 *
 * Source: Sen (1968), section 5. "Not defined" where the rows are too few for the interval (about six are needed).
 *
 * @example seven rows 0 … 600 m every 100 m, T 20.0, 19.1, 18.3, 17.0, 16.4, 15.2, 14.5 °C: 0.513 K km⁻¹
 */
export const lapseRateTheilSenStandardErrorDefinition: QuantityDefinition = {
  key: 'lapse-rate-theil-sen-standard-error',
  name: 'standard error of the lapse rate by the Theil–Sen estimator',
  symbol: 's(Γ)',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'ratio',
  nearZero: 0.00001,
  inputs: layerInputs(3),
  variants: [{
    key: 'rank-interval', label: 'width of the 95 % interval by ranks, over 2 · 1.96',
    source: { text: 'Sen (1968), J. Amer. Statist. Assoc. 63, section 5; Gilbert (1987), section 16.5', status: 'from memory' },
    validity: 'independent rows at different heights, six or more', knownError: 'the normal approximation of the ranks; too small where neighboring rows are correlated',
    evaluate(inputs) {
      const interval = theilSenInterval(inputs)
      if (!interval) return { is: 'not_defined', why: 'The rows are too few for an interval by ranks at 95 %.' }
      return { is: 'value', value: errorOf(interval), more: { low: interval.low, high: interval.high } }
    },
  }],
  constants: [],
  ask: 'The standard error of the Theil–Sen lapse rate of your rows: the width of its 95 % interval by ranks, C = 1.96 √[n(n − 1)(2n + 5)/18], bounds at ranks (N − C)/2 and (N + C)/2 + 1 with linear interpolation between ranks, divided by 2 · 1.96. "Not defined" where a rank lies beyond the slopes.',
  trace(inputs) {
    const interval = theilSenInterval(inputs)
    if (!interval) return [{ text: 'The ranks lie beyond the slopes', formula: '\\frac{N - C}{2} < 1', filled: '\\frac{N - C}{2} < 1' }]
    const value = errorOf(interval)
    return [
      { text: 'Half-width in ranks', formula: 'C = 1.96 \\sqrt{\\frac{n (n - 1)(2 n + 5)}{18}}', filled: `C = ${texNumber(interval.halfRanks)},\\quad N = ${interval.pairs}` },
      { text: 'Bounds at 95 %', formula: '\\Gamma_L,\\ \\Gamma_U', filled: `\\Gamma_L = ${texQuantity(interval.low * 1000, 'K/km')},\\quad \\Gamma_U = ${texQuantity(interval.high * 1000, 'K/km')}` },
      { text: 'Standard error', formula: 's_\\Gamma = \\frac{\\Gamma_U - \\Gamma_L}{2 \\cdot 1.96}', filled: `s_\\Gamma = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip('half-width', 'half the interval in place of the standard error', 'This is half the width of the 95 % interval: divide it by 1.96.', (_i, _c, right) => normalPoint * right),
    fineSlip('whole-width', 'the interval in place of the standard error', 'This is the whole width of the 95 % interval: divide it by 2 · 1.96.', (_i, _c, right) => 2 * normalPoint * right),
    fineSlip('least-squares', 'error of least squares in place of it', 'This is the standard error of the fit by least squares.', inputs => lineOf(inputs).slopeError),
  ],
  example: { inputs: { height: [0, 100, 200, 300, 400, 500, 600], temperature: [293.15, 292.25, 291.45, 290.15, 289.55, 288.35, 287.65] }, gives: 0.00051341, within: 1e-8 },
}

const errorOf = ({ low, high }: { low: number, high: number }): number => (high - low) / (2 * normalPoint)
