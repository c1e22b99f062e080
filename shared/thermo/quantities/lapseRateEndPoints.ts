import type { Inputs, QuantityDefinition } from '../definition'
import { dryClassLimits, endPointRate, endsOf, heightsOf, layerInputs, lineOf, temperaturesOf } from '../layer'
import { fineSlip, per100MetersSlip, perMeterSlip, signSlip, zeroCelsius } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/**
 * Lapse rate of a layer by its end points.
 *
 *   Γ = −(T₂ − T₁) / (z₂ − z₁)     between the lowest and the highest row
 *
 * Source: AMS Glossary of Meteorology, "lapse rate". The heights are those of the rows used, not the bounds of the layer.
 * Rows are chosen by height, never by order; rows at one height count with their mean. Another quantity than a fit.
 *
 * @example 18.0 °C at 20 m and 16.2 °C at 220 m: 9.0 K km⁻¹
 */
export const lapseRateEndPointsDefinition: QuantityDefinition = {
  key: 'lapse-rate-end-points',
  name: 'lapse rate of a layer by its end points',
  symbol: 'Γ',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: layerInputs(2),
  variants: [{
    key: 'end-points', label: 'lowest and highest row',
    source: { text: 'AMS Glossary of Meteorology, "lapse rate"', status: 'verified' },
    validity: 'any layer with two heights', knownError: 'none: the two readings alone decide',
    evaluate(inputs) {
      const ends = endsOf(inputs)
      const notes = ends.lowCount > 1 || ends.highCount > 1 ? ['Several rows share an end’s height; their mean is used.'] : undefined
      return { is: 'value', value: endPointRate(ends), notes, more: { lowHeight: ends.lowHeight, highHeight: ends.highHeight } }
    },
  }],
  constants: [],
  classLimits: dryClassLimits,
  ask: 'The lapse rate Γ = −ΔT/Δz between the lowest and the highest of your rows, positive where temperature falls with height; divide by the heights of these rows.',
  trace(inputs) {
    const ends = endsOf(inputs)
    const change = ends.highTemperature - ends.lowTemperature
    const depth = ends.highHeight - ends.lowHeight
    const value = endPointRate(ends)
    return [
      { text: 'Lowest and highest row', formula: 'z_1,\\,T_1;\\quad z_2,\\,T_2', filled: `z_1 = ${texQuantity(ends.lowHeight, 'm', 6)},\\ T_1 = ${texQuantity(ends.lowTemperature - zeroCelsius, 'Cel')};\\quad z_2 = ${texQuantity(ends.highHeight, 'm', 6)},\\ T_2 = ${texQuantity(ends.highTemperature - zeroCelsius, 'Cel')}` },
      { text: 'Lapse rate', formula: '\\Gamma = -\\frac{T_2 - T_1}{z_2 - z_1}', filled: `\\Gamma = -\\frac{${texFactor(change)}\\,\\mathrm{K}}{${texNumber(depth / 1000, 6)}\\,\\mathrm{km}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    signSlip('A lapse rate is positive where temperature falls with height; the layer may also have been taken upside down.'),
    perMeterSlip,
    per100MetersSlip,
    fineSlip('least-squares', 'a fit in place of the end points', 'This is the slope of a straight line through all rows: the ask takes the lowest and the highest row alone.', inputs => -lineOf(inputs).slope),
    fineSlip('first-and-last-row', 'first and last row in place of the end points', 'This is taken between the first and the last row: the ask takes the lowest and the highest by height.', firstAndLast),
    fineSlip('mean-of-parts', 'plain mean of the rates between rows', 'This is the plain mean of the rates between neighbors: thick and thin parts do not count alike.', meanOfParts),
  ],
  example: { inputs: { height: [20, 220], temperature: [291.15, 289.35] }, gives: 0.009, within: 1e-12 },
}

function firstAndLast(inputs: Inputs): number | null {
  const z = heightsOf(inputs), T = temperaturesOf(inputs)
  const last = z.length - 1
  const depth = (z[last] ?? 0) - (z[0] ?? 0)
  return depth === 0 ? null : -((T[last] ?? 0) - (T[0] ?? 0)) / depth
}

function meanOfParts(inputs: Inputs): number | null {
  const z = heightsOf(inputs), T = temperaturesOf(inputs)
  if (z.length < 3) return null
  let sum = 0
  for (let at = 1; at < z.length; at++) {
    const depth = (z[at] ?? 0) - (z[at - 1] ?? 0)
    if (depth === 0) return null
    sum -= ((T[at] ?? 0) - (T[at - 1] ?? 0)) / depth
  }
  return sum / (z.length - 1)
}
