import type { QuantityDefinition } from '../definition'
import { numberOf, seriesOf } from '../inputs'
import { firstRowAbove, groundTheta, mixedLayerInputs, parcelMixedLayerDepth } from '../mixedLayer'
import { fineSlip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/** Mixed-layer depth by the parcel method: see `parcelMixedLayerDepth`. "Not reached" where it is above the flight's top. */
export const mixedLayerDepthParcelDefinition: QuantityDefinition = {
  key: 'mixed-layer-depth-parcel',
  name: 'mixed-layer depth by the parcel method',
  symbol: 'h',
  unit: 'm',
  shownUnit: 'm',
  kind: 'difference',
  nearZero: 10,
  inputs: [...mixedLayerInputs, { name: 'excess', label: 'excess of the parcel over θ of the lowest row', symbol: 'δθ', unit: 'K', shownUnit: 'K', kind: 'difference', shape: 'number', range: [0, 10] }],
  variants: [{
    key: 'parcel', label: 'height at which θ reaches that of the lowest row and the excess',
    source: { text: 'Holzworth (1964), Mon. Wea. Rev. 92, 235–242; Seidel et al. (2010), J. Geophys. Res. 115, D16113, section 2', status: 'from memory' },
    validity: 'a convective day, heights above ground', knownError: 'the spacing of the rows and the reading of the lowest one',
    evaluate(inputs) {
      const value = parcelMixedLayerDepth(inputs)
      return value === null ? { is: 'not_reached', why: 'θ stays below that of the lowest row and the excess up to the top of the data.' } : { is: 'value', value }
    },
  }],
  constants: [],
  ask: 'The mixed-layer depth above ground by the parcel method: the lowest height at which θ exceeds θ of the lowest row plus the excess, linear between rows; "not reached" where the data end below it.',
  trace(inputs) {
    const limit = groundTheta(inputs) + numberOf(inputs, 'excess'), value = parcelMixedLayerDepth(inputs)
    const first = { text: 'θ of the parcel', formula: '\\theta_p = \\theta_s + \\delta\\theta', filled: `\\theta_p = ${texNumber(groundTheta(inputs), 6)} + ${texNumber(numberOf(inputs, 'excess'))}\\,\\mathrm{K} = ${texQuantity(limit, 'K', 6)}`, value: limit, unit: 'K' }
    if (value === null) return [first]
    return [first, { text: 'The lowest height with this θ, linear between rows', formula: '\\theta(h) = \\theta_p', filled: `h = ${texQuantity(value, 'm')}`, value, unit: 'm' }]
  },
  slips: [
    fineSlip('excess-left-out', 'excess left out', 'The excess is left out.', inputs => parcelMixedLayerDepth(inputs, 0)),
    fineSlip('row-above', 'row above in place of interpolation', 'This is the first row above: the ask interpolates between rows.', inputs => firstRowAbove(inputs, seriesOf(inputs, 'potentialTemperature'), groundTheta(inputs) + numberOf(inputs, 'excess'))),
  ],
  example: { inputs: { height: [2, 100, 500, 800, 1000], potentialTemperature: [300, 299.8, 299.8, 300.2, 303], excess: 0.5 }, gives: 821.43, within: 0.01 },
}
