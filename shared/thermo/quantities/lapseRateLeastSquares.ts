import type { Inputs, QuantityDefinition } from '../definition'
import { dryClassLimits, endPointRate, endsOf, layerInputs, lineOf } from '../layer'
import { fineSlip, per100MetersSlip, perMeterSlip, signSlip, slip, zeroCelsius } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Lapse rate of a layer by least squares of T on z.
 *
 *   Γ = −Σ(z − z̄)(T − T̄) / Σ(z − z̄)²     over all rows as served
 *
 * Source: common practice (ordinary least squares); arithmetic agrees with NIST StRD Norris.
 * The heights are taken as free of error. Rows need no order. Another quantity than the rate between end points.
 *
 * @example z 100, 150, 200, 250, 300 m; T 15.0, 14.6, 14.1, 13.7, 12.9 °C: 10.20 K km⁻¹
 */
export const lapseRateLeastSquaresDefinition: QuantityDefinition = {
  key: 'lapse-rate-least-squares',
  name: 'lapse rate of a layer by least squares',
  symbol: 'Γ',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: layerInputs(3),
  variants: [{
    key: 'ordinary', label: 'ordinary least squares of T on z',
    source: { text: 'ordinary least squares; NIST StRD linear regression for the arithmetic', status: 'common practice' },
    validity: 'any layer with two heights', knownError: 'none: the rows alone decide',
    evaluate(inputs) {
      const line = lineOf(inputs)
      return { is: 'value', value: -line.slope, more: { rSquared: line.rSquared ?? 0, standardError: line.slopeError ?? 0, count: line.count } }
    },
  }],
  constants: [],
  classLimits: dryClassLimits,
  ask: 'The lapse rate Γ = −dT/dz by ordinary least squares of temperature on height over all your rows, positive where temperature falls with height.',
  trace(inputs) {
    const line = lineOf(inputs)
    const value = -line.slope
    return [
      { text: `Means of the ${line.count} rows`, formula: '\\bar z,\\ \\bar T', filled: `\\bar z = ${texQuantity(line.meanX, 'm', 6)},\\quad \\bar T = ${texQuantity(line.meanY - zeroCelsius, 'Cel')}` },
      { text: 'Sums about the means', formula: '\\sum (z - \\bar z)^2,\\ \\sum (z - \\bar z)(T - \\bar T)', filled: `\\sum (z - \\bar z)^2 = ${texNumber(line.sumXX)}\\,\\mathrm{m^2},\\quad \\sum (z - \\bar z)(T - \\bar T) = ${texNumber(line.sumXY)}\\,\\mathrm{K\\,m}` },
      { text: 'Lapse rate', formula: '\\Gamma = -\\frac{\\sum (z - \\bar z)(T - \\bar T)}{\\sum (z - \\bar z)^2}', filled: `\\Gamma = -\\frac{${texNumber(line.sumXY)}}{${texNumber(line.sumXX)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    signSlip('A lapse rate is positive where temperature falls with height: it is the slope of T on z with its sign turned.'),
    perMeterSlip,
    per100MetersSlip,
    fineSlip('inverse-fit', 'z fitted on T and inverted', 'This comes from fitting height on temperature and inverting the slope: the ask fits temperature on height.', inverseFit),
    slip('swapped-arguments', 'x and y swapped', 'This is the slope of height on temperature, in meters per kelvin: x and y are swapped.', (inputs) => {
      const line = lineOf(inputs)
      return line.sumYY > 0 ? line.sumXY / line.sumYY / 1000 : null
    }),
    fineSlip('end-points', 'end points in place of a fit', 'This is the rate between the lowest and the highest row alone: the ask takes a fit through all rows.', inputs => endPointRate(endsOf(inputs))),
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }, gives: 0.0102, within: 1e-12 },
}

/** 1/(slope of z on T), which is the slope divided by r². */
function inverseFit(inputs: Inputs): number | null {
  const line = lineOf(inputs)
  return line.sumXY === 0 ? null : -line.sumYY / line.sumXY
}
