import { endPointRate, endsOf, lineOf } from '../layer'
import { texNumber, texQuantity } from '../tex'
import { theilSenRate } from '../theilSen'
import { virtualLapseRateDefinition } from '../virtualLapseRateDefinition'

/**
 * Lapse rate of the virtual temperature by least squares of Tv on z over all rows. Another quantity than the lapse rate of T.
 *
 *   Γv = −Σ(z − z̄)(Tv − T̄v) / Σ(z − z̄)²
 *
 * Source: AMS Glossary of Meteorology, "virtual temperature"; ordinary least squares.
 *
 * @example z 100 … 300 m every 50 m, T 15.0, 14.6, 14.1, 13.7, 12.9 °C, w 9.0, 8.8, 8.5, 8.1, 7.6 g/kg: 11.45 K km⁻¹ (T alone: 10.20)
 */
export const virtualTemperatureLapseRateLeastSquaresDefinition = virtualLapseRateDefinition({
  key: 'virtual-temperature-lapse-rate-least-squares',
  name: 'lapse rate of virtual temperature by least squares',
  least: 3,
  formula: {
    key: 'ordinary', label: 'ordinary least squares of Tv on z', source: { text: 'AMS Glossary of Meteorology, "virtual temperature"; ordinary least squares', status: 'common practice' },
    validity: 'any layer with two heights', knownError: '1 + 0.61 w for the exact factor: 0.01 K km⁻¹ where w falls by 8 g kg⁻¹ in a kilometer',
  },
  rate: rows => -lineOf(rows).slope,
  beside(rows) {
    const line = lineOf(rows)
    return { more: { rSquared: line.rSquared ?? 0, standardError: line.slopeError ?? 0, count: line.count } }
  },
  ask: 'The lapse rate Γv = −dTv/dz of the virtual temperature by ordinary least squares on height over all your rows, positive where it falls with height; make each row’s temperature virtual with its mixing ratio first.',
  steps(rows, value) {
    const line = lineOf(rows)
    return [
      { text: `Means of the ${line.count} rows`, formula: '\\bar z,\\ \\bar T_v', filled: `\\bar z = ${texQuantity(line.meanX, 'm', 6)},\\quad \\bar T_v = ${texQuantity(line.meanY, 'K', 6)}` },
      { text: 'Sums about the means', formula: '\\sum (z - \\bar z)^2,\\ \\sum (z - \\bar z)(T_v - \\bar T_v)', filled: `\\sum (z - \\bar z)^2 = ${texNumber(line.sumXX)}\\,\\mathrm{m^2},\\quad \\sum (z - \\bar z)(T_v - \\bar T_v) = ${texNumber(line.sumXY)}\\,\\mathrm{K\\,m}` },
      { text: 'Lapse rate', formula: '\\Gamma_v = -\\frac{\\sum (z - \\bar z)(T_v - \\bar T_v)}{\\sum (z - \\bar z)^2}', filled: `\\Gamma_v = -\\frac{${texNumber(line.sumXY)}}{${texNumber(line.sumXX)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  otherMethods: [
    { key: 'end-points', label: 'end points in place of a fit', sentence: 'This is the rate between the lowest and the highest row alone: the ask takes a fit through all rows.', rate: rows => endPointRate(endsOf(rows)) },
    { key: 'theil-sen', label: 'the median of the pairs in place of a fit', sentence: 'This is the median of the slopes between all pairs: the ask takes a fit by least squares.', rate: rows => theilSenRate(rows).rate },
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05], mixingRatio: [0.009, 0.0088, 0.0085, 0.0081, 0.0076] }, gives: 0.0114532, within: 1e-7 },
})
