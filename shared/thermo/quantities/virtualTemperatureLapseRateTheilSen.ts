import { endPointRate, endsOf, lineOf } from '../layer'
import { texQuantity } from '../tex'
import { theilSenRate } from '../theilSen'
import { virtualLapseRateDefinition } from '../virtualLapseRateDefinition'

/** Lapse rate of the virtual temperature by the Theil–Sen estimator: see `theilSenRate` and `virtualRows`. Another quantity than the lapse rate of T. */
export const virtualTemperatureLapseRateTheilSenDefinition = virtualLapseRateDefinition({
  key: 'virtual-temperature-lapse-rate-theil-sen',
  name: 'lapse rate of virtual temperature by the Theil–Sen estimator',
  least: 3,
  formula: {
    key: 'median-of-pairs', label: 'median of the slopes between all pairs of rows', source: { text: 'Sen (1968), J. Amer. Statist. Assoc. 63, 1379–1389, section 4; AMS Glossary of Meteorology, "virtual temperature"', status: 'from memory' },
    validity: 'any layer with two heights, 3 to 3000 rows', knownError: '1 + 0.61 w for the exact factor: 0.01 K km⁻¹ where w falls by 8 g kg⁻¹ in a kilometer',
  },
  rate: rows => theilSenRate(rows).rate,
  beside(rows) {
    const { pairs, tiedPairs } = theilSenRate(rows)
    return { notes: tiedPairs > 0 ? [`${tiedPairs} pairs of rows at one height are left out.`] : undefined, more: { pairs } }
  },
  ask: 'The lapse rate Γv of the virtual temperature by the Theil–Sen estimator: the median of −ΔTv/Δz over all pairs of your rows, pairs at one height left out, positive where it falls with height; make each row’s temperature virtual with its mixing ratio first.',
  steps(rows, value) {
    const { pairs } = theilSenRate(rows)
    return [
      { text: 'Slopes between all pairs of rows at different heights', formula: '\\Gamma_{ij} = -\\frac{T_{v,j} - T_{v,i}}{z_j - z_i},\\quad i < j', filled: `N = ${pairs}` },
      { text: 'Their median', formula: '\\Gamma_v = \\mathrm{median}\\,\\Gamma_{ij}', filled: `\\Gamma_v = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  otherMethods: [
    { key: 'least-squares', label: 'least squares in place of the median', sentence: 'This is the slope by least squares: the ask takes the median of the slopes between all pairs.', rate: rows => -lineOf(rows).slope },
    { key: 'end-points', label: 'end points in place of the median', sentence: 'This is the rate between the lowest and the highest row alone: the ask takes all pairs.', rate: rows => endPointRate(endsOf(rows)) },
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05], mixingRatio: [0.009, 0.0088, 0.0085, 0.0081, 0.0076] }, gives: 0.01066564, within: 1e-8 },
})
