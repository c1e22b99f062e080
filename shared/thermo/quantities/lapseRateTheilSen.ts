import type { QuantityDefinition } from '../definition'
import { dryClassLimits, endPointRate, endsOf, layerInputs, lineOf } from '../layer'
import { fineSlip, per100MetersSlip, perMeterSlip, signSlip } from '../slips'
import { texNumber, texQuantity } from '../tex'
import { meanOfPairs, theilSenRate } from '../theilSen'

/** Lapse rate of a layer by the Theil–Sen estimator: see `theilSenRate`. Another quantity than a fit by least squares. */
export const lapseRateTheilSenDefinition: QuantityDefinition = {
  key: 'lapse-rate-theil-sen',
  name: 'lapse rate of a layer by the Theil–Sen estimator',
  symbol: 'Γ',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: layerInputs(3),
  variants: [{
    key: 'median-of-pairs', label: 'median of the slopes between all pairs of rows',
    source: { text: 'Sen (1968), J. Amer. Statist. Assoc. 63, 1379–1389, section 4', status: 'from memory' },
    validity: 'any layer with two heights, 3 to 3000 rows', knownError: 'none: the rows alone decide',
    evaluate(inputs) {
      const { rate, pairs, tiedPairs } = theilSenRate(inputs)
      const notes = tiedPairs > 0 ? [`${tiedPairs} pairs of rows at one height are left out.`] : undefined
      return { is: 'value', value: rate, notes, more: { pairs } }
    },
  }],
  constants: [],
  classLimits: dryClassLimits,
  ask: 'The lapse rate Γ by the Theil–Sen estimator: the median of −ΔT/Δz over all pairs of your rows, pairs at one height left out, positive where temperature falls with height.',
  trace(inputs) {
    const { rate, pairs } = theilSenRate(inputs)
    return [
      { text: 'Slopes between all pairs of rows at different heights', formula: '\\Gamma_{ij} = -\\frac{T_j - T_i}{z_j - z_i},\\quad i < j', filled: `N = ${pairs}` },
      { text: 'Their median', formula: '\\Gamma = \\mathrm{median}\\,\\Gamma_{ij}', filled: `\\Gamma = ${texQuantity(rate * 1000, 'K/km')}\\quad (N = ${texNumber(pairs, 7)})`, value: rate, unit: 'K/m' },
    ]
  },
  slips: [
    signSlip('A lapse rate is positive where temperature falls with height: it is the slope of T on z with its sign turned.'),
    perMeterSlip,
    per100MetersSlip,
    fineSlip('least-squares', 'least squares in place of the median', 'This is the slope by least squares: the ask takes the median of the slopes between all pairs.', inputs => -lineOf(inputs).slope),
    fineSlip('end-points', 'end points in place of the median', 'This is the rate between the lowest and the highest row alone: the ask takes all pairs.', inputs => endPointRate(endsOf(inputs))),
    fineSlip('mean-of-pairs', 'mean of the pairs in place of the median', 'This is the mean of the slopes between all pairs: the ask takes their median.', meanOfPairs),
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }, gives: 0.0095, within: 1e-12 },
}
