import type { QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { bulkRichardsonProfile, firstRowAbove, mixedLayerInputs, parcelMixedLayerDepth, richardsonMixedLayerDepth } from '../mixedLayer'
import { fineSlip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/** Mixed-layer depth by the bulk Richardson number: see `richardsonMixedLayerDepth`. "Not reached" where it is above the flight's top. */
export const mixedLayerDepthBulkRichardsonDefinition: QuantityDefinition = {
  key: 'mixed-layer-depth-bulk-richardson',
  name: 'mixed-layer depth by the bulk Richardson number',
  symbol: 'h',
  unit: 'm',
  shownUnit: 'm',
  kind: 'difference',
  nearZero: 10,
  inputs: [
    ...mixedLayerInputs,
    { name: 'windSpeed', label: 'wind speeds of the rows', symbol: 'V', unit: 'm/s', shownUnit: 'm/s', kind: 'difference', shape: 'series', range: [0, 200], needs: { least: 3, order: 'none' } },
    { name: 'criticalRichardsonNumber', label: 'critical bulk Richardson number', symbol: 'Ri_c', unit: '1', shownUnit: '1', kind: 'ratio', shape: 'number', range: [0.01, 10] },
  ],
  variants: [{
    key: 'calm-ground', label: 'from the lowest row, wind at the ground taken as calm',
    source: { text: 'Seidel et al. (2012), J. Geophys. Res. 117, D17106, Eq. 1, without its friction term', status: 'from memory' },
    validity: 'convective and stable layers, heights above ground', knownError: 'the critical number is taught as 0.2 to 0.5',
    evaluate(inputs, constants) {
      const value = richardsonMixedLayerDepth(inputs, constants)
      return value === null ? { is: 'not_reached', why: 'The bulk Richardson number stays below the critical one up to the top of the data.' } : { is: 'value', value }
    },
  }],
  constants: ['g'],
  ask: 'The mixed-layer depth above ground by the bulk Richardson number Ri(z) = (g/θ_s)(θ(z) − θ_s)(z − z_s)/V(z)² from the lowest row, wind at the ground taken as calm: the lowest height at which Ri exceeds the critical number, linear between rows; "not reached" where the data end below it.',
  trace(inputs, constants) {
    const value = richardsonMixedLayerDepth(inputs, constants), profile = bulkRichardsonProfile(inputs, constants)
    const first = { text: 'Bulk Richardson number of each row', formula: 'Ri(z) = \\frac{g}{\\theta_s} \\frac{(\\theta - \\theta_s)(z - z_s)}{V^2}', filled: `Ri_c = ${texNumber(numberOf(inputs, 'criticalRichardsonNumber'))},\\quad Ri \\text{ of } ${profile.length} \\text{ rows}` }
    if (value === null) return [first]
    return [first, { text: 'The lowest height at which it exceeds the critical one, linear between rows', formula: 'Ri(h) = Ri_c', filled: `h = ${texQuantity(value, 'm')}`, value, unit: 'm' }]
  },
  slips: [
    fineSlip('row-above', 'row above in place of interpolation', 'This is the first row above: the ask interpolates between rows.', (inputs, constants) => firstRowAbove(inputs, bulkRichardsonProfile(inputs, constants), numberOf(inputs, 'criticalRichardsonNumber'))),
    fineSlip('parcel-method', 'parcel method in place of it', 'This is the depth by the parcel method without excess.', inputs => parcelMixedLayerDepth(inputs, 0)),
  ],
  example: { inputs: { height: [2, 100, 500, 800, 1000], potentialTemperature: [300, 299.8, 299.8, 300.2, 303], windSpeed: [2, 5, 6, 7, 8], criticalRichardsonNumber: 0.25 }, gives: 820.16, within: 0.01 },
}
