import { endPointRate, endsOf, lineOf } from '../layer'
import { texFactor, texNumber, texQuantity } from '../tex'
import { theilSenRate } from '../theilSen'
import { virtualLapseRateDefinition } from '../virtualLapseRateDefinition'

/**
 * Lapse rate of the virtual temperature by the end points of a layer. Another quantity than the lapse rate of T.
 *
 *   Γv = −(Tv₂ − Tv₁)/(z₂ − z₁)     between the lowest and the highest row
 *
 * Source: AMS Glossary of Meteorology, "virtual temperature", "lapse rate".
 *
 * @example 15 °C and 12 g/kg at 0 m, 11 °C and 8 g/kg at 500 m: 9.41 K km⁻¹ (T alone: 8.00)
 */
export const virtualTemperatureLapseRateEndPointsDefinition = virtualLapseRateDefinition({
  key: 'virtual-temperature-lapse-rate-end-points',
  name: 'lapse rate of virtual temperature by end points',
  least: 2,
  formula: {
    key: 'end-points', label: 'lowest and highest row', source: { text: 'AMS Glossary of Meteorology, "virtual temperature" and "lapse rate"', status: 'common practice' },
    validity: 'any layer with two heights', knownError: '1 + 0.61 w for the exact factor: 0.01 K km⁻¹ where w falls by 8 g kg⁻¹ in a kilometer',
  },
  rate: rows => endPointRate(endsOf(rows)),
  beside(rows) {
    const ends = endsOf(rows)
    const notes = ends.lowCount > 1 || ends.highCount > 1 ? ['Several rows share an end’s height; their mean is used.'] : undefined
    return { notes, more: { lowHeight: ends.lowHeight, highHeight: ends.highHeight } }
  },
  ask: 'The lapse rate Γv = −ΔTv/Δz of the virtual temperature between the lowest and the highest of your rows, positive where it falls with height; make each row’s temperature virtual with its mixing ratio first.',
  steps(rows, value) {
    const ends = endsOf(rows), change = ends.highTemperature - ends.lowTemperature, depth = ends.highHeight - ends.lowHeight
    return [
      { text: 'Lowest and highest row', formula: 'z_1,\\,T_{v1};\\quad z_2,\\,T_{v2}', filled: `z_1 = ${texQuantity(ends.lowHeight, 'm', 6)},\\ T_{v1} = ${texQuantity(ends.lowTemperature, 'K', 6)};\\quad z_2 = ${texQuantity(ends.highHeight, 'm', 6)},\\ T_{v2} = ${texQuantity(ends.highTemperature, 'K', 6)}` },
      { text: 'Lapse rate', formula: '\\Gamma_v = -\\frac{T_{v2} - T_{v1}}{z_2 - z_1}', filled: `\\Gamma_v = -\\frac{${texFactor(change)}\\,\\mathrm{K}}{${texNumber(depth / 1000, 6)}\\,\\mathrm{km}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  otherMethods: [
    { key: 'least-squares', label: 'a fit in place of the end points', sentence: 'This is the slope of a straight line through all rows: the ask takes the lowest and the highest row alone.', rate: rows => -lineOf(rows).slope },
    { key: 'theil-sen', label: 'the median of the pairs in place of the end points', sentence: 'This is the median of the slopes between all pairs: the ask takes the lowest and the highest row alone.', rate: rows => theilSenRate(rows).rate },
  ],
  example: { inputs: { height: [0, 500], temperature: [288.15, 284.15], mixingRatio: [0.012, 0.008] }, gives: 0.00941, within: 0.000005 },
})
