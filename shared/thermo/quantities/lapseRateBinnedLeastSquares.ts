import { binInputs, binnedRows } from '../bins'
import { straightLine, type Line } from '../../numerics/regression'
import type { Inputs, QuantityDefinition } from '../definition'
import { SeriesError } from '../errors'
import { dryClassLimits, endPointRate, endsOf, lineOf } from '../layer'
import { fineSlip, per100MetersSlip, perMeterSlip, signSlip, slip, zeroCelsius } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Lapse rate of a layer by least squares of T on z over the means of bins: see `binnedRows`.
 *
 *   Γ = −Σ(z_b − z̄)(T_b − T̄) / Σ(z_b − z̄)²     z_b, T_b the means of a bin's rows, each bin counted once
 *
 * Source: common practice. Another quantity than the fit of the rows as served: where a winch stops, the two differ.
 *
 * @example 100 … 300 m as five rows, and 60 more at 150 m with 14.4 °C, in bins of 50 m from 75 m: 9.81 K km⁻¹ (9.13 as served)
 */
export const lapseRateBinnedLeastSquaresDefinition: QuantityDefinition = {
  key: 'lapse-rate-binned-least-squares',
  name: 'lapse rate of a layer by least squares over bins of height',
  symbol: 'Γ',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: binInputs,
  variants: [{
    key: 'bin-means', label: 'ordinary least squares over the means of the bins',
    source: { text: 'ordinary least squares; NIST StRD linear regression for the arithmetic', status: 'common practice' },
    validity: 'any layer with two bins that have rows', knownError: 'none: the rows and the bins alone decide',
    evaluate(inputs) {
      const { counts, emptyBetween } = binnedRows(inputs), line = fit(inputs)
      const notes = emptyBetween.length > 0 ? [`${emptyBetween.length} ${emptyBetween.length === 1 ? 'bin has' : 'bins have'} no row and ${emptyBetween.length === 1 ? 'is' : 'are'} left out.`] : undefined
      return { is: 'value', value: -line.slope, notes, more: { bins: counts.length, rows: counts.reduce((sum, one) => sum + one, 0), standardError: line.slopeError ?? 0 } }
    },
  }],
  constants: [],
  classLimits: dryClassLimits,
  ask: 'The lapse rate Γ = −dT/dz by ordinary least squares over bins of height, positive where temperature falls with height: each bin holds the rows from its lower bound up to, and without, its upper bound, and stands with the mean height and the mean temperature of its rows; bins count alike, and those without rows are left out.',
  trace(inputs) {
    const { counts, height, temperature } = binnedRows(inputs), line = fit(inputs), value = -line.slope, last = counts.length - 1
    return [
      { text: `Means of the ${counts.length} bins, which hold ${counts.join(', ')} rows`, formula: 'z_b = \\frac{1}{n_b} \\sum z,\\quad T_b = \\frac{1}{n_b} \\sum T', filled: `z_1 = ${texQuantity(height[0] ?? 0, 'm', 6)},\\ T_1 = ${texQuantity((temperature[0] ?? 0) - zeroCelsius, 'Cel')};\\quad z_{${last + 1}} = ${texQuantity(height[last] ?? 0, 'm', 6)},\\ T_{${last + 1}} = ${texQuantity((temperature[last] ?? 0) - zeroCelsius, 'Cel')}` },
      { text: 'Sums about the means of the bins', formula: '\\sum (z_b - \\bar z)^2,\\ \\sum (z_b - \\bar z)(T_b - \\bar T)', filled: `\\sum (z_b - \\bar z)^2 = ${texNumber(line.sumXX)}\\,\\mathrm{m^2},\\quad \\sum (z_b - \\bar z)(T_b - \\bar T) = ${texNumber(line.sumXY)}\\,\\mathrm{K\\,m}` },
      { text: 'Lapse rate', formula: '\\Gamma = -\\frac{\\sum (z_b - \\bar z)(T_b - \\bar T)}{\\sum (z_b - \\bar z)^2}', filled: `\\Gamma = -\\frac{${texNumber(line.sumXY)}}{${texNumber(line.sumXX)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    signSlip('A lapse rate is positive where temperature falls with height: it is the slope of T on z with its sign turned.'),
    perMeterSlip,
    per100MetersSlip,
    fineSlip('as-served', 'rows fitted as served', 'This is the fit through all rows as they are: the ask takes the means of the bins, each counted once.', inputs => -lineOf(inputs).slope),
    fineSlip('bin-centers', 'centers of the bins in place of mean heights', 'This puts each bin at its center: it stands at the mean height of its rows.', (inputs) => {
      const { centers, temperature } = binnedRows(inputs), line = straightLine(centers, temperature)
      return line && -line.slope
    }),
    slip('empty-as-zero', 'empty bins taken for 0 °C', 'This takes bins without rows for rows of 0 °C: they are left out.', (inputs) => {
      const { height, temperature, emptyBetween } = binnedRows(inputs)
      if (emptyBetween.length === 0) return null
      const line = straightLine([...height, ...emptyBetween], [...temperature, ...emptyBetween.map(() => zeroCelsius)])
      return line && -line.slope
    }),
    fineSlip('end-points', 'end points in place of a fit', 'This is the rate between the lowest and the highest row alone: the ask takes a fit through the bins.', inputs => endPointRate(endsOf(inputs))),
  ],
  example: {
    inputs: { height: [100, 150, 150, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.55, 287.55, 287.25, 286.85, 286.05], binDepth: 50, binStart: 75 },
    gives: 0.00993333, within: 1e-8,
  },
}

/** @throws {SeriesError} where the bins stand at one height, or there is but one */
function fit(inputs: Inputs): Line {
  const { height, temperature } = binnedRows(inputs), line = straightLine(height, temperature)
  if (!line) throw new SeriesError('height', 'the bins have no two heights; a lapse rate needs a layer')
  return line
}
